import type { ReactNode } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { currencySign, formatAmountWhole } from '../../lib/money';
import { Table } from '../../ui/table';
import type { Column } from '../../ui/table';
import { useMedia } from '../../ui/use-media';
import { useTableParams } from '../../ui/use-table-params';
import { BenefitRod } from './benefit-rod';
import { CandidateFlags, flagsOf } from './candidate-flags';
import { FIRST_SORT, withPanel } from './candidate-list-params';
import type { CandidateRowFragment } from './candidate-row.generated';

type Row = CandidateRowFragment;

interface CandidateTableProps {
  rows: readonly Row[];
  currency: string;
  decisionDate: string;
  /** Whether benefit is known: scoring has closed. */
  scored: boolean;
  selectedId: string | null;
  empty: ReactNode;
  footer: ReactNode;
}

/** The candidates of the round; pressing a row opens its panel, and the table gives way to it. */
export function CandidateTable({ rows, selectedId, empty, footer, ...facts }: CandidateTableProps) {
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const { sort, setSort } = useTableParams(FIRST_SORT);
  const dense = selectedId !== null;
  const wide = useMedia('(min-width: 1400px)');
  return (
    <Size $dense={dense}>
      <Table
        caption="Candidates"
        columns={columnsFor({ ...facts, dense, wide, params })}
        rows={rows}
        rowKey={({ id }) => id}
        rowHeight={dense ? 36 : 40}
        sort={sort}
        onSort={setSort}
        selectedKey={selectedId ?? undefined}
        onRowPress={({ id }) => void navigate(`?${withPanel(params, id)}`)}
        empty={empty}
        footer={footer}
      />
    </Size>
  );
}

/** The id of the link that names a candidate in the table, for the focus to come back to. */
export function rowLinkId(candidateId: string): string {
  return `candidate-${candidateId}`;
}

interface Facts {
  currency: string;
  decisionDate: string;
  scored: boolean;
  dense: boolean;
  wide: boolean;
  params: URLSearchParams;
}

function columnsFor({ currency, decisionDate, scored, dense, wide, params }: Facts): Column<Row>[] {
  const sign = currencySign(currency);
  const lifeCycleCost: Column<Row> = {
    id: 'life-cycle-cost',
    header: `Life-cycle cost, ${sign}`,
    align: 'end',
    sortable: true,
    firstDirection: 'desc',
    narrow: 'none',
    cell: (row) => amountOf(row.quoteInForce?.cost.lifeCycleCost),
  };
  const site: Column<Row> = {
    id: 'site',
    header: 'Site',
    sortable: true,
    cell: (row) => row.site.name,
  };
  const quotes: Column<Row>[] = [
    { id: 'quotes', header: 'Quotes', align: 'end', narrow: 'none', cell: (row) => row.quotes.length },
    {
      id: 'vendor',
      header: 'Quote in force',
      narrow: 'none',
      cell: (row) => <Vendor>{row.quoteInForce?.vendor.name ?? '—'}</Vendor>,
    },
  ];
  return [
    { id: 'code', header: 'No.', sortable: true, cell: (row) => <Quiet>{row.code}</Quiet> },
    {
      id: 'name',
      header: 'Need',
      sortable: true,
      rowHeader: true,
      cell: (row) => (
        <Name to={`?${withPanel(params, row.id)}`} id={rowLinkId(row.id)}>
          {row.name}
        </Name>
      ),
    },
    { id: 'department', header: 'Department', sortable: true, cell: (row) => row.department.name },
    ...(dense && !wide ? [] : [site]),
    // Where there is no room, the panel shows them.
    ...(wide && !dense ? quotes : []),
    {
      id: 'capital',
      header: `Capital, ${sign}`,
      align: 'end',
      sortable: true,
      firstDirection: 'desc',
      narrow: 'end',
      cell: (row) => amountOf(row.quoteInForce?.cost.capital),
    },
    ...(wide && !dense ? [lifeCycleCost] : []),
    {
      id: 'benefit',
      header: 'Benefit',
      sortable: scored,
      firstDirection: 'desc',
      narrow: 'none',
      cell: (row) => (row.benefit ? <BenefitRod points={row.benefit.points} /> : <NotYet />),
    },
    {
      id: 'flags',
      header: 'Flags',
      narrow: 'tag',
      cell: (row) => <CandidateFlags flags={flagsOf(row, decisionDate)} />,
    },
  ];
}

function NotYet() {
  return (
    <span title="After scoring closes">
      — <span className="visually-hidden">after scoring closes</span>
    </span>
  );
}

function amountOf(amount: { amount: string; currency: string } | undefined): string {
  return amount ? formatAmountWhole(amount) : '—';
}

const Size = styled.div<{ $dense: boolean }>`
  min-width: 0;
  font-size: ${({ $dense }) => ($dense ? 13 : 14)}px;
  tbody th {
    width: 100%;
    min-width: ${({ $dense }) => ($dense ? 168 : 208)}px;
    padding-block: 4px;
    white-space: normal;
    line-height: 1.25;
  }
  tbody td:last-child {
    padding-block: 4px;
    white-space: normal;
  }
`;

const Quiet = styled.span`
  font-size: 13px;
  color: var(--mw-ink-3);
`;

const Name = styled(Link)`
  color: var(--mw-ink);
  text-decoration: none;
  &:hover {
    text-decoration: underline;
  }
  @media (max-width: 767px) {
    display: block;
    min-height: 24px;
  }
`;

const Vendor = styled.span`
  display: block;
  max-width: 84px;
  overflow: hidden;
  text-overflow: ellipsis;
`;
