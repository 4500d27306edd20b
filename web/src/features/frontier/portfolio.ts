import type { Amount } from '../../lib/money';

/** One kept portfolio of a run. `cost` and `capital` are whole-number-safe figures in currency units, for comparing and drawing. */
export interface Portfolio {
  /** Place in the run's points, which stand in order of cost. */
  index: number;
  cost: number;
  capital: number;
  benefit: number;
  /** No portfolio of at most this cost has more benefit than so much more; undefined while nothing is proven. */
  atMostMore: number | undefined;
  /** Indices of the run's items, rising. */
  picks: readonly number[];
  aboveCeiling: boolean;
  /** The same figures as the API sent them, for text. */
  exact: { cost: Amount; capital: Amount; benefit: string };
}

interface Point {
  benefit: string;
  atMostMore?: string | null;
  cost: Amount;
  capital: Amount;
  picks: readonly number[];
}

export function toPortfolios(points: readonly Point[], ceiling: Amount): Portfolio[] {
  const most = Number(ceiling.amount);
  return points.map(({ benefit, atMostMore, cost, capital, picks }, index) => ({
    index,
    cost: Number(cost.amount),
    capital: Number(capital.amount),
    benefit: Number(benefit),
    atMostMore: atMostMore == null ? undefined : Number(atMostMore),
    picks,
    aboveCeiling: Number(capital.amount) > most,
    exact: { cost, capital, benefit },
  }));
}

/** Place of the dearest portfolio that costs at most `cost`; -1 when all cost more. O(log n). */
export function dearestWithin(portfolios: readonly Portfolio[], cost: number): number {
  let low = 0;
  let high = portfolios.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (portfolios[middle]!.cost <= cost) low = middle + 1;
    else high = middle;
  }
  return low - 1;
}

/** Place of the portfolio whose cost is nearest to `cost`; the cheaper of two equally near; -1 when there is none. */
export function nearestByCost(portfolios: readonly Portfolio[], cost: number): number {
  const below = dearestWithin(portfolios, cost);
  const above = portfolios[below + 1];
  if (!above) return below;
  if (below < 0) return 0;
  return above.cost - cost < cost - portfolios[below]!.cost ? below + 1 : below;
}

/** Where the eye starts: the greatest benefit under the ceiling, or the cheapest when all lie above it. */
export function bestUnderCeiling(portfolios: readonly Portfolio[]): number {
  const under = portfolios.findLastIndex(({ aboveCeiling }) => !aboveCeiling);
  return under < 0 && portfolios.length > 0 ? 0 : under;
}
