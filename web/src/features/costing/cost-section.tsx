import type { ReactNode } from 'react';
import { currencySign, formatPercent } from '../../lib/money';
import { Section } from '../../ui/section';
import type { ComparedQuote, CostTerms, CostedCandidate } from './compared-quote';
import { QuoteBars } from './quote-bars';
import { QuoteComparison } from './quote-comparison';

interface CostSectionProps {
  /** One at least. */
  quotes: readonly ComparedQuote[];
  candidate: CostedCandidate;
  terms: CostTerms;
  action?: (quote: ComparedQuote) => ReactNode;
}

/** What each quote costs over the candidate's useful life, drawn and in figures. */
export function CostSection({ quotes, candidate, terms, action }: CostSectionProps) {
  const years = candidate.usefulLifeYears;
  const currency = currencySign(candidate.worksNet.currency);
  const rate = formatPercent(Number(terms.discountRate), 1);
  return (
    <Section
      title={`Life-cycle cost over ${years} ${years === 1 ? 'year' : 'years'}`}
      aside={`${currency}, discounted at ${rate}. Hatched, left of zero: residual value given back.`}
    >
      <QuoteBars quotes={quotes} />
      <QuoteComparison {...{ quotes, candidate, terms, action }} />
    </Section>
  );
}
