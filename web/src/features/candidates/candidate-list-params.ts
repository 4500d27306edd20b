import type { CandidateFilter, CandidateSortKey, CandidateView } from '../../generated/graphql';
import { readPage, readSort } from '../../ui/use-table-params';
import type { Sort } from '../../ui/table';

export const PAGE_SIZE = 25;
export const FIRST_SORT: Sort = { id: 'code', direction: 'asc' };

/** The saved views in order, with their word in the address. */
export const VIEWS = [
  { view: 'ALL', param: '', name: 'All' },
  { view: 'SOMETHING_MISSING', param: 'something-missing', name: 'Something missing' },
  { view: 'MANDATORY', param: 'mandatory', name: 'Mandatory' },
] as const satisfies readonly { view: CandidateView; param: string; name: string }[];

const SORT_KEYS: Record<string, CandidateSortKey> = {
  code: 'CODE',
  name: 'NAME',
  department: 'DEPARTMENT',
  site: 'SITE',
  capital: 'CAPITAL',
  'life-cycle-cost': 'LIFE_CYCLE_COST',
  benefit: 'BENEFIT',
};

/** What the address asks for, as variables of the query. What it does not know is left out. */
export function listVariables(roundId: string, params: URLSearchParams) {
  const sort = readSort(params, FIRST_SORT);
  const filter: CandidateFilter = {
    view: viewOf(params).view,
    search: params.get('q') || null,
    departmentId: params.get('department') || null,
    siteId: params.get('site') || null,
  };
  return {
    roundId,
    filter,
    sort: {
      key: SORT_KEYS[sort.id] ?? ('CODE' as const),
      direction: sort.direction === 'desc' ? ('DESC' as const) : ('ASC' as const),
    },
    page: readPage(params),
    pageSize: PAGE_SIZE,
  };
}

export function viewOf(params: URLSearchParams): (typeof VIEWS)[number] {
  return VIEWS.find(({ param }) => param === (params.get('view') ?? '')) ?? VIEWS[0];
}

/** Whether the address leaves anything out. */
export function isFiltered(params: URLSearchParams): boolean {
  return ['view', 'q', 'department', 'site'].some((name) => params.get(name));
}

/** The address without its filters and page; order and open panel stay. */
export function withoutFilters(params: URLSearchParams): URLSearchParams {
  const next = new URLSearchParams(params);
  ['view', 'q', 'department', 'site', 'page'].forEach((name) => next.delete(name));
  return next;
}

/** The address with the panel of this candidate open. */
export function withPanel(params: URLSearchParams, candidateId: string | null): URLSearchParams {
  const next = new URLSearchParams(params);
  next.delete('open');
  if (candidateId) next.set('candidate', candidateId);
  else next.delete('candidate');
  return next;
}
