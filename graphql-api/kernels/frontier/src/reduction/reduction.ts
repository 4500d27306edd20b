import type { Violation } from '../problem/feasible.js';

/** Something settled about an item before the search, and why: enough to say it, and to take it back. */
export type Reduction = LeftOutBefore | ForcedBefore | FewerPieces;

/** The item is left out, and no point of the frontier is lost. */
export type LeftOutBefore =
  | {
      /** `by`, of the same group, may stand in its place in every portfolio and is at least as good in everything. */
      readonly kind: 'beaten';
      readonly item: string;
      readonly by: string;
    }
  | {
      /** No benefit, and nothing that a limit, a count or another item could want of it. */
      readonly kind: 'brings nothing';
      readonly item: string;
    }
  | { readonly kind: 'barred by a link'; readonly item: string; readonly because: string }
  | {
      /** With the item, and the others of `together` that it brings along, a rule is broken at best. */
      readonly kind: 'does not fit';
      readonly item: string;
      readonly together: readonly string[];
      readonly overrun: Overrun;
    };

/** Every portfolio takes the item. */
export type ForcedBefore =
  | { readonly kind: 'forced by a link'; readonly item: string; readonly because: string }
  | { readonly kind: 'cannot be spared'; readonly item: string; readonly overrun: Overrun };

/** Not all of its pieces can be taken, only up to `pieces`. */
export interface FewerPieces {
  readonly kind: 'fewer pieces';
  readonly item: string;
  readonly pieces: number;
  readonly overrun: Overrun;
}

/** A rule that would be broken: what its sum comes to at best, and its bound. */
export interface Overrun {
  readonly kind: Violation['kind'];
  readonly name: string;
  readonly reaches: number;
  readonly bound: number;
}
