import styled from 'styled-components';
import { Icon } from './icon';
import type { Column, Sort } from './table';

interface SortHeaderProps<Row> {
  column: Column<Row>;
  sort?: Sort;
  onSort?: (sort: Sort) => void;
}

/** A column header; a button when the column can be sorted. The sorted column keeps its mark. */
export function SortHeader<Row>({ column, sort, onSort }: SortHeaderProps<Row>) {
  const className = column.align === 'end' ? 'num' : undefined;
  const sorted = sort?.id === column.id ? sort.direction : undefined;
  if (!column.sortable || !onSort) {
    return (
      <th scope="col" className={className} style={{ width: column.width }}>
        {column.header}
      </th>
    );
  }
  return (
    <th
      scope="col"
      className={className}
      style={{ width: column.width }}
      aria-sort={sorted && (sorted === 'asc' ? 'ascending' : 'descending')}
    >
      <Press
        type="button"
        $sorted={Boolean(sorted)}
        $end={column.align === 'end'}
        onClick={() => onSort({ id: column.id, direction: next(column, sorted) })}
      >
        {column.header}
        <Icon name={sorted === 'asc' ? 'up' : 'down'} size={11} />
      </Press>
    </th>
  );
}

function next<Row>(column: Column<Row>, sorted: Sort['direction'] | undefined): Sort['direction'] {
  if (!sorted) return column.firstDirection ?? 'asc';
  return sorted === 'asc' ? 'desc' : 'asc';
}

const Press = styled.button<{ $sorted: boolean; $end: boolean }>`
  display: inline-flex;
  flex-direction: ${({ $end }) => ($end ? 'row-reverse' : 'row')};
  align-items: center;
  gap: 3px;
  height: 28px;
  margin: 0 -4px;
  padding: 0 4px;
  border: 0;
  background: none;
  color: ${({ $sorted }) => ($sorted ? 'var(--mw-ink)' : 'inherit')};
  font-weight: ${({ $sorted }) => ($sorted ? 700 : 600)};
  cursor: pointer;
  svg {
    opacity: ${({ $sorted }) => ($sorted ? 1 : 0)};
  }
  &:hover svg,
  &:focus-visible svg {
    opacity: 1;
  }
`;
