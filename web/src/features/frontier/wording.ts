import { formatNumber, shortMoney } from '../../lib/money';
import { boundAt } from './bound';
import type { Front } from './front';

/** Millions always with two decimals, so that neighbours on the chart stay apart: "2.30 M"; below that as on the rod. */
export function shortCost(cost: number): string {
  return cost >= 999_500 ? `${formatNumber(cost / 1e6, 2)}\u00a0M` : shortMoney(cost);
}

/** Benefit points as read on the screen: one decimal. */
export function points(benefit: number): string {
  return formatNumber(benefit, 1);
}

/** With its sign: "+37.0", "−72.4". */
export function signedPoints(gain: number): string {
  return `${gain > 0 ? '+' : ''}${points(gain)}`;
}

export interface Answer {
  cost: string;
  benefit: string;
  certainty: string;
}

/** What portfolio `at` buys, and how sure that is, as the parts of one sentence. */
export function answerOf(front: Front, at: number): Answer {
  const { cost, benefit } = front.portfolios[at]!;
  return {
    cost: shortCost(cost),
    benefit: `${points(benefit)} benefit points`,
    certainty: certainty(front, at),
  };
}

function certainty({ status, portfolios, bound }: Front, at: number): string {
  const { cost, benefit } = portfolios[at]!;
  if (status === 'COMPLETE') return 'Nothing at this cost does better.';
  const most = boundAt(bound, cost);
  if (most === undefined) return 'Best found so far; not yet proven complete.';
  if (most <= benefit) return 'Nothing at this cost does better.';
  return `At this cost, at most ${points(most - benefit)} more are possible.`;
}
