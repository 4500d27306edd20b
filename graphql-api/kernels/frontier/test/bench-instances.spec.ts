import { anInstance } from '../bench/instances.mjs';
import { nsga2 } from '../bench/nsga2.mjs';
import { aTangledProblem } from '../bench/tangled.mjs';
import { canonicalText } from '../src/problem/canonical-text.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { bruteForceFront } from './brute-force.js';

describe('the instances of the bench', () => {
  it.each([40, 100, 1_000])('are problems of the asked size: %i', (alternatives) => {
    const problem = parseProblem(anInstance({ alternatives, seed: 3, capacities: 5 }));
    expect(problem.items).toHaveLength(alternatives);
    expect(problem.limits).toHaveLength(5);
    expect(canonicalText(anInstance({ alternatives, seed: 3, capacities: 5 }))).toBe(canonicalText(problem));
    expect(canonicalText(anInstance({ alternatives, seed: 4, capacities: 5 }))).not.toBe(
      canonicalText(problem),
    );
  });

  it('have a benefit of cost and a constant where they are strongly correlated', () => {
    const { items } = anInstance({ alternatives: 100, seed: 3, addedBenefit: 20 });
    for (const { benefit, cost } of items) expect(benefit).toBe(cost + 20);
  });

  it('keep their shape in units of money of any size', () => {
    const small = anInstance({ alternatives: 100, seed: 3 });
    const minor = anInstance({ alternatives: 100, seed: 3, money: 'minor' });
    for (const [place, { cost }] of minor.items.entries()) {
      expect(Math.round(cost / 100 - 0.01)).toBe(small.items[place].cost);
    }
    expect(minor.ceiling).toBe(100 * (small.ceiling ?? 0));
  });
});

describe('the NSGA-II of the bench', () => {
  it('credits itself with feasible portfolios only, and finds the front of a small problem', () => {
    let found = 0;
    let exact = 0;
    for (const seed of [1, 2, 3, 4]) {
      const problem = aTangledProblem(seed, 10);
      const front = new Set(bruteForceFront(problem).map(String));
      for (const { front: best, evaluations } of nsga2(problem, { seed })) {
        if (evaluations < 5_000) continue;
        const points = best.points();
        for (const point of points) expect(isReached(point, [...front])).toBe(true);
        found += points.filter((point) => front.has(String(point))).length;
        break;
      }
      exact += front.size;
    }
    expect(found).toBeGreaterThan(0.9 * exact);
  });
});

/** Whether a point of the exact front is as good or better. */
function isReached([cost, benefit]: [number, number], front: readonly string[]): boolean {
  return front.some((text) => {
    const [exactCost, exactBenefit] = text.split(',').map(Number);
    return exactCost <= cost && exactBenefit >= benefit;
  });
}
