import type { CandidateDetailsFragment } from '../features/candidates/candidate-details.generated';
import type { CandidateRowFragment } from '../features/candidates/candidate-row.generated';
import type { LimitRowFragment } from '../features/limits/limit-row.generated';
import type { RoundCandidatesQuery } from '../routes/round-candidates.generated';
import type { RoundLimitsQuery } from '../routes/round-limits.generated';
import type { RoundOverviewQuery } from '../routes/round-overview.generated';

export const euros = (amount: string) => ({ __typename: 'Money' as const, amount, currency: 'EUR' });
const imaging = { __typename: 'Department' as const, id: 'd-1', name: 'Imaging' };
const alderHouse = { __typename: 'Site' as const, id: 's-1', name: 'Alder House' };
const hanne = { __typename: 'Membership' as const, id: 'm-1', name: 'Hanne Vos' };

const ceiling = {
  version: 3,
  stage: 'SCORE' as const,
  heldBackPercent: '4.00',
  ceiling: euros('2400000.00'),
  spendable: euros('2304000.00'),
};

export function anOverview(
  over: {
    round?: Partial<RoundOverviewQuery['round']>;
    overview?: Partial<RoundOverviewQuery['roundOverview']>;
  } = {},
): RoundOverviewQuery {
  return {
    __typename: 'Query',
    round: {
      __typename: 'Round',
      id: 'round-1',
      name: 'Round 2027',
      openedOn: '2026-09-01',
      scoringClosesOn: '2026-11-30',
      decisionDate: '2027-01-15',
      runs: [],
      ...ceiling,
      ...over.round,
    },
    roundOverview: {
      __typename: 'RoundOverview',
      settled: 11,
      candidates: 46,
      quotes: 149,
      quotesUsable: 142,
      scoresGiven: 1380,
      scoresWanted: 1400,
      asked: euros('3987700.00'),
      askedByDepartment: [
        { __typename: 'DepartmentAsk', candidates: 12, department: imaging, asked: euros('1047000.00') },
      ],
      toSettle: [
        {
          __typename: 'ToSettle',
          kind: 'NO_OPEN_QUOTE',
          title: 'One candidate has no open quote',
          detail: 'C-109',
          candidateIds: ['c-109'],
          by: hanne,
        },
        {
          __typename: 'ToSettle',
          kind: 'SCORE_MISSING',
          title: '3 scores are missing',
          detail: 'C-132',
          candidateIds: ['c-132'],
          by: null,
        },
      ],
      ...over.overview,
    },
    auditFeed: { __typename: 'AuditFeed', items: [anEntry(9, 'Quote Q-2731 of Oslander entered')] },
  };
}

export function anEntry(seq: number, sentence: string) {
  return {
    __typename: 'AuditEntry' as const,
    seq,
    at: '2026-10-01T10:00:00Z',
    sentence,
    detail: 'Echo scanner',
    by: hanne,
  };
}

export function aCandidateRow(over: Partial<CandidateRowFragment> = {}): CandidateRowFragment {
  return {
    __typename: 'Candidate',
    id: 'c-109',
    code: 'C-109',
    name: 'Video endoscope set',
    mandatory: false,
    department: imaging,
    site: alderHouse,
    quotes: [{ __typename: 'Quote', id: 'q-1' }],
    quoteInForce: {
      __typename: 'Quote',
      id: 'q-1',
      validUntil: '2027-06-30',
      vendor: { __typename: 'Vendor', id: 'v-1', name: 'Oslander' },
      cost: { __typename: 'QuoteCost', capital: euros('128200.00'), lifeCycleCost: euros('183600.00') },
    },
    benefit: null,
    links: [],
    ...over,
  };
}

export function aCandidatePage(
  over: {
    page?: Partial<RoundCandidatesQuery['candidates']>;
    stage?: RoundCandidatesQuery['round']['stage'];
  } = {},
): RoundCandidatesQuery {
  return {
    __typename: 'Query',
    viewer: {
      __typename: 'Viewer',
      organisation: {
        __typename: 'Organisation',
        id: 'org-1',
        currency: 'EUR',
        departments: [imaging],
        sites: [alderHouse],
      },
    },
    round: {
      __typename: 'Round',
      id: 'round-1',
      name: 'Round 2027',
      stage: over.stage ?? 'SCORE',
      decisionDate: '2027-01-15',
      discountRate: '0.035',
      ceiling: ceiling.ceiling,
    },
    candidates: {
      __typename: 'CandidatePage',
      total: 46,
      page: 1,
      pageSize: 25,
      all: 46,
      somethingMissing: 9,
      mandatory: 3,
      askedFor: euros('3987700.00'),
      items: [aCandidateRow()],
      ...over.page,
    },
  };
}

export function aCandidate(over: Partial<CandidateDetailsFragment> = {}): CandidateDetailsFragment {
  const { quoteInForce, mandatory, department, site, benefit, id, code, name } = aCandidateRow();
  return {
    __typename: 'Candidate',
    ...{ id, code, name, mandatory, department, site, benefit },
    version: 1,
    need: 'Replaces two towers from 2014.',
    kind: 'REPLACEMENT',
    genericGroup: 'Video endoscope',
    quantity: 1,
    usefulLifeYears: 8,
    residualPercent: '5.00',
    installationDays: '4.00',
    floorAreaM2: '2.50',
    mandatoryReason: '',
    siteNeeds: ['water'],
    keptReason: '',
    quoteInForceReason: 'LOWEST_ANNUAL_COST',
    worksNet: euros('0.00'),
    consumablesYearly: euros('5200.00'),
    energyYearly: euros('120.00'),
    currentRunningYearly: euros('0.00'),
    quotes: [
      {
        __typename: 'Quote',
        id: 'q-1',
        number: 'Q-2624',
        validUntil: '2027-06-30',
        leadWeeks: 12,
        faults: [],
        inForce: true,
        vendor: { __typename: 'Vendor', id: 'v-1', name: 'Oslander' },
        cost: { __typename: 'QuoteCost', lifeCycleCost: euros('183600.00') },
      },
      {
        __typename: 'Quote',
        id: 'q-2',
        number: 'Q-2702',
        validUntil: '2026-12-02',
        leadWeeks: 12,
        faults: ['RUN_OUT'],
        inForce: false,
        vendor: { __typename: 'Vendor', id: 'v-2', name: 'Calder Optik' },
        cost: { __typename: 'QuoteCost', lifeCycleCost: euros('210500.00') },
      },
    ],
    quoteInForce: {
      __typename: 'Quote',
      id: 'q-1',
      cost: { ...quoteInForce!.cost, addedRunningYearly: euros('1200.00') },
    },
    links: [],
    ...over,
  };
}

export function aLimit(over: Partial<LimitRowFragment> = {}): LimitRowFragment {
  return {
    __typename: 'Limit',
    id: 'l-1',
    version: 1,
    name: 'Days of the technical team',
    measure: 'INSTALLATION_DAYS',
    least: null,
    most: '50.00',
    asked: '62.50',
    site: null,
    ...over,
  };
}

export function aLimitsPage(over: Partial<RoundLimitsQuery['round']> = {}): RoundLimitsQuery {
  const { viewer } = aCandidatePage();
  return {
    __typename: 'Query',
    viewer,
    round: {
      __typename: 'Round',
      id: 'round-1',
      name: 'Round 2027',
      ...ceiling,
      limits: [aLimit()],
      links: [],
      ...over,
    },
    roundOverview: { __typename: 'RoundOverview', asked: euros('3987700.00') },
  };
}
