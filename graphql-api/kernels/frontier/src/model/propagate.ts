import { needName } from '../problem/feasible.js';
import { groupsOf } from '../problem/groups.js';
import type { Item, Problem } from '../problem/problem.js';

/** What follows from the mandatory items, the left out ones and the links before any choice is made. */
export interface Settled {
  /** Items that every feasible portfolio takes. */
  readonly forced: ReadonlySet<string>;
  /** Why an item is in: a clause without its full stop, for each forced item. */
  readonly whyForced: ReadonlyMap<string, string>;
  /** Why an item is out: the same for each item that no feasible portfolio takes. */
  readonly whyBarred: ReadonlyMap<string, string>;
  /** Items that may be taken, by group: of each at most one is. */
  readonly groups: readonly (readonly Item[])[];
  /** Sentences on links that cannot all be kept; if there are any, no portfolio is feasible. */
  readonly collisions: string[];
}

/** Follows needs and exclusions from item to item until nothing new follows or two of them collide. */
export function propagate(problem: Problem): Settled {
  const barred = new Map<string, string>();
  for (const id of problem.leaveOut ?? []) barred.set(id, `${id} is left out`);
  const forced = new Map<string, string>();
  for (const id of problem.mustInclude ?? []) forced.set(id, `${id} must be taken`);
  const exclusions = exclusionsOf(problem);
  const collisions: string[] = [];

  for (let settledBefore = -1; settledBefore < forced.size + barred.size && collisions.length === 0;) {
    settledBefore = forced.size + barred.size;
    for (const exclusion of exclusions) collisions.push(...barOthers(exclusion, forced, barred));
    for (const item of problem.items) collisions.push(...followNeeds(item, forced, barred));
  }
  const groups = groupsOf(problem.items.filter(({ id }) => !barred.has(id)));
  return { forced: new Set(forced.keys()), whyForced: forced, whyBarred: barred, groups, collisions };
}

type Reasons = Map<string, string>;

interface Exclusion {
  readonly items: readonly string[];
  readonly because: string;
}

function exclusionsOf(problem: Problem): Exclusion[] {
  const groups = new Map<string, string[]>();
  for (const { id, oneOf } of problem.items) {
    if (oneOf !== undefined) groups.set(oneOf, [...(groups.get(oneOf) ?? []), id]);
  }
  return [
    ...[...groups].map(([name, items]) => ({ items, because: `only one of the group ${name} may be` })),
    ...(problem.eitherOr ?? []).map((items) => ({
      items,
      because: `${items.join(' and ')} exclude each other`,
    })),
  ];
}

function barOthers({ items, because }: Exclusion, forced: Reasons, barred: Reasons): string[] {
  const taken = items.filter((id) => forced.has(id));
  if (taken.length > 1) return [`${taken.map((id) => forced.get(id)).join(', ')}, and ${because}.`];
  if (taken.length === 0) return [];
  for (const id of items) {
    if (id !== taken[0] && !barred.has(id)) barred.set(id, `${id} is out because ${forced.get(taken[0])}`);
  }
  return [];
}

function followNeeds({ id, needs = [] }: Item, forced: Reasons, barred: Reasons): string[] {
  if (barred.has(id)) return [];
  for (const anyOf of needs) {
    if (anyOf.includes(id)) continue;
    const open = anyOf.filter((other) => !barred.has(other));
    if (open.length === 0) {
      const reasons = anyOf.map((other) => barred.get(other)).join(', ');
      if (forced.has(id)) return [`${forced.get(id)}, and ${needName(id, anyOf)}, but ${reasons}.`];
      barred.set(id, `${id} is out because ${reasons}`);
      return [];
    }
    if (open.length === 1 && forced.has(id) && !forced.has(open[0])) {
      forced.set(open[0], `${open[0]} must be taken because ${needName(id, anyOf)}`);
    }
  }
  return [];
}
