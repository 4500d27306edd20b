import { Random } from '../src/local-search/random.js';
import type { Problem } from '../src/problem/problem.js';
import { pointsOf, runToEnd } from './run-search.js';

describe('a front far out on the axis of cost', () => {
  it.each([1e12, 1e14])('is the same and proven where a mandatory item costs %d', (cost) => {
    const problem = aCeilingAlone(1);
    const near = runToEnd(problem, { evaluations: 1_000 });
    const far = runToEnd(withMandatory(problem, cost), { evaluations: 1_000 });
    expect([near.status, far.status]).toEqual(['complete', 'complete']);
    expect(near.points.length).toBeGreaterThan(40);
    const back = pointsOf(far).map(([dear, benefit]) => [dear - cost, benefit]);
    expect(back).toEqual(pointsOf(near));
  });
});

/** Items with as much benefit as cost, about: where many portfolios lie just below the tangents. */
function aCeilingAlone(seed: number): Problem {
  const random = new Random(seed);
  const items = Array.from({ length: 18 }, (_, place) => {
    return { id: `item ${place}`, benefit: 10 + random.below(51), cost: 10 + random.below(51) };
  });
  const sum = items.reduce((costs, { cost }) => costs + cost, 0);
  return { format: 'metewand-problem/1', items, ceiling: Math.round(sum / 2) };
}

function withMandatory(problem: Problem, cost: number): Problem {
  const { items, ceiling = 0 } = problem;
  const building = { id: 'building', benefit: 0, cost };
  return {
    ...problem,
    ceiling: ceiling + cost,
    items: [...items, building],
    mustInclude: [...(problem.mustInclude ?? []), building.id],
  };
}
