import { Fragment } from 'react';
import styled from 'styled-components';
import { Select } from './field';
import type { Column, Sort, TableProps } from './table';

/** The rows of a table as a list: title and figure on the first line, details on the second. */
export function NarrowTable<Row>({
  caption,
  columns,
  rows,
  rowKey,
  sort,
  onSort,
  selectedKey,
}: TableProps<Row>) {
  const at = (place: Column<Row>['narrow']) => columns.filter((column) => placeOf(column) === place);
  return (
    <>
      {sort && onSort && <SortChoice {...{ columns, sort, onSort }} />}
      <ul aria-label={caption}>
        {rows.map((row) => (
          <Item key={rowKey(row)} data-selected={rowKey(row) === selectedKey || undefined}>
            <Title>
              {at('title').map((column) => (
                <span key={column.id}>{column.cell(row)}</span>
              ))}
            </Title>
            <End>
              {at('end').map((column) => (
                <span key={column.id}>
                  <span className="visually-hidden">{column.header}: </span>
                  {column.cell(row)}
                </span>
              ))}
            </End>
            <Details>
              {at('detail').map((column, index) => (
                <Fragment key={column.id}>
                  {index > 0 && <span aria-hidden> · </span>}
                  <span>{column.cell(row)}</span>
                </Fragment>
              ))}
            </Details>
            <Tags>
              {at('tag').map((column) => (
                <span key={column.id}>{column.cell(row)}</span>
              ))}
            </Tags>
          </Item>
        ))}
      </ul>
    </>
  );
}

function placeOf<Row>(column: Column<Row>): Column<Row>['narrow'] {
  return column.narrow ?? (column.rowHeader ? 'title' : 'detail');
}

function SortChoice<Row>({
  columns,
  sort,
  onSort,
}: {
  columns: readonly Column<Row>[];
  sort: Sort;
  onSort: (sort: Sort) => void;
}) {
  const options = columns
    .filter((column) => column.sortable)
    .flatMap(({ id, header }) => [
      { value: `${id} asc`, label: `${header}, rising` },
      { value: `${id} desc`, label: `${header}, falling` },
    ]);
  return (
    <Choice>
      <Select
        aria-label="Sort by"
        options={options}
        value={`${sort.id} ${sort.direction}`}
        onChange={(event) => {
          const [id, direction] = event.target.value.split(' ') as [string, Sort['direction']];
          onSort({ id, direction });
        }}
      />
    </Choice>
  );
}

const Choice = styled.div`
  padding: 8px 16px;
  border-bottom: 1px solid var(--mw-line);
`;

const Item = styled.li`
  display: grid;
  grid-template-columns: minmax(0, 1fr) auto;
  gap: 2px 12px;
  min-height: 44px;
  padding: 10px 16px;
  border-bottom: 1px solid var(--mw-line);
  &[data-selected] {
    background: var(--mw-rod-soft);
    box-shadow: inset 4px 0 0 var(--mw-rod-edge);
  }
`;

const Title = styled.div`
  display: flex;
  flex-wrap: wrap;
  gap: 0 8px;
  font-weight: 600;
  a {
    color: inherit;
    text-decoration: none;
  }
`;

const End = styled.div`
  text-align: right;
  font-weight: 600;
`;

const Details = styled.div`
  font-size: 13px;
  color: var(--mw-ink-2);
`;

const Tags = styled.div`
  display: flex;
  flex-wrap: wrap;
  gap: 4px;
  justify-content: flex-end;
`;
