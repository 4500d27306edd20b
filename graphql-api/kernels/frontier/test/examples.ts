import type { Problem } from '../src/problem/problem.js';

/** The example of the format's own description, every kind of link in it. */
export function twoNeedsAndAHoist(): Problem {
  return {
    format: 'metewand-problem/1',
    name: 'two needs and a hoist',
    ceiling: 100,
    limits: [{ name: 'installation days', most: 10 }],
    items: [
      { id: 'scanner-a', benefit: 60, cost: 55, uses: [6], oneOf: 'scanner' },
      { id: 'scanner-b', benefit: 48, cost: 40, uses: [4], oneOf: 'scanner' },
      { id: 'hoist', benefit: 20, cost: 12, uses: [1], most: 3 },
      { id: 'viewer', benefit: 15, cost: 9, uses: [1], needs: [['scanner-a', 'scanner-b']] },
    ],
    mustInclude: [],
    leaveOut: [],
    eitherOr: [['viewer', 'hoist']],
    counts: [{ name: 'ward 2', items: ['hoist', 'viewer'], least: 0, most: 3 }],
  };
}

/** Its front as [cost, benefit]. */
export const TWO_NEEDS_AND_A_HOIST_FRONT = [
  [0, 0],
  [12, 20],
  [24, 40],
  [36, 60],
  [49, 63],
  [52, 68],
  [64, 88],
  [76, 108],
  [91, 120],
];

/** A problem of items with these ids, all of benefit 10 and cost 10, with more said in `rest`. */
export function aProblem(ids: readonly string[], rest: Partial<Problem> = {}): Problem {
  return { format: 'metewand-problem/1', items: ids.map((id) => ({ id, benefit: 10, cost: 10 })), ...rest };
}
