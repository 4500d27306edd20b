import type { ReactNode } from 'react';
import styled from 'styled-components';
import type { ComparedQuote } from './compared-quote';

/** The table's frame: scrolls inside on narrow screens while the names of the rows stay in sight. */
export function ComparisonGrid({ columns, children }: { columns: number; children: ReactNode }) {
  return (
    <Scroll role="region" aria-label="The quotes side by side" tabIndex={0}>
      <Grid $columns={columns}>{children}</Grid>
    </Scroll>
  );
}

export function ComparisonHead({
  quotes,
  action,
}: {
  quotes: readonly ComparedQuote[];
  action?: (quote: ComparedQuote) => ReactNode;
}) {
  return (
    <thead>
      <tr>
        <td />
        {quotes.map((quote) => (
          <th key={quote.id} scope="col" className="num">
            <b>{quote.vendor.name}</b> <Number>{quote.number}</Number>
            {action?.(quote)}
          </th>
        ))}
      </tr>
    </thead>
  );
}

const Number = styled.small`
  display: block;
  font-size: 12px;
  white-space: nowrap;
  color: var(--mw-ink-2);
`;

const Scroll = styled.div`
  position: relative;
  overflow-x: auto;
`;

const Grid = styled.table<{ $columns: number }>`
  --name: 216px;
  min-width: calc(var(--name) + ${({ $columns }) => $columns} * 192px);
  width: 100%;
  table-layout: fixed;
  border-collapse: collapse;
  th,
  td {
    height: 34px;
    padding: 2px 16px;
    border-bottom: 1px solid var(--mw-line);
    text-align: left;
    font-weight: 400;
  }
  .num {
    text-align: right;
  }
  tr > :first-child {
    width: var(--name);
    position: sticky;
    left: 0;
    background: var(--mw-surface);
  }
  thead > tr > * {
    padding-block: 6px;
    border-bottom-color: var(--mw-line-strong);
    vertical-align: bottom;
    line-height: 1.25;
    white-space: normal;
  }
  thead b {
    font-weight: 700;
  }
  tbody tr:last-child > * {
    border-bottom: 0;
  }
  tr[data-total] > * {
    font-weight: 700;
    border-top: 1.5px solid var(--mw-ink);
  }
  @media (max-width: 767px) {
    --name: 130px;
    th,
    td {
      padding-inline: 10px;
    }
    tr > :first-child {
      padding-left: 16px;
    }
  }
`;
