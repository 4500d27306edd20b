import { totalsOf, violationsOf, type Picks } from '../src/problem/feasible.js';
import type { Point, Solved } from '../src/explain/solve.js';
import type { Problem } from '../src/problem/problem.js';

/**
 * Every feasible portfolio, each combination of pieces tried and checked on its own, but those that the ceiling or a
 * group rules out already. For very small problems.
 */
export function allPortfolios(problem: Problem): Point[] {
  const { items, ceiling = Infinity } = problem;
  const found: Point[] = [];
  const tryFrom = (index: number, cost: number, picks: Picks, groups: ReadonlySet<string>): void => {
    if (cost > ceiling) return;
    if (index === items.length) {
      if (violationsOf(problem, picks).length === 0) found.push({ ...totalsOf(problem, picks), picks });
      return;
    }
    tryFrom(index + 1, cost, picks, groups);
    const { id, oneOf, most = 1, cost: ofPiece } = items[index];
    if (oneOf !== undefined && groups.has(oneOf)) return;
    const with_ = oneOf === undefined ? groups : new Set([...groups, oneOf]);
    for (let pieces = 1; pieces <= most; pieces++) {
      tryFrom(index + 1, cost + pieces * ofPiece, { ...picks, [id]: pieces }, with_);
    }
  };
  tryFrom(0, 0, {}, new Set());
  return found.map(({ benefit, cost, picks }) => ({ benefit, cost, picks }));
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
