import type { ReactNode } from 'react';
import styled from 'styled-components';
import { NarrowTable } from './narrow-table';
import { SortHeader } from './sort-header';
import { useNarrow } from './use-media';

export type SortDirection = 'asc' | 'desc';
export interface Sort {
  id: string;
  direction: SortDirection;
}

export interface Column<Row> {
  id: string;
  header: string;
  cell: (row: Row) => ReactNode;
  /** Numbers stand at the end, in tabular figures. */
  align?: 'start' | 'end';
  sortable?: boolean;
  /** The direction of the first press; numbers usually begin with the greatest. */
  firstDirection?: SortDirection;
  /** CSS width. */
  width?: string;
  /** The cell that names the row: at most one column. */
  rowHeader?: boolean;
  /** Place in the two-line row below 768 px: title and end on the first line, detail and tag on the second. */
  narrow?: 'title' | 'end' | 'detail' | 'tag' | 'none';
}

export interface TableProps<Row> {
  /** Says what the table holds; heard, and seen when `showCaption`. */
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  sort?: Sort;
  onSort?: (sort: Sort) => void;
  selectedKey?: string;
  /** Pressing anywhere on the row; the row also needs a link or button of its own for the keyboard. */
  onRowPress?: (row: Row) => void;
  /** Row height in px: 40, dense 36. */
  rowHeight?: number;
  /** Shown in place of rows. */
  empty?: ReactNode;
  /** Below the rows: pager, remarks. */
  footer?: ReactNode;
  /** Ink line on top and surface; off inside a `<Section>`, which has its own. */
  framed?: boolean;
}

/** A plain, accessible table; below 768 px the same rows as a list of two lines. */
export function Table<Row>(props: TableProps<Row>) {
  const narrow = useNarrow();
  const { framed = true, rows, empty, footer } = props;
  return (
    <Frame $framed={framed}>
      {narrow ? <NarrowTable {...props} /> : <WideTable {...props} />}
      {rows.length === 0 && empty}
      {footer && <Footer>{footer}</Footer>}
    </Frame>
  );
}

function WideTable<Row>({
  caption,
  columns,
  rows,
  rowKey,
  sort,
  onSort,
  selectedKey,
  onRowPress,
  rowHeight = 40,
}: TableProps<Row>) {
  return (
    <Scroll>
      <Grid style={{ '--row-height': `${rowHeight}px` }}>
        <caption className="visually-hidden">{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <SortHeader key={column.id} column={column} sort={sort} onSort={onSort} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => {
            const key = rowKey(row);
            const selected = key === selectedKey;
            return (
              <tr
                key={key}
                data-selected={selected || undefined}
                aria-current={selected || undefined}
                data-pressable={onRowPress ? true : undefined}
                onClick={onRowPress && ((event) => !pressedControl(event.target) && onRowPress(row))}
              >
                {columns.map((column) => (
                  <Cell key={column.id} column={column} row={row} />
                ))}
              </tr>
            );
          })}
        </tbody>
      </Grid>
    </Scroll>
  );
}

function Cell<Row>({ column, row }: { column: Column<Row>; row: Row }) {
  const content = column.cell(row);
  if (column.rowHeader) return <th scope="row">{content}</th>;
  return <td className={column.align === 'end' ? 'num' : undefined}>{content}</td>;
}

function pressedControl(target: EventTarget): boolean {
  return target instanceof Element && target.closest('a, button, input, select, label') !== null;
}

const Frame = styled.div<{ $framed: boolean }>`
  min-width: 0;
  background: var(--mw-surface);
  ${({ $framed }) => $framed && 'border: 1px solid var(--mw-line); border-top: 2px solid var(--mw-ink);'}
`;

const Scroll = styled.div`
  overflow-x: auto;
`;

const Grid = styled.table`
  width: 100%;
  border-collapse: collapse;
  th,
  td {
    padding: 0 8px;
    text-align: left;
    white-space: nowrap;
  }
  .num {
    text-align: right;
  }
  tbody th {
    font-weight: 600;
  }
  tbody th a {
    color: inherit;
    text-decoration: none;
  }
  tbody th a:hover {
    text-decoration: underline;
  }
  thead th {
    height: 34px;
    font-size: 12px;
    font-weight: 600;
    color: var(--mw-ink-2);
    border-bottom: 1px solid var(--mw-line-strong);
  }
  tbody th,
  td {
    height: var(--row-height);
    border-bottom: 1px solid var(--mw-line);
  }
  tr > :first-child {
    padding-left: 16px;
  }
  tr > :last-child {
    padding-right: 16px;
  }
  tbody tr[data-pressable] {
    cursor: pointer;
  }
  tbody tr:hover > * {
    background: var(--mw-sunken);
  }
  tbody tr[data-selected] > * {
    background: var(--mw-rod-soft);
  }
  tbody tr[data-selected] > :first-child {
    box-shadow: inset 4px 0 0 var(--mw-rod-edge);
  }
`;

const Footer = styled.div`
  display: flex;
  align-items: center;
  flex-wrap: wrap;
  gap: 8px 16px;
  min-height: 48px;
  padding: 8px 16px;
  font-size: 13px;
  color: var(--mw-ink-2);
`;
