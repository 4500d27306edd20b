import type { Portfolio } from './portfolio';

/** How widely the kept portfolios hold one item. */
export interface Holding {
  /** Index of the run's item. */
  item: number;
  /** Share 0–1 of the kept portfolios that hold it. */
  share: number;
}

export interface Composition {
  /** How many kept portfolios were counted. */
  of: number;
  inAll: Holding[];
  inSome: Holding[];
  inNone: Holding[];
}

/**
 * Share of the kept portfolios that hold each item, grouped; those in some fall by share. Counts the portfolios up to
 * the ceiling, or all of them when every one lies above it. O(sum of picks).
 */
export function compositionOf(portfolios: readonly Portfolio[], itemCount: number): Composition {
  const under = portfolios.filter(({ aboveCeiling }) => !aboveCeiling);
  const counted = under.length > 0 ? under : portfolios;
  const counts = new Array<number>(itemCount).fill(0);
  for (const { picks } of counted) for (const pick of picks) counts[pick]! += 1;
  const of = counted.length;
  const holdings = counts.map((count, item) => ({ item, share: of === 0 ? 0 : count / of }));
  return {
    of,
    inAll: holdings.filter(({ share }) => share === 1),
    inSome: holdings
      .filter(({ share }) => share > 0 && share < 1)
      .sort((one, other) => other.share - one.share || one.item - other.item),
    inNone: holdings.filter(({ share }) => share === 0),
  };
}
