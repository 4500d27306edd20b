import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import styled from 'styled-components';
import { currencySign, formatAmount, formatNumber } from '../../lib/money';
import { Button } from '../../ui/button';
import { Pager } from '../../ui/pager';
import { Table } from '../../ui/table';
import type { Column } from '../../ui/table';
import { useNarrow } from '../../ui/use-media';
import { readPage } from '../../ui/use-table-params';
import { downloadText } from './download-text';
import type { Front } from './front';
import { frontierCsv } from './frontier-csv';
import type { Portfolio } from './portfolio';
import { PortfolioLetter } from './portfolio-letter';
import type { Chosen } from './use-chosen';
import { TABLE_PAGE_SIZE } from './table-pages';
import { ViewSwitch } from './view-switch';

interface FrontierTableProps {
  front: Front;
  chosen: Chosen;
  /** The file's name, without its ending. */
  fileName: string;
}

/** The kept portfolios as a table: the chart's equal, with the same selection. */
export function FrontierTable({ front, chosen, fileName }: FrontierTableProps) {
  const { portfolios, items, ceiling } = front;
  const [params] = useSearchParams();
  const pages = Math.ceil(portfolios.length / TABLE_PAGE_SIZE);
  const page = Math.min(readPage(params), pages);
  const rows = portfolios.slice((page - 1) * TABLE_PAGE_SIZE, page * TABLE_PAGE_SIZE);
  const narrow = useNarrow();
  const columns = useMemo(() => columnsOf(front, chosen, narrow), [front, chosen, narrow]);
  const csv = () =>
    frontierCsv(portfolios, { currency: ceiling.currency, codes: items.map(({ code }) => code) });
  return (
    <Table
      caption="Kept portfolios in order of cost"
      columns={columns}
      rows={rows}
      rowKey={({ index }) => String(index)}
      rowHeight={36}
      selectedKey={String(chosen.a)}
      onRowPress={({ index }) => chosen.select(index)}
      footer={
        <>
          <Pager page={page} pageSize={TABLE_PAGE_SIZE} total={portfolios.length} noun="portfolios" />
          <Button size="small" icon="doc" onClick={() => downloadText(`${fileName}.csv`, csv())}>
            Download as CSV
          </Button>
          <ViewSwitch table at={chosen.a} />
        </>
      }
    />
  );
}

/** In two-line rows no header stands above a figure, so the figure says itself what it counts. */
function columnsOf(front: Front, chosen: Chosen, narrow: boolean): Column<Portfolio>[] {
  const { portfolios, knee, costAxis, ceiling } = front;
  const sign = currencySign(ceiling.currency);
  const gained = ({ index, benefit }: Portfolio) => {
    const before = portfolios[index - 1];
    if (!before) return narrow ? 'the cheapest' : '—';
    return `+${formatNumber(benefit - before.benefit, 4)}${narrow ? ' points gained' : ''}`;
  };
  const cost: Column<Portfolio> = {
    id: 'cost',
    header: `${costAxis === 'CAPITAL' ? 'Capital' : 'Life-cycle cost'}, ${sign}`,
    align: 'end',
    narrow: 'title',
    cell: (portfolio) => <SelectCost {...{ portfolio, chosen }} />,
  };
  const capital: Column<Portfolio> = {
    id: 'capital',
    header: `Capital, ${sign}`,
    align: 'end',
    cell: ({ exact }) => `${formatAmount(exact.capital)}${narrow ? ` ${sign} capital` : ''}`,
  };
  return [
    cost,
    ...(costAxis === 'CAPITAL' ? [] : [capital]),
    {
      id: 'benefit',
      header: 'Benefit points',
      align: 'end',
      narrow: 'end',
      cell: ({ exact }) => formatNumber(exact.benefit, 4),
    },
    { id: 'gained', header: 'Points gained', align: 'end', cell: gained },
    {
      id: 'candidates',
      header: 'Candidates',
      align: 'end',
      cell: ({ picks }) => `${picks.length}${narrow ? ' candidates' : ''}`,
    },
    {
      id: 'remark',
      header: 'Remark',
      narrow: 'tag',
      cell: ({ index, aboveCeiling }) => (
        <Remark>
          {index === chosen.a && <PortfolioLetter letter="A" />}
          {index === chosen.b && <PortfolioLetter letter="B" />}
          {index === knee && <span>Knee</span>}
          {aboveCeiling && <span>Above the ceiling</span>}
        </Remark>
      ),
    },
  ];
}

function SelectCost({ portfolio, chosen }: { portfolio: Portfolio; chosen: Chosen }) {
  const { exact, index } = portfolio;
  return (
    <Choose
      type="button"
      aria-pressed={index === chosen.a}
      aria-label={`Select the portfolio at ${formatAmount(exact.cost)}`}
      onClick={() => chosen.select(index)}
    >
      {formatAmount(exact.cost)}
    </Choose>
  );
}

const Choose = styled.button`
  min-height: 28px;
  padding: 0;
  border: 0;
  background: none;
  color: var(--mw-link);
  font-weight: 600;
  cursor: pointer;
  &[aria-pressed='true'] {
    color: var(--mw-ink);
  }
  @media (pointer: coarse) {
    min-height: 44px;
  }
`;

const Remark = styled.span`
  display: inline-flex;
  align-items: center;
  gap: 8px;
`;
