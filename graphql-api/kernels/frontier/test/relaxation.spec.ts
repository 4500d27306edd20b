import { lossesAt } from '../src/proof/losses.js';
import { wholeModel } from '../src/relaxation/narrow-part.js';
import type { OpenPart } from '../src/relaxation/open-part.js';
import { Relaxation } from '../src/relaxation/relaxation.js';
import { everyChoice, mostCost } from './every-choice.js';
import { tangledModels } from './tangled-models.js';

const models = tangledModels(120, (seed) => 4 + (seed % 6));

function valueAt(part: OpenPart, relaxation: Relaxation, cost: number): number {
  const { height, slope } = lossesAt(part, relaxation.prices).tangent;
  return height + slope * cost;
}

/** What the shares bring, and by how much they break anything at most, over the size of what is broken. */
function valueOf(
  part: OpenPart,
  shares: Float64Array,
  mostCostOf: number,
): { value: number; broken: number } {
  let value = part.settledBenefit;
  let cost = part.settledCost;
  const activity = new Float64Array(part.row.length);
  let broken = 0;
  for (let k = 0; k < part.classCount; k++) {
    let sum = 0;
    for (let option = part.start[k]; option < part.start[k + 1]; option++) {
      const share = shares[option];
      sum += share;
      value += share * part.benefit[option];
      cost += share * part.cost[option];
      broken = Math.max(broken, -share);
      for (let term = part.termStart[option]; term < part.termStart[option + 1]; term++) {
        activity[part.termRow[term]] += share * part.termValue[term];
      }
    }
    broken = Math.max(broken, Math.abs(sum - 1));
  }
  for (const [row, sum] of activity.entries()) broken = Math.max(broken, sum - part.rowMost[row]);
  return { value, broken: Math.max(broken, cost - mostCostOf) };
}

describe('the relaxation of a part', () => {
  it('finds prices and shares of the same value, so both are the best', () => {
    let solved = 0;
    for (const { seed, model } of models) {
      const to = mostCost(model);
      const part = wholeModel(model, 0, to);
      if (!part) continue;
      const relaxation = new Relaxation(part);
      for (const cost of [to, Math.floor(to / 2), Math.floor(to / 5), Math.floor((3 * to) / 4)]) {
        if (!relaxation.minimise(cost)) continue;
        for (const price of relaxation.prices) expect(price).toBeGreaterThanOrEqual(0);
        const { value, broken } = valueOf(part, relaxation.shares, cost);
        expect(broken).toBeLessThan(1e-6);
        expect([seed, value]).toEqual([seed, expect.closeTo(valueAt(part, relaxation, cost), 4)]);
        solved++;
      }
    }
    expect(solved).toBeGreaterThan(200);
  });

  it('lies above every portfolio, and says that nothing is possible only where nothing is', () => {
    let impossible = 0;
    for (const { model } of models) {
      const to = mostCost(model);
      const part = wholeModel(model, 0, to);
      const portfolios = everyChoice(model);
      if (!part) {
        expect(portfolios).toEqual([]);
        continue;
      }
      const relaxation = new Relaxation(part);
      for (let at = 0; at <= 12; at++) {
        const limit = Math.floor((to * at) / 12);
        const within = portfolios.filter(({ cost }) => cost <= limit);
        if (!relaxation.minimise(limit)) {
          expect(within).toEqual([]);
          impossible++;
          continue;
        }
        const { height, slope } = lossesAt(part, relaxation.prices).tangent;
        const above = portfolios.filter(({ cost, benefit }) => benefit > height + slope * cost + 1e-9);
        expect(above).toEqual([]);
      }
    }
    expect(impossible).toBeGreaterThan(100);
  });

  it('comes to the same value from prices known before', () => {
    let compared = 0;
    for (const { model } of models) {
      const to = mostCost(model);
      const part = wholeModel(model, 0, to);
      if (!part) continue;
      const first = new Relaxation(part);
      if (!first.minimise(to)) continue;
      const known = first.known();
      for (const cost of [to, Math.floor(to / 2), Math.floor(to / 3)]) {
        const cold = new Relaxation(part);
        const warm = new Relaxation(part, known);
        const isPossible = cold.minimise(cost);
        expect(warm.minimise(cost)).toBe(isPossible);
        if (!isPossible) continue;
        expect(valueAt(part, warm, cost)).toBeCloseTo(valueAt(part, cold, cost), 4);
        compared++;
      }
    }
    expect(compared).toBeGreaterThan(150);
  });
});
