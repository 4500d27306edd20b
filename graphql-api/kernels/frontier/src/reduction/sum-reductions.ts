import { boundedSumsOf, type BoundedSum } from '../problem/bounded-sums.js';
import { groupsOf } from '../problem/groups.js';
import type { Item, Problem } from '../problem/problem.js';
import { LinkFollower } from './companions.js';
import type { Overrun, Reduction } from './reduction.js';

/**
 * Items that a single sum settles. At its lowest the sum takes of every group what adds least. If with an item (and
 * what must come with it) even that passes the bound, the item does not fit; if without it, the item cannot be spared;
 * if with several pieces, there can only be fewer. One reduction per item; undefined where a sum passes its bound in any
 * case, so that nothing is feasible.
 */
export function sumReductions(problem: Problem): Reduction[] | undefined {
  const groups = openGroupsOf(problem);
  const groupOf = new Map(groups.flatMap((group) => group.items.map((item) => [item, group])));
  const companions = companionsOf(problem);
  const mostTogether = [...companions.values()].reduce((most, items) => Math.max(most, items.length), 1);
  const found = new Map<string, Reduction>();
  for (const sum of boundedSumsOf(problem)) {
    const lowest = new LowestSum(sum, groups, groupOf);
    if (lowest.total > sum.most) return undefined;
    // most sums have room for anything: one look spares the look at each item
    if (lowest.total + lowest.greatestRise * mostTogether <= sum.most) continue;
    for (const group of groups) {
      for (const item of group.items) {
        if (found.has(item.id)) continue;
        const reduction = settle(item, group, lowest, companions.get(item) ?? [item]);
        if (reduction) found.set(item.id, reduction);
      }
    }
  }
  return [...found.values()];
}

/** The items of a group that may still be taken; `forced` is the one that must be. */
interface Group {
  readonly place: number;
  readonly items: readonly Item[];
  readonly forced: Item | undefined;
}

function settle(
  item: Item,
  group: Group,
  lowest: LowestSum,
  companions: readonly Item[],
): Reduction | undefined {
  const { sum } = lowest;
  const together = lowest.with(companions);
  if (together > sum.most) {
    const ids = companions.map(({ id }) => id);
    return { kind: 'does not fit', item: item.id, together: ids, overrun: overrun(sum, together) };
  }
  if (group.forced === undefined) {
    const without = lowest.without(item, group);
    if (without > sum.most)
      return { kind: 'cannot be spared', item: item.id, overrun: overrun(sum, without) };
  }
  const { most = 1 } = item;
  const all = lowest.beside(group) + sum.figure(item) * most;
  if (sum.figure(item) <= 0 || all <= sum.most) return undefined;
  const pieces = Math.floor((sum.most - lowest.beside(group)) / sum.figure(item));
  return { kind: 'fewer pieces', item: item.id, pieces, overrun: overrun(sum, all) };
}

/** The least a sum can come to when the groups are all that is kept. */
class LowestSum {
  private readonly ofGroup: Float64Array;
  readonly total: number;
  /** The most by which choosing otherwise in one group can raise the sum. */
  readonly greatestRise: number;

  constructor(
    readonly sum: BoundedSum,
    groups: readonly Group[],
    private readonly groupOf: ReadonlyMap<Item, Group>,
  ) {
    const ofGroup = new Float64Array(groups.length);
    let [total, greatestRise] = [0, 0];
    for (const group of groups) {
      const lowest = this.lowestOf(group);
      let highest = 0;
      for (const item of group.items) {
        highest = Math.max(highest, sum.figure(item) * (item.most ?? 1));
      }
      ofGroup[group.place] = lowest;
      total += lowest;
      greatestRise = Math.max(greatestRise, highest - lowest);
    }
    this.ofGroup = ofGroup;
    this.total = total;
    this.greatestRise = greatestRise;
  }

  beside(group: Group): number {
    return this.total - this.ofGroup[group.place];
  }

  /** At least one piece of each of the items, no two of which are of one group. */
  with(items: readonly Item[]): number {
    let lowest = this.total;
    for (const item of items) lowest += this.lowestWith(item) - this.ofGroup[this.groupOf.get(item)!.place];
    return lowest;
  }

  /** Without the item, in whose group nothing is forced. */
  without(item: Item, group: Group): number {
    if (this.sum.figure(item) >= 0 || this.beside(group) <= this.sum.most) return this.total;
    const others = group.items.filter((other) => other !== item).map((other) => this.lowestWith(other));
    return this.beside(group) + Math.min(0, ...others);
  }

  private lowestOf({ items, forced }: Group): number {
    if (forced) return this.lowestWith(forced);
    return items.reduce((lowest, item) => Math.min(lowest, this.lowestWith(item)), 0);
  }

  private lowestWith(item: Item): number {
    const figure = this.sum.figure(item);
    return figure < 0 ? figure * (item.most ?? 1) : figure;
  }
}

function overrun({ kind, name, sign, most }: BoundedSum, reaches: number): Overrun {
  return { kind, name, reaches: sign * reaches, bound: sign * most };
}

/** For items with needs that can be met: the item and what must come with it. */
function companionsOf(problem: Problem): Map<Item, readonly Item[]> {
  const follower = new LinkFollower(problem);
  const companions = new Map<Item, readonly Item[]>();
  for (const item of problem.items) {
    if (item.needs === undefined) continue;
    const together = follower.companionsOf(item);
    if (!('because' in together)) companions.set(item, together);
  }
  return companions;
}

function openGroupsOf(problem: Problem): Group[] {
  const leftOut = new Set(problem.leaveOut);
  const mandatory = new Set(problem.mustInclude);
  return groupsOf(problem.items.filter(({ id }) => !leftOut.has(id))).map((items, place) => ({
    place,
    items,
    forced: items.find(({ id }) => mandatory.has(id)),
  }));
}
