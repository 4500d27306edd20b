import type { Item, Problem } from '../problem/problem.js';
import { beatenItems, type Ties } from './beaten-items.js';
import { linkReductions } from './link-reductions.js';
import type { Reduction } from './reduction.js';
import { sumReductions } from './sum-reductions.js';

export interface Reduced {
  /**
   * The same items and rules, more of them mandatory or left out, or with fewer pieces. Its portfolios are portfolios
   * of the problem, and its frontier has the same points.
   */
  readonly problem: Problem;
  /** What was settled, in that order; each holds given those before it. */
  readonly reductions: readonly Reduction[];
  /** True where the reductions prove that no portfolio keeps every rule; then nothing is reduced. */
  readonly infeasible: boolean;
}

/**
 * Settles before a search what needs no search: items that links or a single sum force or bar, and items beaten by
 * another of their group. Repeats until nothing more follows. By default one portfolio of each point stays; with ties
 * `keep all` every portfolio of each point does.
 */
export function reduceProblem(problem: Problem, ties: Ties = 'keep the first'): Reduced {
  const reductions: Reduction[] = [];
  for (let reduced = problem; ;) {
    const found = nextReductions(reduced, ties);
    if (found === undefined) return { problem, reductions: [], infeasible: true };
    if (found.length === 0) return { problem: reduced, reductions, infeasible: false };
    reductions.push(...found);
    reduced = apply(reduced, found);
    if (contradictsItself(reduced)) return { problem, reductions: [], infeasible: true };
  }
}

/** The cheaper kinds first: the dearer ones see fewer items. */
function nextReductions(problem: Problem, ties: Ties): Reduction[] | undefined {
  const byLinks = linkReductions(problem);
  if (byLinks === undefined || byLinks.length > 0) return byLinks;
  const bySums = sumReductions(problem);
  return bySums === undefined || bySums.length > 0 ? bySums : beatenItems(problem, ties);
}

function apply(problem: Problem, reductions: readonly Reduction[]): Problem {
  const leaveOut = new Set(problem.leaveOut);
  const mustInclude = new Set(problem.mustInclude);
  const most = new Map<string, number>();
  for (const reduction of reductions) {
    if (reduction.kind === 'fewer pieces') most.set(reduction.item, reduction.pieces);
    else if (reduction.kind === 'forced by a link' || reduction.kind === 'cannot be spared')
      mustInclude.add(reduction.item);
    else leaveOut.add(reduction.item);
  }
  const withPieces = (item: Item): Item => {
    const pieces = most.get(item.id);
    return pieces === undefined ? item : { ...item, most: pieces };
  };
  return {
    ...problem,
    items: problem.items.map(withPieces),
    mustInclude: [...mustInclude],
    leaveOut: [...leaveOut],
  };
}

function contradictsItself({ mustInclude = [], leaveOut = [] }: Problem): boolean {
  const leftOut = new Set(leaveOut);
  return mustInclude.some((id) => leftOut.has(id));
}
