import styled from 'styled-components';
import { currencySign } from '../../lib/money';
import { Bar } from '../../ui/bar';
import { Button, IconButton } from '../../ui/button';
import { Empty } from '../../ui/empty';
import { Section } from '../../ui/section';
import { Table } from '../../ui/table';
import type { Column } from '../../ui/table';
import type { LimitRowFragment } from './limit-row.generated';
import { MEASURES, limitFigure, standing } from './limit-words';

interface LimitTableProps {
  limits: readonly LimitRowFragment[];
  currency: string;
  /** Left out for members who may not change limits. */
  change?: { onAdd: () => void; onEdit: (id: string) => void; onDelete: (id: string) => void };
}

/** The limits beside the ceiling, and what all candidates together would take of each. */
export function LimitTable({ limits, currency, change }: LimitTableProps) {
  const columns = change ? [...figures(currency), changes(change)] : figures(currency);
  return (
    <Section title="Limits" aside={change && <AddLimit onClick={change.onAdd}>Add limit</AddLimit>}>
      <Table
        framed={false}
        caption="Limits of the round"
        columns={columns}
        rows={limits}
        rowKey={({ id }) => id}
        rowHeight={48}
        empty={
          <Empty plain title="Only the ceiling binds">
            Installation days, floor area, running cost and the number of candidates can be limited too, for
            the group or for one site.
          </Empty>
        }
      />
    </Section>
  );
}

function figures(currency: string): Column<LimitRowFragment>[] {
  const bound = (limit: LimitRowFragment, value: string | null) =>
    value === null ? '—' : limitFigure(limit.measure, value, currency);
  return [
    { id: 'name', header: 'Limit', rowHeader: true, cell: (limit) => <Name>{limit.name}</Name> },
    { id: 'measure', header: 'Measure', cell: (limit) => measureOf(limit, currency) },
    { id: 'site', header: 'Site', cell: (limit) => limit.site?.name ?? 'All sites' },
    {
      id: 'least',
      header: 'Least',
      align: 'end',
      narrow: 'none',
      cell: (limit) => bound(limit, limit.least),
    },
    { id: 'most', header: 'Most', align: 'end', narrow: 'none', cell: (limit) => bound(limit, limit.most) },
    {
      id: 'asked',
      header: 'Asked by all',
      align: 'end',
      narrow: 'end',
      cell: (limit) => (
        <>
          {limitFigure(limit.measure, limit.asked, currency)}
          <Narrow>
            {limit.most === null ? `, least ${bound(limit, limit.least)}` : ` of ${bound(limit, limit.most)}`}
          </Narrow>
        </>
      ),
    },
    {
      id: 'standing',
      header: 'Against the limit',
      cell: (limit) => <Standing limit={limit} currency={currency} />,
    },
  ];
}

function changes({ onEdit, onDelete }: NonNullable<LimitTableProps['change']>): Column<LimitRowFragment> {
  return {
    id: 'change',
    header: 'Change',
    align: 'end',
    narrow: 'tag',
    cell: ({ id, name }) => (
      <Actions>
        <Button size="small" onClick={() => onEdit(id)} aria-label={`Edit ${name}`}>
          Edit
        </Button>
        <IconButton icon="x" label={`Remove ${name}`} variant="quiet" onClick={() => onDelete(id)} />
      </Actions>
    ),
  };
}

function Standing({ limit, currency }: { limit: LimitRowFragment; currency: string }) {
  const { words, binds } = standing(limit, currency);
  const asked = Math.max(0, Number(limit.asked));
  const most = Number(limit.most);
  const greatest = Math.max(asked, most) || 1;
  return (
    <Against>
      {limit.most !== null && <Bar share={asked / greatest} bound={most / greatest} />}
      <span className={binds ? 'caution' : undefined}>{words}</span>
    </Against>
  );
}

function measureOf({ measure }: LimitRowFragment, currency: string): string {
  if (measure === 'ADDED_RUNNING_COST') return `${MEASURES[measure].name}, ${currencySign(currency)}`;
  if (measure === 'FLOOR_AREA') return `${MEASURES[measure].name}, ${MEASURES[measure].unit}`;
  return MEASURES[measure].name;
}

const Name = styled.span`
  white-space: normal;
`;

const Against = styled.span`
  display: grid;
  gap: 3px;
  min-width: 190px;
  padding-block: 4px;
  font-size: 13px;
  color: var(--mw-ink-2);
  .caution {
    font-weight: 600;
    color: var(--mw-caution);
  }
`;

const Narrow = styled.span`
  font-weight: 400;
  @media (min-width: 768px) {
    display: none;
  }
`;

const Actions = styled.span`
  display: inline-flex;
  gap: 4px;
`;

const AddLimit = styled(Button).attrs({ size: 'small', icon: 'plus' })`
  margin-block: -4px;
`;
