import {
  countName,
  needName,
  totalsOf,
  violationsOf,
  type Picks,
  type Violation,
} from '../problem/feasible.js';
import type { Item, Problem } from '../problem/problem.js';
import { cheapestExchange, type Exchange } from './cheapest-exchange.js';
import type { Point } from './solve.js';

/** Why an item is not in a portfolio, and what would bring it in. */
export interface LeftOut {
  readonly item: string;
  /** The rules that one piece of it, put in with nothing else changed, would break. */
  readonly obstacles: readonly Obstacle[];
  /** Where there is no obstacle: what the portfolio would come to with it. */
  readonly fits?: {
    readonly benefit: number;
    readonly cost: number;
    /** A point that is better than this: the item is dearer than its worth. */
    readonly beatenBy?: Point;
  };
  /** The most that the portfolio after the exchange may cost. */
  readonly mostCost: number;
  /** Undefined where no exchange with up to two further changes will do. */
  readonly exchange: Exchange | undefined;
}

/** A rule that stands in the way, and the items it is about. */
export interface Obstacle extends Violation {
  /**
   * Of a group, an either-or or a count those that are in; of a need those of which one would have to be; empty for
   * limits.
   */
  readonly items: readonly string[];
}

/**
 * Why an item is not in a feasible portfolio: the limits it would pass and by how much, the links it would break, or,
 * where it fits in, the point of the frontier that is better than the portfolio with it. Together with the exchange
 * that brings it in at the least loss (see cheapestExchange), at no more cost than the portfolio's unless `mostCost`
 * says otherwise. Throws a RangeError for an item that is in or unknown.
 */
export function whyLeftOut(
  problem: Problem,
  front: readonly Point[],
  picks: Picks,
  item: string,
  mostCost = totalsOf(problem, picks).cost,
): LeftOut {
  const found = problem.items.find(({ id }) => id === item);
  if (found === undefined || picks[item] > 0)
    throw new RangeError(`${item} is not an item that is left out.`);
  const withItem = { ...picks, [item]: 1 };
  const broken = violationsOf(problem, withItem);
  const obstacles = broken.map((each) => ({ ...each, items: itemsBehind(each, problem, picks, found) }));
  const exchange = cheapestExchange(problem, picks, item, mostCost);
  if (obstacles.length > 0) return { item, obstacles, mostCost, exchange };
  const { benefit, cost } = totalsOf(problem, withItem);
  const beatenBy = front.findLast((point) => point.cost <= cost);
  const isBeaten =
    beatenBy && (beatenBy.benefit > benefit || (beatenBy.benefit === benefit && beatenBy.cost < cost));
  return { item, obstacles, fits: { benefit, cost, ...(isBeaten ? { beatenBy } : {}) }, mostCost, exchange };
}

function itemsBehind({ kind, name }: Violation, problem: Problem, picks: Picks, item: Item): string[] {
  const isIn = (id: string): boolean => picks[id] > 0;
  switch (kind) {
    case 'one of':
      return problem.items.filter(({ id, oneOf }) => oneOf === name && isIn(id)).map(({ id }) => id);
    case 'either or':
      return (problem.eitherOr ?? []).find((ids) => ids.join(', ') === name)?.filter(isIn) ?? [];
    case 'count most':
      return problem.counts?.find((count) => countName(count) === name)?.items.filter(isIn) ?? [];
    case 'needs':
      return [...(item.needs?.find((anyOf) => needName(item.id, anyOf) === name) ?? [])];
    default:
      return [];
  }
}
