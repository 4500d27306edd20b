import type { QuoteFault } from '@metewand/costing';
import { dayInWords } from '../common/words.js';
import type { Round } from '../rounds/entities/round.entity.js';
import type { Quote } from './entities/quote.entity.js';

type Words = (quote: Quote, round: Round) => string;

const WORDS: Readonly<Record<QuoteFault, Words>> = {
  RUN_OUT: (quote, round) =>
    `it runs out on ${dayInWords(quote.validUntil)}, before the decision on ${dayInWords(round.decisionDate)}`,
  SERVICE_PRICE_MISSING: () => 'it gives no price for service',
  LEAD_TIME_TOO_LONG: (quote, round) =>
    `it takes ${quote.leadWeeks} weeks, longer than the ${round.longestLeadWeeks} of the round`,
};

/** What stands in the way of buying by the quote, as the end of a sentence. */
export function faultWords(fault: QuoteFault, quote: Quote, round: Round): string {
  return WORDS[fault](quote, round);
}
