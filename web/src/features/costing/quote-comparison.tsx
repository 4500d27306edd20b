import { useId, useState } from 'react';
import type { ReactNode } from 'react';
import type { ComparedQuote, CostTerms, CostedCandidate } from './compared-quote';
import { ComparisonGrid, ComparisonHead } from './comparison-grid';
import { LineName, FigureRow } from './comparison-row';
import { lineRows, totalRow } from './comparison-rows';
import { FactRows } from './fact-rows';
import { explanations } from './explain-cost';

interface QuoteComparisonProps {
  quotes: readonly ComparedQuote[];
  candidate: CostedCandidate;
  terms: CostTerms;
  /** What may be done with a quote, below its name. */
  action?: (quote: ComparedQuote) => ReactNode;
}

/** Quotes side by side: each line of the life-cycle cost, totals, and whether they can be bought by in time. */
export function QuoteComparison({ quotes, candidate, terms, action }: QuoteComparisonProps) {
  const open = useOpenRows();
  const explained = explanations(terms, candidate);
  const row = (id: keyof typeof explained) => ({ quotes, explanation: explained[id], ...open(id) });
  return (
    <ComparisonGrid columns={quotes.length}>
      <caption className="visually-hidden">The quotes side by side</caption>
      <ComparisonHead quotes={quotes} action={action} />
      <tbody>
        {lineRows(quotes).map(({ line, figures }) => (
          <FigureRow key={line.id} name={<LineName line={line} />} figures={figures} {...row(line.id)} />
        ))}
        <FigureRow
          name="Life-cycle cost"
          total
          quotes={quotes}
          figures={totalRow(quotes, ({ cost }) => cost.lifeCycleCost)}
        />
        <FigureRow
          name="Equivalent annual cost"
          figures={totalRow(quotes, ({ cost }) => cost.equivalentAnnualCost)}
          {...row('annual')}
        />
        <FigureRow
          name="Capital, gross"
          figures={totalRow(quotes, ({ cost }) => cost.capital)}
          {...row('capital')}
        />
        <FactRows quotes={quotes} terms={terms} />
      </tbody>
    </ComparisonGrid>
  );
}

function useOpenRows() {
  const tableId = useId();
  const [opened, setOpened] = useState<ReadonlySet<string>>(new Set());
  return (id: string) => ({
    rowId: `${tableId}-${id}`,
    open: opened.has(id),
    onToggle: () =>
      setOpened((before) => new Set(before.has(id) ? [...before].filter((o) => o !== id) : [...before, id])),
  });
}
