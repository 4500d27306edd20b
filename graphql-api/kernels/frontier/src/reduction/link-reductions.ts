import { propagate } from '../model/propagate.js';
import type { Problem } from '../problem/problem.js';
import { LinkFollower } from './companions.js';
import type { Reduction } from './reduction.js';

/** What mandatory items, left out ones and links settle; undefined where they collide, so that nothing is feasible. */
export function linkReductions(problem: Problem): Reduction[] | undefined {
  const { collisions, whyForced, whyBarred } = propagate(problem);
  if (collisions.length > 0) return undefined;
  const mandatory = new Set(problem.mustInclude);
  const leftOut = new Set(problem.leaveOut);
  const reductions: Reduction[] = [];
  for (const [item, because] of whyForced) {
    if (!mandatory.has(item)) reductions.push({ kind: 'forced by a link', item, because });
  }
  for (const [item, because] of whyBarred) {
    if (!leftOut.has(item)) reductions.push({ kind: 'barred by a link', item, because });
  }
  // what is barred now makes the links of others tighter: they are followed in the next round
  return reductions.length > 0 ? reductions : unreachable(problem);
}

/** Items whose own links can never all be kept. */
function unreachable(problem: Problem): Reduction[] {
  const leftOut = new Set(problem.leaveOut);
  const follower = new LinkFollower(problem);
  const reductions: Reduction[] = [];
  for (const item of problem.items) {
    if (item.needs === undefined || leftOut.has(item.id)) continue;
    const companions = follower.companionsOf(item);
    if ('because' in companions) reductions.push({ kind: 'barred by a link', item: item.id, ...companions });
  }
  return reductions;
}
