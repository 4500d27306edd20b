import type { Picks } from '../problem/feasible.js';
import type { Item, Problem } from '../problem/problem.js';
import { isProven, type Point, type Solve } from './solve.js';
import { withItem, withPieces } from './with-rules.js';

/** The figure at which an item would come into a portfolio. */
export interface EntryThreshold {
  /** Per piece; undefined where no portfolio with the item would be as good whatever the figure. */
  readonly figure: number | undefined;
  /** Where false, the search proved less: the true price may be higher, the true benefit lower, than `figure`. */
  readonly exact: boolean;
  /** The portfolio with the item that is as good at that figure. */
  readonly picks: Picks | undefined;
}

/**
 * The price at which an item would come in: the largest whole cost of one piece at which some feasible portfolio
 * with the item has at least the benefit of the chosen one at no more than its cost. (At that price it may be a tie.)
 *
 * With exactly n pieces that price is (chosen cost - least cost of everything else) / n, rounded down, over the
 * portfolios of at least the chosen benefit. The least cost of everything else is the cheapest point of the problem in
 * which n pieces are taken and cost nothing; so the threshold follows from one search per number of pieces, each
 * asked only for what would beat the figures before it. What a piece uses of limits stays as it is, also of a limit in
 * money.
 *
 * `known` are points found before; they spare work. Our own derivation.
 */
export function priceToComeIn(
  problem: Problem,
  chosen: Point,
  item: string,
  solve: Solve,
  known: readonly Point[] = [],
): EntryThreshold {
  const { cost, most = 1 } = itemOf(problem, item);
  let best = cheapestKnown(known, chosen, item, cost);
  let exact = true;
  for (let pieces = 1; pieces <= most; pieces++) {
    const ceiling = best.figure === undefined ? chosen.cost : chosen.cost - pieces * (best.figure + 1);
    if (ceiling < 0) continue;
    const free = withPieces(withItem(problem, item, { cost: 0 }), item, pieces);
    const solved = solve({ ...free, ceiling, leastBenefit: chosen.benefit });
    exact &&= isProven(solved);
    const [cheapest] = solved.points;
    if (cheapest === undefined) continue;
    best = { figure: Math.floor((chosen.cost - cheapest.cost) / pieces), picks: cheapest.picks };
  }
  return { ...best, exact };
}

/**
 * The benefit at which an item would come in: the least whole benefit of one piece at which some feasible portfolio
 * with the item has at least the benefit of the chosen one at no more than its cost. With exactly n pieces it is
 * (chosen benefit - most benefit of everything else) / n, rounded up and at least 0; found as priceToComeIn finds
 * the price, with pieces that bring no benefit.
 */
export function benefitToComeIn(
  problem: Problem,
  chosen: Point,
  item: string,
  solve: Solve,
  known: readonly Point[] = [],
): EntryThreshold {
  const { benefit, most = 1 } = itemOf(problem, item);
  let best = bestKnown(known, chosen, item, benefit);
  let exact = true;
  for (let pieces = 1; pieces <= most && best.figure !== 0; pieces++) {
    const wanted = best.figure === undefined ? 0 : chosen.benefit - pieces * (best.figure - 1);
    const barren = withPieces(withItem(problem, item, { benefit: 0 }), item, pieces);
    const solved = solve({ ...barren, ceiling: chosen.cost, leastBenefit: Math.max(0, wanted) });
    exact &&= isProven(solved);
    const richest = solved.points.at(-1);
    if (richest === undefined) continue;
    best = { figure: pieceBenefit(chosen.benefit - richest.benefit, pieces), picks: richest.picks };
  }
  return { ...best, exact };
}

type Best = Pick<EntryThreshold, 'figure' | 'picks'>;

function cheapestKnown(known: readonly Point[], chosen: Point, item: string, cost: number): Best {
  let best: Best = { figure: undefined, picks: undefined };
  for (const { picks, ...point } of known) {
    const pieces = picks[item] ?? 0;
    if (pieces === 0 || point.benefit < chosen.benefit) continue;
    const figure = Math.floor((chosen.cost - point.cost) / pieces) + cost;
    if (figure >= 0 && (best.figure === undefined || figure > best.figure)) best = { figure, picks };
  }
  return best;
}

function bestKnown(known: readonly Point[], chosen: Point, item: string, benefit: number): Best {
  let best: Best = { figure: undefined, picks: undefined };
  for (const { picks, ...point } of known) {
    const pieces = picks[item] ?? 0;
    if (pieces === 0 || point.cost > chosen.cost) continue;
    const figure = pieceBenefit(chosen.benefit - point.benefit + pieces * benefit, pieces);
    if (best.figure === undefined || figure < best.figure) best = { figure, picks };
  }
  return best;
}

function pieceBenefit(missing: number, pieces: number): number {
  return Math.max(0, Math.ceil(missing / pieces));
}

function itemOf({ items, leaveOut = [] }: Problem, id: string): Item {
  const item = items.find((each) => each.id === id);
  if (item === undefined || leaveOut.includes(id))
    throw new RangeError(`${id} is not an item that may be taken.`);
  return item;
}
