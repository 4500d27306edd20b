import type { Item } from './problem.js';

/** The items by `oneOf`, in the order of their first item: of each group at most one is taken. */
export function groupsOf(items: readonly Item[]): Item[][] {
  const groups: Item[][] = [];
  const named = new Map<string, Item[]>();
  for (const item of items) {
    const members = item.oneOf === undefined ? undefined : named.get(item.oneOf);
    if (members) {
      members.push(item);
      continue;
    }
    const group = [item];
    groups.push(group);
    if (item.oneOf !== undefined) named.set(item.oneOf, group);
  }
  return groups;
}
