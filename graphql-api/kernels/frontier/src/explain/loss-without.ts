import type { Picks } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';
import { isProven, type Point, type Solve } from './solve.js';
import { withoutItem } from './with-rules.js';

/** What a portfolio of the same cost is worth without an item. */
export interface LossWithout {
  readonly item: string;
  /** The most benefit without the item at no more cost; undefined where nothing is feasible without it. */
  readonly benefit: number | undefined;
  /** The chosen benefit less that one. Below 0 for a mandatory item that is not worth its cost. */
  readonly loss: number | undefined;
  readonly picks: Picks | undefined;
  /** Where false, the search proved less: the true loss may be smaller. */
  readonly exact: boolean;
}

/**
 * What is lost without an item of the chosen portfolio: the frontier of the problem that leaves the item out, at the
 * chosen cost. An item that must be taken is freed for the question. `known` are points found before; they spare work.
 */
export function lossWithout(
  problem: Problem,
  chosen: Point,
  item: string,
  solve: Solve,
  known: readonly Point[] = [],
): LossWithout {
  const withinCost = known.filter(({ cost, picks }) => cost <= chosen.cost && !picks[item]);
  const before = withinCost.reduce<Point | undefined>(
    (best, point) => (best === undefined || point.benefit > best.benefit ? point : best),
    undefined,
  );
  const leastBenefit = Math.max(problem.leastBenefit ?? 0, before === undefined ? 0 : before.benefit + 1);
  const solved = solve({ ...withoutItem(problem, item), ceiling: chosen.cost, leastBenefit });
  const best = solved.points.at(-1) ?? before;
  return {
    item,
    benefit: best?.benefit,
    loss: best && chosen.benefit - best.benefit,
    picks: best?.picks,
    exact: isProven(solved),
  };
}
