import type { Portfolio } from './portfolio';
import { dearestWithin } from './portfolio';

/** What changes between two kept portfolios. */
export interface Exchange {
  /** Place of the other portfolio. */
  to: number;
  /** Benefit points gained; below zero when lost. */
  gain: number;
  /** Indices of the run's items. */
  enters: number[];
  leaves: number[];
}

/** From the portfolio at `from` to the best one that costs at most `step` more; undefined when that is no other. */
export function gainForMore(portfolios: readonly Portfolio[], from: number, step: number) {
  const to = dearestWithin(portfolios, portfolios[from]!.cost + step);
  return to > from ? exchange(portfolios, from, to) : undefined;
}

/** From the portfolio at `from` to the best one that costs at least `step` less; undefined when there is none. */
export function lossForLess(portfolios: readonly Portfolio[], from: number, step: number) {
  const to = dearestWithin(portfolios, portfolios[from]!.cost - step);
  return to >= 0 ? exchange(portfolios, from, to) : undefined;
}

export function exchange(portfolios: readonly Portfolio[], from: number, to: number): Exchange {
  const before = portfolios[from]!;
  const after = portfolios[to]!;
  return {
    to,
    gain: after.benefit - before.benefit,
    enters: without(after.picks, before.picks),
    leaves: without(before.picks, after.picks),
  };
}

function without(picks: readonly number[], others: readonly number[]): number[] {
  const there = new Set(others);
  return picks.filter((pick) => !there.has(pick));
}
