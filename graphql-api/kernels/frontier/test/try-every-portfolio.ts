import { compileModel } from '../src/model/compile-model.js';
import { violationsOf, type Picks } from '../src/problem/feasible.js';
import type { Item, Problem } from '../src/problem/problem.js';
import type { FoundPortfolio } from '../src/proof/proof-task.js';
import type { SurfacePoint } from '../src/three-objectives/dominated-volume.js';
import type { SliceOutcome, SliceSearch, SliceWindow } from '../src/three-objectives/slice-search.js';

export interface TriedPortfolio {
  readonly benefit: number;
  readonly cost: number;
  readonly secondCost: number;
  readonly picks: Picks;
}

/**
 * Every feasible portfolio, in plain loops and with nothing of the search in it. The costly check of all rules is left
 * to those within the ceiling and the limits, and of a group no second one is tried.
 */
export function everyPortfolio(problem: Problem): TriedPortfolio[] {
  const { items, limits = [] } = problem;
  const found: TriedPortfolio[] = [];
  const picks: Record<string, number> = {};
  const uses = limits.map(() => 0);
  let [benefit, cost, secondCost] = [0, 0, 0];
  const judge = (): void => {
    if (cost > (problem.ceiling ?? Infinity) || benefit < (problem.leastBenefit ?? 0)) return;
    if (limits.some(({ most, least = -Infinity }, k) => uses[k] > most || uses[k] < least)) return;
    const taken = Object.fromEntries(Object.entries(picks).filter(([, pieces]) => pieces > 0));
    if (violationsOf(problem, taken).length === 0) found.push({ benefit, cost, secondCost, picks: taken });
  };
  const take = (item: Item, pieces: number): void => {
    picks[item.id] = (picks[item.id] ?? 0) + pieces;
    benefit += pieces * item.benefit;
    cost += pieces * item.cost;
    secondCost += pieces * (item.secondCost ?? 0);
    for (const k of uses.keys()) uses[k] += pieces * (item.uses?.[k] ?? 0);
  };
  const tryFrom = (index: number, groups: readonly string[]): void => {
    if (index === items.length) {
      judge();
      return;
    }
    tryFrom(index + 1, groups);
    const item = items[index];
    const { oneOf, most = 1 } = item;
    if (oneOf !== undefined && groups.includes(oneOf)) return;
    for (let pieces = 1; pieces <= most; pieces++) {
      take(item, 1);
      tryFrom(index + 1, oneOf === undefined ? groups : [...groups, oneOf]);
    }
    take(item, -most);
  };
  tryFrom(0, []);
  return found;
}

/** The points that no other matches or beats in all three, in order of cost, then second cost. */
export function unbeaten(points: readonly SurfacePoint[]): SurfacePoint[] {
  const bestFirst = [...points].sort(
    (one, other) => one[0] - other[0] || one[2] - other[2] || other[1] - one[1],
  );
  const kept: SurfacePoint[] = [];
  for (const point of bestFirst) if (!kept.some((other) => isAsGood(other, point))) kept.push(point);
  return kept;
}

/** Whether one point is at least as good as another in all three. */
export function isAsGood(one: SurfacePoint, other: SurfacePoint): boolean {
  return one[0] <= other[0] && one[1] >= other[1] && one[2] <= other[2];
}

export function figuresOf({ cost, benefit, secondCost }: Omit<TriedPortfolio, 'picks'>): SurfacePoint {
  return [cost, benefit, secondCost];
}

interface TryingOptions {
  /** How often it asks whether to stop. */
  readonly reports?: number;
  /** What becomes of the exact outcome. */
  readonly alter?: (exact: SliceOutcome, window: SliceWindow) => SliceOutcome;
}

/** An exact search of slices by going through the list of all portfolios. */
export function searchByTrying(
  problem: Problem,
  portfolios: readonly TriedPortfolio[],
  { reports = 0, alter = (exact) => exact }: TryingOptions = {},
): SliceSearch {
  const cheapestFirst = [...portfolios].sort(
    (one, other) => one.cost - other.cost || other.benefit - one.benefit,
  );
  return function* search(window) {
    const { mostSecondCost, from, to, known } = window;
    for (let report = 0; report < reports; report++) {
      const tangent = { height: 1_000_000, slope: 0 };
      if (yield) return { found: [], open: [{ from, to, tangent }], effort: 1 };
    }
    const found: FoundPortfolio[] = [];
    for (const { benefit, cost, secondCost, picks } of cheapestFirst) {
      if (cost < from || cost > to || secondCost > mostSecondCost) continue;
      if (known.some((point) => point[0] <= cost && point[1] >= benefit)) continue;
      if (found.length > 0 && benefit <= found[found.length - 1].benefit) continue;
      found.push({ cost, benefit, chosen: chosenOf(problem, picks) });
    }
    return alter({ found, open: [], effort: 1 }, window);
  };
}

function chosenOf(problem: Problem, picks: Picks): Int32Array {
  const { classCount, optionStart, optionItem, optionPieces } = compileModel(problem)!;
  return Int32Array.from({ length: classCount }, (_, k) => {
    for (let option = optionStart[k]; option < optionStart[k + 1]; option++) {
      const item = optionItem[option];
      if (item >= 0 && picks[problem.items[item].id] === optionPieces[option]) return option;
    }
    return optionStart[k];
  });
}
