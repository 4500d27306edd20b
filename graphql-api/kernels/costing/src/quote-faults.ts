import { checkDay, checkWhole } from './checks.js';

/** Why a quote cannot be kept on the decision date. */
export type QuoteFault = 'RUN_OUT' | 'SERVICE_PRICE_MISSING' | 'LEAD_TIME_TOO_LONG';

export interface QuoteTerms {
  /** Last day on which the quote holds, as 2027-02-15. */
  readonly validUntil: string;
  /** Null when the vendor gave no price for service; zero is a price. */
  readonly serviceYearlyMinor: number | null;
  readonly leadWeeks: number;
}

export interface QuoteRules {
  readonly decisionDate: string;
  readonly longestLeadWeeks: number;
}

/** A quote that runs out on the decision date itself still holds; an empty list means usable. */
export function quoteFaults(quote: QuoteTerms, rules: QuoteRules): QuoteFault[] {
  checkDay('validUntil', quote.validUntil);
  checkDay('decisionDate', rules.decisionDate);
  checkWhole('leadWeeks', quote.leadWeeks, 0);
  checkWhole('longestLeadWeeks', rules.longestLeadWeeks, 0);
  const faults: QuoteFault[] = [];
  if (quote.validUntil < rules.decisionDate) faults.push('RUN_OUT');
  if (quote.serviceYearlyMinor === null) faults.push('SERVICE_PRICE_MISSING');
  if (quote.leadWeeks > rules.longestLeadWeeks) faults.push('LEAD_TIME_TOO_LONG');
  return faults;
}
