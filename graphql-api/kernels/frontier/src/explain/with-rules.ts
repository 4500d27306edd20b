import type { Item, Problem } from '../problem/problem.js';

/** The problem with one item changed. */
export function withItem(problem: Problem, id: string, change: Partial<Item>): Problem {
  return { ...problem, items: problem.items.map((item) => (item.id === id ? { ...item, ...change } : item)) };
}

/** The problem in which exactly so many pieces of the item are taken. */
export function withPieces(problem: Problem, id: string, pieces: number): Problem {
  const exactly = { items: [id], least: pieces, most: pieces };
  return { ...problem, counts: [...(problem.counts ?? []), exactly] };
}

/** The problem without the item, even where it must be taken. */
export function withoutItem(problem: Problem, id: string): Problem {
  const mustInclude = problem.mustInclude?.filter((other) => other !== id);
  return {
    ...problem,
    mustInclude,
    leaveOut: [...(problem.leaveOut ?? []).filter((other) => other !== id), id],
  };
}
