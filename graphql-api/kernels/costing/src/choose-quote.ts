import type { QuoteCost } from './quote-cost.js';
import type { QuoteFault } from './quote-faults.js';

export interface CostedQuote {
  readonly id: string;
  readonly faults: readonly QuoteFault[];
  readonly cost: Pick<QuoteCost, 'equivalentAnnualCostMinor' | 'capitalGrossMinor'>;
}

/** The usable quote with the lowest equivalent annual cost; of equals the lower capital, then the id that sorts first, then the order given. */
export function chooseQuote<T extends CostedQuote>(quotes: readonly T[]): T | undefined {
  return quotes.filter(({ faults }) => faults.length === 0).sort(compareQuotes)[0];
}

function compareQuotes(left: CostedQuote, right: CostedQuote): number {
  return (
    left.cost.equivalentAnnualCostMinor - right.cost.equivalentAnnualCostMinor ||
    left.cost.capitalGrossMinor - right.cost.capitalGrossMinor ||
    Number(left.id > right.id) - Number(left.id < right.id)
  );
}
