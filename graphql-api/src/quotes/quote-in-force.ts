import { registerEnumType } from '@nestjs/graphql';
import { chooseQuote, type QuoteCost, type QuoteFault } from '@metewand/costing';
import type { Quote } from './entities/quote.entity.js';

export enum QuoteInForceReason {
  KEPT = 'KEPT',
  LOWEST_ANNUAL_COST = 'LOWEST_ANNUAL_COST',
}

registerEnumType(QuoteInForceReason, {
  name: 'QuoteInForceReason',
  description: 'Kept by the coordinator, or chosen by the round’s rule.',
});

/** A quote with its cost and with what stands in the way of buying by it. */
export interface JudgedQuote {
  quote: Quote;
  faults: QuoteFault[];
  cost: QuoteCost;
}

export interface QuoteInForce {
  judged: JudgedQuote;
  reason: QuoteInForceReason;
}

/**
 * The quote by which a candidate counts: the kept one while it is usable, else the usable one with the lowest
 * equivalent annual cost; of equals the lower capital, then the number that sorts first. None without a usable quote.
 */
export function quoteInForce(
  quotes: readonly JudgedQuote[],
  keptQuoteId: string | null,
): QuoteInForce | null {
  const kept = quotes.find(({ quote, faults }) => quote.id === keptQuoteId && faults.length === 0);
  if (kept) return { judged: kept, reason: QuoteInForceReason.KEPT };
  const chosen = chooseQuote(quotes.map((judged) => ({ ...judged, id: judged.quote.number, judged })));
  return chosen ? { judged: chosen.judged, reason: QuoteInForceReason.LOWEST_ANNUAL_COST } : null;
}
