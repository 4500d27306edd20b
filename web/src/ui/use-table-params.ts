import { useSearchParams } from 'react-router-dom';
import type { Sort } from './table';

/** Sort and page in the address: `?sort=-benefit&page=2`. A leading minus sorts falling. A new order goes back to page 1. */
export function useTableParams(fallback: Sort) {
  const [params, setParams] = useSearchParams();
  const sort = readSort(params, fallback);
  return {
    sort,
    page: readPage(params),
    setSort: (next: Sort) =>
      setParams((before) => withFilter(before, 'sort', next.direction === 'desc' ? `-${next.id}` : next.id)),
    setFilter: (name: string, value: string) => setParams((before) => withFilter(before, name, value)),
  };
}

/** For loaders, which read the same address. */
export function readSort(params: URLSearchParams, fallback: Sort): Sort {
  const text = params.get('sort');
  if (!text) return fallback;
  return text.startsWith('-') ? { id: text.slice(1), direction: 'desc' } : { id: text, direction: 'asc' };
}

/** The page of the address; anything that is no page is page 1. */
export function readPage(params: URLSearchParams): number {
  const page = Number(params.get('page'));
  return Number.isInteger(page) && page > 0 ? page : 1;
}

/** The address with a filter set or, with an empty value, removed; goes back to page 1. */
export function withFilter(before: URLSearchParams, name: string, value: string): URLSearchParams {
  const next = new URLSearchParams(before);
  next.delete('page');
  if (value) next.set(name, value);
  else next.delete(name);
  return next;
}
