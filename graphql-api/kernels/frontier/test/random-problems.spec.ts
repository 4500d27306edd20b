import { totalsOf, violationsOf } from '../src/problem/feasible.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { bruteForceFront } from './brute-force.js';
import { pointsOf, runToEnd } from './run-search.js';
import { aRandomProblem } from './seeded.js';

const seeds = (count: number): number[] => Array.from({ length: count }, (_, index) => index + 1);

describe('problems drawn at random, every kind of limit and link at once', () => {
  it('has the exact front of each small one', () => {
    let feasible = 0;
    for (const seed of seeds(40)) {
      const problem = parseProblem(aRandomProblem(seed, 4 + (seed % 5)));
      const exact = bruteForceFront(problem);
      const result = runToEnd(problem, { seed, evaluations: 60_000 });
      expect({ seed, front: pointsOf(result) }).toEqual({ seed, front: exact });
      if (result.status === 'infeasible') expect(exact).toEqual([]);
      if (exact.length > 0) feasible++;
      else expect(result.notes.length).toBeGreaterThan(0);
    }
    expect(feasible).toBeGreaterThan(15);
  });

  it('gives only feasible portfolios, with their true sums, of which none beats another', () => {
    let points = 0;
    for (const seed of seeds(15)) {
      const problem = parseProblem(aRandomProblem(seed, 40));
      const result = runToEnd(problem, { seed, evaluations: 100_000, effort: 100_000 });
      for (const [place, { picks, benefit, cost }] of result.points.entries()) {
        expect(violationsOf(problem, picks)).toEqual([]);
        expect(totalsOf(problem, picks)).toMatchObject({ benefit, cost });
        if (place === 0) continue;
        expect(cost).toBeGreaterThan(result.points[place - 1].cost);
        expect(benefit).toBeGreaterThan(result.points[place - 1].benefit);
      }
      points += result.points.length;
    }
    expect(points).toBeGreaterThan(250);
  });
});
