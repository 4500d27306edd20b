import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { ReactNode } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import styled from 'styled-components';
import { formatDate } from '../../lib/dates';
import { formatAmount, formatMoney } from '../../lib/money';
import { Table } from '../../ui/table';
import type { Column } from '../../ui/table';
import type { QuoteRowFragment } from './quote-table.generated';
import { QuoteState } from './quote-state';
import { QUOTED_AMOUNT, quotedAmount } from './quoted-amount';

export const QUOTE_ROW: TypedDocumentNode<QuoteRowFragment> = gql`
  fragment QuoteRow on Quote {
    ...QuotedAmount
    number
    validUntil
    faults
    inForce
    vendor {
      id
      name
    }
    candidate {
      id
      code
      name
    }
    cost {
      capital {
        amount
        currency
      }
    }
  }
  ${QUOTED_AMOUNT}
`;

interface QuoteTableProps {
  quotes: readonly QuoteRowFragment[];
  /** Of the organisation. */
  currencySign: string;
  /** Where the quotes of a candidate are compared. */
  pathTo: (candidateId: string) => string;
  empty: ReactNode;
  footer: ReactNode;
}

/** The quotes of a round; each row leads to the comparison of its candidate. */
export function QuoteTable({ quotes, currencySign, pathTo, empty, footer }: QuoteTableProps) {
  const navigate = useNavigate();
  return (
    <Table
      caption="Quotes of the round"
      columns={columnsOf(currencySign, pathTo)}
      rows={quotes}
      rowKey={({ id }) => id}
      onRowPress={({ candidate }) => void navigate(pathTo(candidate.id))}
      empty={empty}
      footer={footer}
    />
  );
}

function columnsOf(
  currencySign: string,
  pathTo: (candidateId: string) => string,
): readonly Column<QuoteRowFragment>[] {
  return [
    {
      id: 'candidate',
      header: 'Candidate',
      rowHeader: true,
      cell: ({ candidate }) => (
        <Name title={candidate.name}>
          <span className="muted">{candidate.code}</span>{' '}
          <Link to={pathTo(candidate.id)}>{candidate.name}</Link>
        </Name>
      ),
    },
    { id: 'vendor', header: 'Vendor', cell: ({ vendor }) => <Vendor>{vendor.name}</Vendor> },
    { id: 'number', header: 'Number', cell: ({ number }) => number },
    {
      id: 'validUntil',
      header: 'Valid until',
      cell: ({ validUntil }) => <time dateTime={validUntil}>{formatDate(validUntil)}</time>,
    },
    {
      id: 'quoted',
      header: 'As quoted',
      align: 'end',
      narrow: 'none',
      cell: (quote) => formatMoney(quotedAmount(quote)),
    },
    {
      id: 'capital',
      header: `Capital, ${currencySign}`,
      align: 'end',
      narrow: 'end',
      cell: ({ cost }) => formatAmount(cost.capital),
    },
    { id: 'state', header: 'State', narrow: 'tag', cell: (quote) => <QuoteState {...quote} /> },
  ];
}

const Name = styled.span`
  @media (min-width: 768px) {
    display: block;
    max-width: 290px;
    overflow: hidden;
    text-overflow: ellipsis;
  }
`;

const Vendor = styled(Name)`
  max-width: 215px;
`;
