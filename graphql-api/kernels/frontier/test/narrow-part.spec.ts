import { Random } from '../src/local-search/random.js';
import type { FoundPortfolio } from '../src/proof/proof-task.js';
import { narrow, partOf, wholeModel } from '../src/relaxation/narrow-part.js';
import { optionsOf, type OpenPart, type Range } from '../src/relaxation/open-part.js';
import { everyChoice, mostCost } from './every-choice.js';
import { tangledModels } from './tangled-models.js';

const models = tangledModels(60, (seed) => 4 + (seed % 5));

function piecesOf({ model }: OpenPart, { chosen }: FoundPortfolio): number {
  return chosen.reduce((sum, option) => sum + model.optionPieces[option], 0);
}

function isIn(part: OpenPart, range: Range, keep: ReadonlySet<number>, portfolio: FoundPortfolio): boolean {
  const pieces = piecesOf(part, portfolio);
  if (portfolio.cost < range.from || portfolio.cost > range.to) return false;
  if (pieces < range.leastPieces || pieces > range.mostPieces) return false;
  return portfolio.chosen.every((option) => keep.has(option));
}

/** Whether a part, read from its own figures alone, holds a portfolio, and gives it its right sums. */
function holds(part: OpenPart, { chosen, cost, benefit }: FoundPortfolio): boolean {
  const activity = new Float64Array(part.row.length);
  let [ownCost, ownBenefit] = [part.settledCost, part.settledBenefit];
  for (const [k, option] of part.settled.entries()) if (option >= 0 && chosen[k] !== option) return false;
  for (let k = 0; k < part.classCount; k++) {
    const place = part.option.subarray(part.start[k], part.start[k + 1]).findIndex((o) => chosen.includes(o));
    if (place < 0) return false;
    const option = part.start[k] + place;
    ownCost += part.cost[option];
    ownBenefit += part.benefit[option];
    for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
      activity[part.termRow[term]] += part.termValue[term];
    }
  }
  if (activity.some((sum, row) => sum > part.rowMost[row])) return false;
  return ownCost === cost && ownBenefit === benefit;
}

describe('narrowing a part', () => {
  it('drops no option of a portfolio that lies in its range', () => {
    let held = 0;
    for (const { seed, model } of models) {
      const random = new Random(seed);
      const to = mostCost(model);
      const whole = wholeModel(model, 0, to);
      const portfolios = everyChoice(model);
      for (let round = 0; whole && round < 12; round++) {
        const from = random.below(to + 1);
        const leastPieces = random.below(3);
        const range = {
          from,
          to: from + random.below(to - from + 1),
          leastPieces,
          mostPieces: random.fraction() < 0.5 ? Infinity : leastPieces + random.below(4),
        };
        const keep = Uint8Array.from(whole.option, () => Number(random.fraction() < 0.85));
        const kept = new Set([...whole.settled.filter((option) => option >= 0)]);
        for (const [place, mark] of keep.entries()) if (mark === 1) kept.add(whole.option[place]);
        const inRange = portfolios.filter((portfolio) => isIn(whole, range, kept, portfolio));
        const part = narrow(whole, keep, range);
        if (!part) {
          expect(inRange).toEqual([]);
          continue;
        }
        expect(inRange.filter((portfolio) => !holds(part, portfolio))).toEqual([]);
        held += inRange.length;
        const again = partOf(model, optionsOf(part), range)!;
        expect(inRange.filter((portfolio) => !holds(again, portfolio))).toEqual([]);
      }
    }
    expect(held).toBeGreaterThan(500);
  });

  it('holds nothing that breaks a row: what it left out nothing in it can break', () => {
    let tried = 0;
    for (const { model } of models) {
      const whole = wholeModel(model, 0, mostCost(model));
      if (!whole) continue;
      const free = { ...model, rowMost: model.rowMost.map(() => Infinity) };
      const feasible = new Set(everyChoice(model).map(({ chosen }) => chosen.join()));
      const kept = everyChoice(free).filter((portfolio) => holds(whole, portfolio));
      expect(kept.filter(({ chosen }) => !feasible.has(chosen.join()))).toEqual([]);
      tried += kept.length;
    }
    expect(tried).toBeGreaterThan(500);
  });
});
