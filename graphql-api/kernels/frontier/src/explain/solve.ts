import type { Picks } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';

/** A portfolio with its sums, as the points of a search result are. */
export interface Point {
  readonly benefit: number;
  readonly cost: number;
  readonly picks: Picks;
}

/** What an explanation wants of a search; a SearchResult is one. */
export interface Solved {
  readonly status: 'complete' | 'bounded' | 'unproven' | 'infeasible';
  /** In order of cost, rising strictly in both figures. */
  readonly points: readonly Point[];
}

/** Searches the frontier of a problem. The host decides how long; what is not proven is said not to be exact. */
export type Solve = (problem: Problem) => Solved;

/** Whether nothing is missing from the points. */
export function isProven({ status }: Solved): boolean {
  return status === 'complete' || status === 'infeasible';
}
