import { boundSteps, provenStretches } from '../src/proof/bound-set.js';
import { openProof } from '../src/proof/opening.js';
import { precisionOf } from '../src/proof/precision.js';
import { StepLine } from '../src/proof/step-line.js';
import { workTask } from '../src/proof/work-task.js';
import { everyChoice, frontOf, mostCost } from './every-choice.js';
import { tangledModels } from './tangled-models.js';

const models = tangledModels(24, (seed) => 4 + (seed % 5));

describe('a bound set', () => {
  it('lies above the best of every cost, and on it where nothing can be missing', () => {
    let [provenCosts, openCosts] = [0, 0];
    for (const { model } of models) {
      const to = mostCost(model);
      const exact = frontOf(everyChoice(model));
      const best = new StepLine(exact);
      const { step } = precisionOf(model);
      const { windows: nodes } = openProof(model, { from: 0, to });
      for (const effort of [0, 600, 3_000, Infinity]) {
        const { found, open } = workTask(model, { id: '0.0', nodes, known: [], dives: false, effort });
        const points = frontOf(found);
        const bound = boundSteps(points, open, step, to);
        const proven = provenStretches(points, bound, 0, to);
        const boundLine = new StepLine(bound);
        expect(boundLine.points()).toEqual(bound);
        const pointLine = new StepLine(points);
        const isProven = (cost: number): boolean => proven.some(([from, end]) => from <= cost && cost <= end);
        const costs = Array.from({ length: to + 1 }, (_, cost) => cost);
        expect(costs.filter((cost) => boundLine.at(cost) < best.at(cost))).toEqual([]);
        const level = costs.filter((cost) => boundLine.at(cost) === pointLine.at(cost));
        expect(costs.filter(isProven)).toEqual(level);
        provenCosts += level.length;
        openCosts += costs.length - level.length;
        if (effort === Infinity) expect(bound).toEqual(exact);
      }
    }
    expect(provenCosts).toBeGreaterThan(2_000);
    expect(openCosts).toBeGreaterThan(500);
  });

  it('has stretches in order and apart', () => {
    const points: [number, number][] = [
      [0, 0],
      [10, 5],
      [20, 9],
    ];
    expect(provenStretches(points, points, 0, 30)).toEqual([[0, 30]]);
    const raised: [number, number][] = [
      [0, 0],
      [10, 7],
      [20, 9],
    ];
    expect(provenStretches(points, raised, 0, 30)).toEqual([
      [0, 9],
      [20, 30],
    ]);
  });

  it('counts benefit in whole steps', () => {
    const node = { from: 0, to: 100, leastPieces: 0, options: new Int32Array(0) };
    const open = [{ ...node, tangent: { height: 29, slope: 0 } }];
    expect(boundSteps([], open, 10, 100)).toEqual([[0, 20]]);
    expect(boundSteps([[40, 30]], open, 10, 100)).toEqual([
      [0, 20],
      [40, 30],
    ]);
  });
});
