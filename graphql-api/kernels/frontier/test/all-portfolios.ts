import { totalsOf, violationsOf, type Picks } from '../src/problem/feasible.js';
import type { Point, Solved } from '../src/explain/solve.js';
import type { Problem } from '../src/problem/problem.js';

/** Every feasible portfolio, each combination of pieces tried and checked on its own. For very small problems. */
export function allPortfolios(problem: Problem): Point[] {
  let combinations: Picks[] = [{}];
  for (const { id, most = 1 } of problem.items) {
    const pieces = Array.from({ length: most + 1 }, (_, count) => count);
    combinations = combinations.flatMap((picks) =>
      pieces.map((count) => (count === 0 ? picks : { ...picks, [id]: count })),
    );
  }
  return combinations
    .filter((picks) => violationsOf(problem, picks).length === 0)
    .map((picks) => {
      const { benefit, cost } = totalsOf(problem, picks);
      return { benefit, cost, picks };
    });
}

/** A search that misses nothing: the front of all portfolios. */
export function solveByTrying(problem: Problem): Solved {
  const sorted = allPortfolios(problem).sort(
    (one, other) => one.cost - other.cost || other.benefit - one.benefit,
  );
  const points: Point[] = [];
  for (const point of sorted) if (point.benefit > (points.at(-1)?.benefit ?? -1)) points.push(point);
  return { status: points.length > 0 ? 'complete' : 'infeasible', points };
}
