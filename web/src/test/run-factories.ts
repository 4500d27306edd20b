import type { RunFieldsFragment } from '../features/frontier/run-fields.generated';

type Point = RunFieldsFragment['points'][number];

function eur(amount: string) {
  return { __typename: 'Money' as const, amount, currency: 'EUR' };
}

function aPoint(cost: string, benefit: string, picks: number[], capital = cost): Point {
  return { __typename: 'RunPoint', benefit, atMostMore: null, picks, cost: eur(cost), capital: eur(capital) };
}

function aRunItem(code: string, name: string, mandatory = false): RunFieldsFragment['items'][number] {
  return {
    __typename: 'RunItem',
    candidateId: code,
    code,
    name,
    siteName: 'Alder House',
    departmentName: 'Imaging',
    vendorName: 'Oslander',
    benefit: '10.0000',
    mandatory,
  };
}

/** A run that has ended, unproven, with four portfolios up to 400 000 and a ceiling of 350 000. */
export function aRun(over: Partial<RunFieldsFragment> = {}): RunFieldsFragment {
  return {
    __typename: 'Run',
    id: 'run-7',
    number: 7,
    state: 'FINISHED',
    costAxis: 'CAPITAL',
    createdAt: '2026-12-20T09:00:00Z',
    startedAt: '2026-12-20T09:00:01Z',
    finishedAt: '2026-12-20T09:00:13Z',
    stopRequested: false,
    notes: [],
    failure: null,
    kneeIndex: 1,
    ceiling: eur('350000.00'),
    progress: { __typename: 'RunProgress', lookedAt: 20_000_000, kept: 4, share: 1 },
    certificate: {
      __typename: 'RunCertificate',
      status: 'UNPROVEN',
      gapPercent: null,
      provenShare: 0,
      provenStretches: [],
      bound: { __typename: 'ChartPoints', costs: [], benefits: [] },
    },
    points: [
      aPoint('100000.00', '20.0000', [0]),
      aPoint('200000.00', '50.5000', [0, 1]),
      aPoint('300000.00', '60.2500', [0, 1, 2]),
      aPoint('400000.00', '65.0000', [0, 1, 3]),
    ],
    items: [
      aRunItem('C-01', 'Steam steriliser', true),
      aRunItem('C-02', 'Infusion pumps'),
      aRunItem('C-03', 'Patient monitors'),
      aRunItem('C-04', 'Bone densitometer'),
    ],
    leftOut: [],
    lookedAt: { __typename: 'ChartPoints', costs: [150_000], benefits: [12] },
    onceKept: { __typename: 'ChartPoints', costs: [210_000], benefits: [40] },
    ...over,
  };
}
