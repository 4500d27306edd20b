import { groupsOf } from '../problem/groups.js';
import type { Item, Problem } from '../problem/problem.js';
import type { Reduction } from './reduction.js';

/** Which equally good items may go. */
export type Ties = 'keep the first' | 'keep all';

/**
 * Items in whose place another one of their group, or nothing, may stand in every portfolio and be at least as good
 * in benefit, cost and second cost: as many pieces of it may be taken, it uses of every limit at most as much (where a
 * limit has a least, exactly as much), no link or count is harder to keep with it, and nothing else asks for the item
 * itself. Of equals the first stays; with `keep all`, an item goes only for one that is better in benefit or cost, so
 * that no portfolio on the frontier is lost, not even one of several with the same figures.
 *
 * They are dropped one after another, each for one that is still there, so that no two drop each other.
 */
export function beatenItems(problem: Problem, ties: Ties): Reduction[] {
  const leftOut = new Set(problem.leaveOut);
  const forced = new Set(problem.mustInclude);
  const rules = rulesOf(problem);
  const reductions: Reduction[] = [];
  for (const members of groupsOf(problem.items.filter(({ id }) => !leftOut.has(id)))) {
    const staying = new Set(members);
    for (const item of members) {
      if (forced.has(item.id)) continue;
      const rivals = members.some(({ id }) => forced.has(id)) ? [...staying] : [NOTHING, ...staying];
      const by = rivals.find((rival) => rival !== item && beats(rival, item, members, rules, ties));
      if (by === undefined) continue;
      staying.delete(item);
      reductions.push(
        by === NOTHING
          ? { kind: 'brings nothing', item: item.id }
          : { kind: 'beaten', item: item.id, by: by.id },
      );
    }
  }
  return reductions;
}

/** Stands for taking nothing of a group. */
const NOTHING: Item = { id: '', benefit: 0, cost: 0, most: Infinity };

function beats(by: Item, item: Item, members: readonly Item[], rules: Rules, ties: Ties): boolean {
  const better = by.benefit > item.benefit || by.cost < item.cost;
  if (!better && ties === 'keep all') return false;
  if (!mayStandFor(by, item, rules)) return false;
  if (better || by === NOTHING || members.indexOf(by) < members.indexOf(item)) return true;
  // better in nothing but uses or links, and later: only if the other could not stand for it
  return !mayStandFor(item, by, rules);
}

function mayStandFor(by: Item, item: Item, rules: Rules): boolean {
  return (
    by.benefit >= item.benefit &&
    by.cost <= item.cost &&
    (by.secondCost ?? 0) <= (item.secondCost ?? 0) &&
    (by.most ?? 1) >= (item.most ?? 1) &&
    usesAllow(by, item, rules) &&
    countsAllow(by, item, rules) &&
    linksAllow(by, item, rules)
  );
}

interface Rules {
  readonly limits: readonly { readonly exact: boolean }[];
  readonly counts: readonly {
    readonly items: ReadonlySet<string>;
    readonly hasLeast: boolean;
    readonly hasMost: boolean;
  }[];
  readonly eitherOr: readonly ReadonlySet<string>[];
  /** Lists of needs in which an item stands, with the item whose need it is. */
  readonly neededIn: ReadonlyMap<
    string,
    readonly { readonly of: string; readonly anyOf: readonly string[] }[]
  >;
}

function usesAllow(by: Item, item: Item, { limits }: Rules): boolean {
  return limits.every(({ exact }, index) => {
    const [one, other] = [by.uses?.[index] ?? 0, item.uses?.[index] ?? 0];
    return exact ? one === other : one <= other;
  });
}

function countsAllow(by: Item, item: Item, { counts }: Rules): boolean {
  return counts.every(({ items, hasLeast, hasMost }) => {
    const [one, other] = [items.has(by.id), items.has(item.id)];
    return one === other || (one ? !hasMost : !hasLeast);
  });
}

function linksAllow(by: Item, item: Item, { eitherOr, neededIn }: Rules): boolean {
  const stillMet = (neededIn.get(item.id) ?? []).every(
    ({ of, anyOf }) => of === item.id || of === by.id || anyOf.includes(by.id),
  );
  const noNewExclusion = eitherOr.every((items) => !items.has(by.id) || items.has(item.id));
  return stillMet && noNewExclusion && needsOf(by).every((anyOf) => isMetWith(item, anyOf));
}

/** Whether the item's own needs see to it that one of the list is taken. */
function isMetWith(item: Item, anyOf: readonly string[]): boolean {
  return needsOf(item).some((own) => own.every((id) => anyOf.includes(id)));
}

/** A need that the item meets itself is none. */
function needsOf({ id, needs = [] }: Item): (readonly string[])[] {
  return needs.filter((anyOf) => !anyOf.includes(id));
}

function rulesOf({ limits = [], counts = [], eitherOr = [], items }: Problem): Rules {
  const neededIn = new Map<string, { of: string; anyOf: readonly string[] }[]>();
  for (const { id, needs = [] } of items) {
    for (const anyOf of needs) {
      for (const other of anyOf) {
        const lists = neededIn.get(other);
        if (lists) lists.push({ of: id, anyOf });
        else neededIn.set(other, [{ of: id, anyOf }]);
      }
    }
  }
  return {
    limits: limits.map(({ least }) => ({ exact: least !== undefined })),
    counts: counts.map(({ items: ids, least = 0, most }) => ({
      items: new Set(ids),
      hasLeast: least > 0,
      hasMost: most !== undefined,
    })),
    eitherOr: eitherOr.map((ids) => new Set(ids)),
    neededIn,
  };
}
