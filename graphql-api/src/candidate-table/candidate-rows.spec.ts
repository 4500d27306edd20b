import type { Candidate } from '../candidates/entities/candidate.entity.js';
import { CandidateSortKey, CandidateView, SortDirection } from './candidate-page.args.js';
import { filterRows, sortRows, type CandidateRow } from './candidate-rows.js';

function aRow({
  code,
  ...rest
}: Partial<CandidateRow> & Partial<Candidate> & { code: string }): CandidateRow {
  const row = {
    departmentName: 'Imaging',
    siteName: 'Ostermere Clinic',
    benefit: null,
    somethingMissing: false,
  };
  const amounts = { capitalMinor: null, lifeCycleCostMinor: null };
  const candidate = { code, name: `Thing ${code}`, genericGroup: '', mandatory: false, ...rest } as Candidate;
  return { ...row, ...amounts, ...rest, candidate };
}

const codes = (rows: CandidateRow[]) => rows.map(({ candidate }) => candidate.code);

describe('filterRows', () => {
  const rows = [
    aRow({ code: 'C-01', name: 'CT scanner', mandatory: true }),
    aRow({ code: 'C-02', genericGroup: 'Computed tomography' }),
    aRow({ code: 'C-03', departmentName: 'Dental', somethingMissing: true, siteId: 'a site' }),
  ];

  it('finds words in code, name, department and generic group, in any case', () => {
    expect(codes(filterRows(rows, { search: 'c-03' }))).toEqual(['C-03']);
    expect(codes(filterRows(rows, { search: 'SCANNER' }))).toEqual(['C-01']);
    expect(codes(filterRows(rows, { search: 'dent' }))).toEqual(['C-03']);
    expect(codes(filterRows(rows, { search: 'tomography' }))).toEqual(['C-02']);
    expect(codes(filterRows(rows, { search: '%' }))).toEqual([]);
  });

  it('shows one view', () => {
    expect(codes(filterRows(rows, { view: CandidateView.MANDATORY }))).toEqual(['C-01']);
    expect(codes(filterRows(rows, { view: CandidateView.SOMETHING_MISSING }))).toEqual(['C-03']);
    expect(codes(filterRows(rows, { view: CandidateView.ALL }))).toHaveLength(3);
  });

  it('asks for all that the filter names at once', () => {
    expect(codes(filterRows(rows, { siteId: 'a site' }))).toEqual(['C-03']);
    expect(codes(filterRows(rows, { siteId: 'a site', search: 'scanner' }))).toEqual([]);
  });
});

describe('sortRows', () => {
  const rows = [
    aRow({ code: 'C-100', capitalMinor: 300 }),
    aRow({ code: 'C-02', capitalMinor: null }),
    aRow({ code: 'C-99', capitalMinor: 300 }),
    aRow({ code: 'C-03', capitalMinor: 1_000 }),
  ];

  it('takes the numbers in codes for numbers', () => {
    const sort = { key: CandidateSortKey.CODE, direction: SortDirection.ASC };
    expect(codes(sortRows(rows, sort))).toEqual(['C-02', 'C-03', 'C-99', 'C-100']);
  });

  it('leaves what is unknown to the end in either direction, and equals by code', () => {
    const sorted = (direction: SortDirection) =>
      codes(sortRows(rows, { key: CandidateSortKey.CAPITAL, direction }));
    expect(sorted(SortDirection.ASC)).toEqual(['C-99', 'C-100', 'C-03', 'C-02']);
    expect(sorted(SortDirection.DESC)).toEqual(['C-03', 'C-99', 'C-100', 'C-02']);
  });
});
