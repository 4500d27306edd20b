import { formatNumber, shortMoney } from '../../lib/money';
import type { Front } from './front';
import type { Portfolio } from './portfolio';

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

function certainty({ status, portfolios }: Front, at: number): string {
  const { atMostMore } = portfolios[at]!;
  if (status === 'COMPLETE' || atMostMore === 0) return 'Nothing at this cost does better.';
  if (atMostMore === undefined) return 'Best found so far; not yet proven complete.';
  return `At this cost, at most ${pointsMore(atMostMore)} more are possible.`;
}

/** What is known of better portfolios at no more than the cost of this one, as a figure. */
export function possibleMore({ status }: Pick<Front, 'status'>, { atMostMore }: Portfolio): string {
  if (status === 'COMPLETE' || atMostMore === 0) return 'none, proven';
  return atMostMore === undefined ? 'not yet known' : `at most ${pointsMore(atMostMore)}`;
}

/** Rounded up to one decimal: a promise of "at most" must not shrink. */
export function pointsMore(atMostMore: number): string {
  return points(Math.ceil(Math.round(atMostMore * 1e4) / 1e3) / 10);
}
