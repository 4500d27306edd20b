import type { Candidate } from '../candidates/entities/candidate.entity.js';
import {
  CandidateSortKey,
  CandidateView,
  SortDirection,
  type CandidateFilter,
  type CandidateSort,
} from './candidate-page.args.js';

/** A candidate with all that its table is sifted and sorted by. What is unknown is null. */
export interface CandidateRow {
  candidate: Candidate;
  departmentName: string;
  siteName: string;
  capitalMinor: number | null;
  lifeCycleCostMinor: number | null;
  /** Points from 0 to 100. */
  benefit: number | null;
  somethingMissing: boolean;
}

export function filterRows(rows: readonly CandidateRow[], filter: CandidateFilter): CandidateRow[] {
  const sought = filter.search?.toLowerCase() ?? '';
  return rows.filter(
    (row) =>
      inView(row, filter.view ?? CandidateView.ALL) &&
      (!filter.departmentId || row.candidate.departmentId === filter.departmentId) &&
      (!filter.siteId || row.candidate.siteId === filter.siteId) &&
      wordsOf(row).some((words) => words.toLowerCase().includes(sought)),
  );
}

/** What is unknown comes last in either direction; equals stay by code. */
export function sortRows(rows: readonly CandidateRow[], { key, direction }: CandidateSort): CandidateRow[] {
  const sign = direction === SortDirection.DESC ? -1 : 1;
  return [...rows].sort((left, right) => {
    const [a, b] = [VALUES[key](left), VALUES[key](right)];
    if (a === null || b === null) return Number(a === null) - Number(b === null) || byCode(left, right);
    return sign * compare(a, b) || byCode(left, right);
  });
}

export function inView({ candidate, somethingMissing }: CandidateRow, view: CandidateView): boolean {
  if (view === CandidateView.MANDATORY) return candidate.mandatory;
  return view === CandidateView.ALL || somethingMissing;
}

type Value = string | number | null;

const VALUES: Readonly<Record<CandidateSortKey, (row: CandidateRow) => Value>> = {
  [CandidateSortKey.CODE]: ({ candidate }) => candidate.code,
  [CandidateSortKey.NAME]: ({ candidate }) => candidate.name,
  [CandidateSortKey.DEPARTMENT]: ({ departmentName }) => departmentName,
  [CandidateSortKey.SITE]: ({ siteName }) => siteName,
  [CandidateSortKey.CAPITAL]: ({ capitalMinor }) => capitalMinor,
  [CandidateSortKey.LIFE_CYCLE_COST]: ({ lifeCycleCostMinor }) => lifeCycleCostMinor,
  [CandidateSortKey.BENEFIT]: ({ benefit }) => benefit,
};

// Numbers within words count as numbers, so that C-100 follows C-99.
const collator = new Intl.Collator('en', { numeric: true });

function compare(left: string | number, right: string | number): number {
  if (typeof left === 'number' && typeof right === 'number') return left - right;
  return collator.compare(String(left), String(right));
}

function byCode(left: CandidateRow, right: CandidateRow): number {
  return compare(left.candidate.code, right.candidate.code);
}

function wordsOf({ candidate, departmentName }: CandidateRow): string[] {
  return [candidate.code, candidate.name, departmentName, candidate.genericGroup];
}
