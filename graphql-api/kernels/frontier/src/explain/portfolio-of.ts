import type { Picks } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';
import { reduceProblem } from '../reduction/reduce-problem.js';
import { plainReasons } from './plain-reasons.js';
import type { Solve } from './solve.js';

/**
 * A portfolio that keeps every rule, or that there is none, or undefined where the search proves neither. What is
 * plain without a search needs none. Otherwise the benefit, which does not matter, is left away: then the frontier is
 * a single point, the cheapest portfolio.
 */
export function portfolioOf(problem: Problem, solve: Solve): Picks | 'infeasible' | undefined {
  if (plainReasons(problem).length > 0 || reduceProblem(problem).infeasible) return 'infeasible';
  const { leastBenefit } = problem;
  const items = problem.items.map(({ secondCost: _, ...item }) =>
    leastBenefit === undefined ? { ...item, benefit: 0 } : item,
  );
  const { status, points } = solve({ ...problem, items });
  if (points.length > 0) return points[0].picks;
  return status === 'infeasible' ? 'infeasible' : undefined;
}
