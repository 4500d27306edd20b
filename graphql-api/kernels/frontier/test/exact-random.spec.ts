import { aTangledProblem } from '../bench/tangled.mjs';
import { parseProblem } from '../src/problem/parse-problem.js';
import { bruteForceFront } from './brute-force.js';
import { runToEnd } from './run-search.js';

describe('problems in which any kind of limit meets any other', () => {
  it.each(Array.from({ length: 20 }, (_, index) => [100 * index + 1, 100 * index + 100]))(
    'has the whole front of each, and says so: seeds %i to %i',
    (first, last) => {
      let feasible = 0;
      for (let seed = first; seed <= last; seed++) {
        const problem = parseProblem(aTangledProblem(seed, sizeOf(seed)));
        const exact = bruteForceFront(problem);
        const { status, ...result } = runToEnd(problem, { seed, evaluations: FEW_EVALUATIONS });
        const front = result.points.map(({ cost, benefit }) => [cost, benefit]);
        const expected = exact.length > 0 ? 'complete' : 'infeasible';
        expect({ seed, status, front }).toEqual({ seed, status: expected, front: exact });
        if (exact.length > 0) feasible++;
      }
      // a generator gone astray would make the comparison an empty one
      expect(feasible).toBeGreaterThan(70);
    },
  );
});

/** So few that much of the front is left for the proof to find. */
const FEW_EVALUATIONS = 500;

/** Up to 16 items; most problems have 4 to 9, one in ten 13 or more: trying every portfolio of those takes long. */
function sizeOf(seed: number): number {
  if (seed % 10 === 0) return 13 + ((seed / 10) % 4);
  if (seed % 10 === 5) return 10 + (((seed - 5) / 10) % 3);
  return 4 + (seed % 6);
}
