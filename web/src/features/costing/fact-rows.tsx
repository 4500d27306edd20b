import type { ReactNode } from 'react';
import { formatDate, formatDayMonth } from '../../lib/dates';
import { formatAmount } from '../../lib/money';
import { toMinor } from '../../lib/minor-units';
import { Tag } from '../../ui/tag';
import type { ComparedQuote, CostTerms } from './compared-quote';
import { Note } from './comparison-row';
import { aboveLowest } from './comparison-rows';
import { rateInWords } from './explain-cost';

/** Below the figures: distance from the lowest, the vendor's currency, and whether the quote holds and comes in time. */
export function FactRows({ quotes, terms }: { quotes: readonly ComparedQuote[]; terms: CostTerms }) {
  const above = aboveLowest(quotes);
  const foreign = quotes.some(({ unitPrice, cost }) => unitPrice.currency !== cost.capital.currency);
  return (
    <>
      <FactRow name="Against the lowest" quotes={quotes}>
        {(_, i) => <Above amount={above[i]} />}
      </FactRow>
      {foreign && (
        <FactRow name="Vendor’s prices" quotes={quotes}>
          {({ unitPrice }) => <Converted currency={unitPrice.currency} terms={terms} />}
        </FactRow>
      )}
      <FactRow
        name={
          <>
            Valid until <Note>(need {formatDayMonth(terms.decisionDate)})</Note>
          </>
        }
        quotes={quotes}
      >
        {(quote) => <ValidUntil quote={quote} />}
      </FactRow>
      <FactRow
        name={
          <>
            Delivery <Note>(at most {terms.longestLeadWeeks} weeks)</Note>
          </>
        }
        quotes={quotes}
      >
        {(quote) => <Delivery quote={quote} />}
      </FactRow>
    </>
  );
}

interface FactRowProps {
  name: ReactNode;
  quotes: readonly ComparedQuote[];
  children: (quote: ComparedQuote, index: number) => ReactNode;
}

function FactRow({ name, quotes, children }: FactRowProps) {
  return (
    <tr>
      <th scope="row">{name}</th>
      {quotes.map((quote, i) => (
        <td key={quote.id} className="num">
          {children(quote, i)}
        </td>
      ))}
    </tr>
  );
}

function Above({ amount }: { amount: ReturnType<typeof aboveLowest>[number] }) {
  if (!amount)
    return (
      <>
        — <Note>not comparable without service</Note>
      </>
    );
  return <span className="muted">{toMinor(amount) === 0 ? 'lowest' : `+${formatAmount(amount)}`}</span>;
}

function Converted({ currency, terms }: { currency: string; terms: CostTerms }) {
  const rate = rateInWords(terms, currency);
  return (
    <>
      {currency}
      {rate && <Note>converted at {rate}</Note>}
    </>
  );
}

function ValidUntil({ quote: { validUntil, faults } }: { quote: ComparedQuote }) {
  if (!faults.includes('RUN_OUT')) return formatDate(validUntil);
  return (
    <Tag tone="caution" icon="clock">
      {formatDate(validUntil)}, too early
    </Tag>
  );
}

function Delivery({ quote: { leadWeeks, faults } }: { quote: ComparedQuote }) {
  const weeks = `${leadWeeks}\u00a0${leadWeeks === 1 ? 'week' : 'weeks'}`;
  if (!faults.includes('LEAD_TIME_TOO_LONG')) return weeks;
  return (
    <Tag tone="caution" icon="clock">
      {weeks}, too late
    </Tag>
  );
}
