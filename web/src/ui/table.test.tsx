import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { expect, test, vi } from 'vitest';
import { Pager, pagesToShow } from './pager';
import { Table } from './table';
import type { Column, Sort } from './table';

interface Item {
  id: string;
  name: string;
  cost: number;
}
const ITEMS: Item[] = [
  { id: 'a', name: 'Slit lamp', cost: 3 },
  { id: 'b', name: 'Echo scanner', cost: 9 },
];
const COLUMNS: Column<Item>[] = [
  { id: 'name', header: 'Need', cell: (item) => item.name, rowHeader: true, sortable: true },
  {
    id: 'cost',
    header: 'Cost, €',
    cell: (item) => item.cost,
    align: 'end',
    sortable: true,
    firstDirection: 'desc',
    narrow: 'end',
  },
];

function renderTable(sort: Sort, onSort = vi.fn()) {
  render(
    <Table
      caption="Candidates"
      columns={COLUMNS}
      rows={ITEMS}
      rowKey={(item) => item.id}
      sort={sort}
      onSort={onSort}
      selectedKey="b"
    />,
  );
  return onSort;
}

test('names itself, its columns and its rows', () => {
  renderTable({ id: 'name', direction: 'asc' });
  expect(screen.getByRole('table', { name: 'Candidates' })).toBeVisible();
  expect(screen.getByRole('columnheader', { name: 'Need' })).toHaveAttribute('aria-sort', 'ascending');
  expect(screen.getByRole('columnheader', { name: 'Cost, €' })).not.toHaveAttribute('aria-sort');
  expect(screen.getByRole('rowheader', { name: 'Echo scanner' })).toBeVisible();
  expect(screen.getByRole('row', { name: 'Echo scanner 9' })).toHaveAttribute('aria-current', 'true');
});

test('sorts by the header, figures from the greatest first, and turns the order around', async () => {
  const onSort = renderTable({ id: 'name', direction: 'asc' });
  await userEvent.click(screen.getByRole('button', { name: 'Cost, €' }));
  expect(onSort).toHaveBeenLastCalledWith({ id: 'cost', direction: 'desc' });
  await userEvent.click(screen.getByRole('button', { name: 'Need' }));
  expect(onSort).toHaveBeenLastCalledWith({ id: 'name', direction: 'desc' });
});

test('becomes a list of two-line rows on a narrow screen', () => {
  vi.spyOn(window, 'matchMedia').mockImplementation(
    (media) =>
      ({
        matches: media.includes('767'),
        media,
        addEventListener() {},
        removeEventListener() {},
      }) as unknown as MediaQueryList,
  );
  renderTable({ id: 'cost', direction: 'desc' });
  expect(screen.queryByRole('table')).not.toBeInTheDocument();
  expect(screen.getByRole('list', { name: 'Candidates' })).toHaveTextContent('Slit lampCost, €: 3');
  expect(screen.getByRole('combobox', { name: 'Sort by' })).toHaveDisplayValue('Cost, €, falling');
  vi.restoreAllMocks();
});

test('numbers its pages as links that keep the rest of the address', () => {
  render(
    <MemoryRouter initialEntries={['/x?sort=-cost&page=3']}>
      <Pager page={3} pageSize={50} total={446} noun="candidates" />
    </MemoryRouter>,
  );
  expect(screen.getByText(/101–150 of 446/)).toBeVisible();
  expect(screen.getByRole('link', { name: 'Page 3' })).toHaveAttribute('aria-current', 'page');
  expect(screen.getByRole('link', { name: 'Page 1' })).toHaveAttribute('href', '/x?sort=-cost');
  expect(screen.getByRole('link', { name: 'Next page' })).toHaveAttribute('href', '/x?sort=-cost&page=4');
});

test('leaves gaps between far pages', () => {
  expect(pagesToShow(5, 9)).toEqual([1, undefined, 4, 5, 6, undefined, 9]);
  expect(pagesToShow(1, 2)).toEqual([1, 2]);
});
