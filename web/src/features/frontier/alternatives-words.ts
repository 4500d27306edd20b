import { formatNumber } from '../../lib/money';

/** How many portfolios have just the benefit and cost of the selected one, which is one of them. */
export function alternativesText({ count, isExact }: { count: number; isExact: boolean }): string {
  const others = count - 1;
  if (!isExact) {
    if (others === 0)
      return 'None other with the same benefit and cost was found in time; there may be some.';
    return `At least ${counted(others)} the same benefit and cost; there may be more.`;
  }
  if (others === 0) return 'No other portfolio has the same benefit and cost.';
  return `${counted(others)} the same benefit and cost.`;
}

/** `fewer`: points that the next-best portfolio of the same cost gains less; undefined where there is none. */
export function nextBestText(fewer: number | undefined, isExact: boolean): string {
  if (fewer !== undefined) return `Next best at the same cost: ${exactPoints(fewer)} points less.`;
  if (!isExact) return 'No next best at the same cost was found in time.';
  return 'No other at the same cost does better than the next cheaper portfolio.';
}

/** As many decimals as a small difference needs: 0.0012 must not read as nothing. */
function exactPoints(fewer: number): string {
  return formatNumber(fewer.toFixed(4), fewer < 0.1 ? 4 : 1);
}

function counted(others: number): string {
  return others === 1 ? '1 other portfolio has' : `${formatNumber(others)} other portfolios have`;
}
