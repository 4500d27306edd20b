import { needName } from '../problem/feasible.js';
import type { Item, Problem } from '../problem/problem.js';

/** What taking an item brings with it: itself and what must then be taken too, or why it can never be taken. */
export type Companions = readonly Item[] | { readonly because: string };

/**
 * Follows the links of one item at a time: needs of which a single partner is left, and what excludes what is taken.
 * Costs as much as the links that are met, whatever the size of the problem.
 */
export class LinkFollower {
  private readonly items: ReadonlyMap<string, Item>;
  private readonly leftOut: ReadonlySet<string>;
  /** Of all items with the same key at most one is taken. */
  private readonly keysOf: ReadonlyMap<string, readonly string[]>;

  constructor({ items, leaveOut = [], eitherOr = [] }: Problem) {
    this.items = new Map(items.map((item) => [item.id, item]));
    this.leftOut = new Set(leaveOut);
    const keysOf = new Map(items.map(({ id, oneOf }) => [id, oneOf === undefined ? [] : [`group ${oneOf}`]]));
    for (const [index, exclusive] of eitherOr.entries()) {
      for (const id of exclusive) keysOf.get(id)?.push(`either or ${index}`);
    }
    this.keysOf = keysOf;
  }

  companionsOf(item: Item): Companions {
    const taken = new Set([item]);
    const keys = new Set(this.keysOf.get(item.id));
    for (let takenBefore = 0; takenBefore < taken.size;) {
      takenBefore = taken.size;
      for (const { id, needs = [] } of taken) {
        for (const anyOf of needs) {
          if (anyOf.some((other) => taken.has(this.items.get(other)!))) continue;
          const open = anyOf.filter((other) => this.isOpen(other, keys));
          if (open.length === 0) return { because: this.sentence(item.id, id, anyOf) };
          if (open.length > 1) continue;
          taken.add(this.items.get(open[0])!);
          for (const key of this.keysOf.get(open[0]) ?? []) keys.add(key);
        }
      }
    }
    return [...taken];
  }

  private isOpen(id: string, keys: ReadonlySet<string>): boolean {
    return !this.leftOut.has(id) && !this.keysOf.get(id)!.some((key) => keys.has(key));
  }

  private sentence(first: string, id: string, anyOf: readonly string[]): string {
    const chain = id === first ? '' : `${first} needs ${id} in the end, `;
    return `${chain}${needName(id, anyOf)}, and that cannot come with it`;
  }
}
