import { explainInfeasible, parseProblem } from '@metewand/frontier';
import { LinkKind } from '../candidates/entities/link.entity.js';
import { LimitMeasure } from '../limits/entities/limit.entity.js';
import {
  buildProblem,
  type NamedLimit,
  type ProblemCandidate,
  type ProblemLink,
  type ProblemSource,
} from './build-problem.js';
import { CostAxis } from './cost-axis.enum.js';
import { figuresInWords } from './figures-in-words.js';

const aCandidate = (code: string, facts: Partial<ProblemCandidate> = {}): ProblemCandidate => ({
  id: `id of ${code}`,
  code,
  siteId: 'north',
  mandatory: false,
  benefitTenThousandths: 500_000,
  capitalMinor: 10_000,
  lifeCycleCostMinor: 15_000,
  addedRunningYearlyMinor: 1_000,
  installationDays: '2.00',
  floorAreaM2: '1.50',
  ...facts,
});

const aLink = (kind: LinkKind, candidate: string | null, members: string[], bounds = {}): ProblemLink => ({
  kind,
  candidateId: candidate && `id of ${candidate}`,
  memberIds: members.map((code) => `id of ${code}`),
  least: null,
  most: null,
  ...bounds,
});

const aLimit = (name: string, measure: LimitMeasure, bounds: Partial<NamedLimit> = {}): NamedLimit => ({
  name,
  measure,
  siteId: null,
  least: null,
  most: null,
  ...bounds,
});

const aSource = (facts: Partial<ProblemSource> = {}): ProblemSource => ({
  name: 'Round 2027',
  currency: 'EUR',
  costAxis: CostAxis.CAPITAL,
  spendableMinor: 25_000,
  candidates: [aCandidate('A'), aCandidate('B'), aCandidate('C')],
  withoutQuote: new Map(),
  links: [],
  limits: [],
  ...facts,
});

const withoutQuote = (...codes: string[]) => new Map(codes.map((code) => [`id of ${code}`, code]));

describe('the cost axis', () => {
  it('is held by the ceiling when it is capital', () => {
    const { problem } = buildProblem(aSource());
    expect(problem.ceiling).toBe(25_000);
    expect(problem.items[0]).toEqual({ id: 'A', benefit: 500_000, cost: 10_000, uses: [] });
  });

  it('leaves the ceiling to a limit on capital when it is life-cycle cost', () => {
    const { problem } = buildProblem(aSource({ costAxis: CostAxis.LIFE_CYCLE }));
    expect(problem).not.toHaveProperty('ceiling');
    expect(problem.limits).toEqual([{ name: 'Budget ceiling', most: 25_000 }]);
    expect(problem.items[0]).toMatchObject({ cost: 15_000, uses: [10_000] });
  });

  it('takes no life-cycle cost below zero, and names the candidate', () => {
    const candidates = [aCandidate('A', { lifeCycleCostMinor: -1 })];
    expect(() => buildProblem(aSource({ candidates, costAxis: CostAxis.LIFE_CYCLE }))).toThrow(
      'of A is below zero',
    );
    expect(buildProblem(aSource({ candidates })).problem.items).toHaveLength(1);
  });
});

describe('limits', () => {
  it('become sums of uses in whole numbers', () => {
    const limits = [
      aLimit('running', LimitMeasure.ADDED_RUNNING_COST, { most: '30.00' }),
      aLimit('days', LimitMeasure.INSTALLATION_DAYS, { least: '1.00', most: '5.50' }),
    ];
    const { problem } = buildProblem(aSource({ limits }));
    expect(problem.limits).toEqual([
      { name: 'running', most: 3_000 },
      { name: 'days', least: 100, most: 550 },
    ]);
    expect(problem.items[0].uses).toEqual([1_000, 200]);
  });

  it('get a most that cannot bind where they have none', () => {
    const limits = [aLimit('days', LimitMeasure.INSTALLATION_DAYS, { least: '3.00' })];
    expect(buildProblem(aSource({ limits })).problem.limits).toEqual([
      { name: 'days', least: 300, most: 600 },
    ]);
  });

  it('on candidates become counts of those at the site', () => {
    const candidates = [aCandidate('A'), aCandidate('B', { siteId: 'south' })];
    const limits = [aLimit('at south', LimitMeasure.CANDIDATES, { siteId: 'south', least: '1.00' })];
    const { problem } = buildProblem(aSource({ candidates, limits }));
    expect(problem.limits).toEqual([]);
    expect(problem.counts).toEqual([{ name: 'at south', items: ['B'], least: 1 }]);
  });

  it('that collide are explained in the units people know', () => {
    const candidates = [aCandidate('A', { mandatory: true })];
    const limits = [
      aLimit('running', LimitMeasure.ADDED_RUNNING_COST, { most: '5.00' }),
      aLimit('days', LimitMeasure.INSTALLATION_DAYS, { most: '1.50' }),
    ];
    const { problem } = buildProblem(aSource({ candidates, limits, spendableMinor: 9_000 }));
    expect(explainInfeasible(problem, figuresInWords(limits, 'EUR')).map(withPlainSpaces)).toEqual([
      'What must be taken (A) brings cost to 100.00 EUR at least, 10.00 EUR over the ceiling of 90.00 EUR.',
      'What must be taken (A) brings running to 10.00 EUR at least, 5.00 EUR over its limit of 5.00 EUR.',
      'What must be taken (A) brings days to 2 at least, 0.5 over its limit of 1.5.',
    ]);
  });
});

describe('links', () => {
  it('become needs, exclusions and counts by code', () => {
    const links = [
      aLink(LinkKind.NEEDS, 'A', ['C', 'B']),
      aLink(LinkKind.EITHER_OR, null, ['B', 'C']),
      aLink(LinkKind.COUNT, null, ['A', 'B', 'C'], { least: 1, most: 2 }),
    ];
    const { problem } = buildProblem(aSource({ links }));
    expect(problem.items[0].needs).toEqual([['B', 'C']]);
    expect(problem.eitherOr).toEqual([['B', 'C']]);
    expect(problem.counts).toEqual([{ items: ['A', 'B', 'C'], least: 1, most: 2 }]);
  });

  it('give the same problem whatever the order in which they are stored', () => {
    const links = [aLink(LinkKind.EITHER_OR, null, ['B', 'C']), aLink(LinkKind.EITHER_OR, null, ['B', 'A'])];
    expect(buildProblem(aSource({ links })).problem).toEqual(
      buildProblem(aSource({ links: links.toReversed() })).problem,
    );
  });
});

describe('candidates without a quote in force', () => {
  it('are left out with their reason, mandatory or not', () => {
    const built = buildProblem(aSource({ withoutQuote: withoutQuote('M') }));
    expect(built.leftOut).toEqual([
      { candidateId: 'id of M', reason: 'No quote is open on the decision date' },
    ]);
    expect(built.problem.items.map(({ id }) => id)).toEqual(['A', 'B', 'C']);
  });

  it('take along those that need them, and those that need these', () => {
    const links = [aLink(LinkKind.NEEDS, 'A', ['B']), aLink(LinkKind.NEEDS, 'B', ['M'])];
    const built = buildProblem(aSource({ links, withoutQuote: withoutQuote('M') }));
    expect(built.leftOut).toEqual([
      { candidateId: 'id of A', reason: 'Needs B, which cannot be bought in this round' },
      { candidateId: 'id of B', reason: 'Needs M, which cannot be bought in this round' },
      { candidateId: 'id of M', reason: 'No quote is open on the decision date' },
    ]);
    expect(built.problem.items.map(({ id }) => id)).toEqual(['C']);
  });

  it('leave those in that can do with another', () => {
    const links = [aLink(LinkKind.NEEDS, 'A', ['B', 'M'])];
    const built = buildProblem(aSource({ links, withoutQuote: withoutQuote('M') }));
    expect(built.problem.items[0].needs).toEqual([['B']]);
  });

  it('drop out of exclusions and counts', () => {
    const links = [
      aLink(LinkKind.EITHER_OR, null, ['A', 'M']),
      aLink(LinkKind.COUNT, null, ['A', 'M'], { most: 1 }),
    ];
    const { problem } = buildProblem(aSource({ links, withoutQuote: withoutQuote('M') }));
    expect(problem.eitherOr).toEqual([]);
    expect(problem.counts).toEqual([{ items: ['A'], most: 1 }]);
  });
});

it('is a problem that the kernel reads, with what is mandatory', () => {
  const candidates = [aCandidate('A', { mandatory: true }), aCandidate('B')];
  const { problem } = buildProblem(aSource({ candidates }));
  expect(problem.mustInclude).toEqual(['A']);
  expect(parseProblem(JSON.parse(JSON.stringify(problem)))).toEqual(problem);
});

function withPlainSpaces(text: string): string {
  return text.replaceAll('\u00a0', ' ');
}
