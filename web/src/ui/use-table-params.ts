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
      setParams((before) => withParam(before, 'sort', next.direction === 'desc' ? `-${next.id}` : next.id)),
    /** Sets or, with an empty value, removes a filter; goes back to page 1. */
    setFilter: (name: string, value: string) => setParams((before) => withParam(before, name, value)),
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

function withParam(before: URLSearchParams, name: string, value: string): URLSearchParams {
  const next = new URLSearchParams(before);
  next.delete('page');
  if (value) next.set(name, value);
  else next.delete(name);
  return next;
}
