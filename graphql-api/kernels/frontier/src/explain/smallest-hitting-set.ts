/**
 * A smallest set that has a member of each of the sets in it and contains none of the `forbidden` ones; undefined where
 * there is none. Branches on the members of a set not yet hit, one size after the other: quick while the answer is
 * small, which it is for rules that collide.
 *
 * @param from no smaller set is to be looked for
 */
export function smallestHittingSet<T>(
  sets: readonly (readonly T[])[],
  forbidden: readonly ReadonlySet<T>[],
  from = 0,
): Set<T> | undefined {
  const all = new Set(sets.flat());
  for (let size = from; size <= all.size; size++) {
    const found = hittingSet(sets, forbidden, new Set(), size);
    if (found) return found;
  }
  return undefined;
}

function hittingSet<T>(
  sets: readonly (readonly T[])[],
  forbidden: readonly ReadonlySet<T>[],
  chosen: Set<T>,
  room: number,
): Set<T> | undefined {
  if (forbidden.some((set) => isWithin(set, chosen))) return undefined;
  const open = sets.find((set) => !set.some((member) => chosen.has(member)));
  if (open === undefined) return new Set(chosen);
  if (room === 0) return undefined;
  for (const member of open) {
    chosen.add(member);
    const found = hittingSet(sets, forbidden, chosen, room - 1);
    chosen.delete(member);
    if (found) return found;
  }
  return undefined;
}

function isWithin<T>(set: ReadonlySet<T>, other: ReadonlySet<T>): boolean {
  for (const member of set) if (!other.has(member)) return false;
  return true;
}
