import type { Amount } from '../../lib/money';
import { fromMinor, toMinor } from '../../lib/minor-units';
import type { ComparedQuote } from './compared-quote';
import { COST_LINES, isWhole, lineAmount } from './cost-lines';
import type { CostLine } from './cost-lines';

export interface Figure {
  /** Undefined where the quote names no price. */
  amount?: Amount;
  lowest: boolean;
}

interface LineRow {
  line: CostLine;
  /** One per quote, in their order. */
  figures: Figure[];
}

/** The lines that any of the quotes has something on. */
export function lineRows(quotes: readonly ComparedQuote[]): LineRow[] {
  return COST_LINES.map((line) => ({
    line,
    figures: markLowest(
      quotes.map((quote) => (line.id === 'service' && !isWhole(quote) ? undefined : lineAmount(quote, line))),
    ),
  })).filter(({ figures }) => figures.some(({ amount }) => !amount || toMinor(amount) !== 0));
}

/** Totals of a quote without a price for service never count as the lowest: they are too low. */
export function totalRow(
  quotes: readonly ComparedQuote[],
  total: (quote: ComparedQuote) => Amount,
): Figure[] {
  const marks = markLowest(quotes.map((quote) => (isWhole(quote) ? total(quote) : undefined)));
  return quotes.map((quote, i) => ({ amount: total(quote), lowest: marks[i]!.lowest }));
}

/** How much more each life-cycle cost is than the lowest; undefined where it cannot be compared. */
export function aboveLowest(quotes: readonly ComparedQuote[]): (Amount | undefined)[] {
  const whole = quotes.filter(isWhole).map(({ cost }) => toMinor(cost.lifeCycleCost));
  const lowest = Math.min(...whole);
  return quotes.map((quote) => {
    const { lifeCycleCost } = quote.cost;
    return isWhole(quote) ? fromMinor(toMinor(lifeCycleCost) - lowest, lifeCycleCost.currency) : undefined;
  });
}

/** Lines of a cost are rounded together, so equal ones may differ by one minor unit. */
const ROUNDING_MINOR = 1;

/** Marks the lowest, each of several equal ones; none where all are alike, since then there is nothing to choose. */
export function markLowest(amounts: readonly (Amount | undefined)[]): Figure[] {
  const known = amounts.flatMap((amount) => (amount ? [toMinor(amount)] : []));
  const lowest = Math.min(...known);
  const isLowest = (minor: number) => minor - lowest <= ROUNDING_MINOR;
  const differ = !known.every(isLowest);
  return amounts.map((amount) => ({
    amount,
    lowest: differ && amount !== undefined && isLowest(toMinor(amount)),
  }));
}
