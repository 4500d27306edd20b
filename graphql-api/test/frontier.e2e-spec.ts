import { TestApp } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';
import { extendQuote } from './extend-quote.js';
import { codesOf, search, startSearch, type RunView } from './runs.js';
import { startWorker, stopWorker } from './worker-process.js';

const CHART = `query ($id: ID!) {
  run(id: $id) { lookedAt { costs benefits } onceKept { costs benefits } round { id } startedBy { name } ceiling { amount } }
}`;
const SEARCH_SECONDS = 180_000;

let app: TestApp;

beforeAll(async () => (app = await TestApp.start()));
afterAll(() => app.stop());

async function aRound(key: 'T1' | 'T2', stage = 'SEARCH') {
  const organisation = await aDemoOrganisation(key, { stage });
  const coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  return { organisation, coordinator, roundId: organisation.roundId };
}

async function withWorker<T>(work: () => Promise<T>): Promise<T> {
  const worker = await startWorker();
  try {
    return await work();
  } finally {
    await stopWorker(worker);
  }
}

const cents = (amount: string) => Math.round(Number(amount) * 100);
const best = (run: RunView) => run.points[run.points.length - 1];

describe('the search over the first demo organisation', () => {
  let round: Awaited<ReturnType<typeof aRound>>;
  let found: RunView;

  beforeAll(async () => {
    round = await aRound('T1');
    found = await withWorker(() => search(round.coordinator, round.roundId));
  }, SEARCH_SECONDS);

  it('reaches the best portfolio known, under all its limits', () => {
    expect(found).toMatchObject({ state: 'FINISHED', number: 1, seed: 1, failure: null, notes: [] });
    expect(best(found)).toMatchObject({ benefit: '818.7213', cost: { amount: '2300556.00' } });
    expect(codesOf(found, best(found))).toHaveLength(29);
  });

  it('adds up: every point is the sum of what it takes, and both figures rise', () => {
    const { points, items } = found;
    const rise = points.slice(1).every((point, i) => {
      const before = points[i];
      return (
        Number(point.benefit) > Number(before.benefit) &&
        Number(point.cost.amount) > Number(before.cost.amount)
      );
    });
    expect(rise).toBe(true);
    for (const { benefit, cost, capital, picks } of points) {
      const taken = picks.map((index) => items[index]);
      expect(taken.reduce((sum, item) => sum + cents(item.capital.amount), 0)).toBe(cents(cost.amount));
      expect(taken.reduce((sum, item) => sum + Number(item.benefit), 0)).toBeCloseTo(Number(benefit), 6);
      expect(taken.filter(({ mandatory }) => mandatory)).toHaveLength(
        items.filter(({ mandatory }) => mandatory).length,
      );
      expect(capital).toEqual(cost);
      expect(cents(cost.amount)).toBeLessThanOrEqual(230_400_000);
    }
  });

  it('says that it has proven all of it', () => {
    const { certificate, points } = found;
    expect(points).toHaveLength(853);
    expect(certificate).toMatchObject({
      status: 'COMPLETE',
      provenStretches: [[0, 2_304_000]],
      gapPercent: 0,
      provenShare: 1,
    });
    expect(certificate.bound.costs).toEqual(points.map(({ cost }) => Number(cost.amount)));
    expect(points.every(({ atMostMore }) => atMostMore === '0.0000')).toBe(true);
    expect(found.progress).toMatchObject({
      bestBenefit: '818.7213',
      share: 1,
      kept: found.points.length,
    });
    expect(found.kneeIndex).toBeGreaterThan(0);
  });

  it('says what else there is at a point', async () => {
    const ASK = `query ($id: ID!, $index: Int!) {
      run(id: $id) { alternatives(pointIndex: $index) { count isExact nextBest { benefit cost { amount } } } }
    }`;
    const last = found.points.length - 1;
    const { run } = await round.coordinator.get(ASK, { id: found.id, index: last });
    expect(run.alternatives).toEqual({ count: 1, isExact: true, nextBest: null });
    const { errors } = await round.coordinator.ask(ASK, { id: found.id, index: last + 1 });
    expect(errors?.[0].message).toBe('Run 1 has no portfolio with the index 853.');
  });

  it('keeps a sample of what it looked at, and of what it once kept', async () => {
    const { run } = await round.coordinator.get(CHART, { id: found.id });
    expect(run).toMatchObject({
      round: { id: round.roundId },
      startedBy: { name: 'Hanne Vos' },
      ceiling: { amount: '2304000.00' },
    });
    for (const { costs, benefits } of [run.lookedAt, run.onceKept]) {
      expect(costs.length).toBe(benefits.length);
      expect(costs.length).toBeGreaterThan(100);
      expect(costs.length).toBeLessThanOrEqual(5_000);
      expect(Math.max(...costs)).toBeLessThanOrEqual(2_304_000);
    }
  });
});

describe('the same on life-cycle cost', () => {
  it(
    'is proven complete too',
    async () => {
      const { coordinator, roundId } = await aRound('T1');
      const run = await withWorker(() => search(coordinator, roundId, { costAxis: 'LIFE_CYCLE' }));
      expect(run.certificate).toMatchObject({ status: 'COMPLETE', gapPercent: 0, provenShare: 1 });
      expect(run.points).toHaveLength(788);
    },
    SEARCH_SECONDS,
  );
});

describe('the search over the second demo organisation', () => {
  it(
    'leaves out and names what has no open quote, and finds the best of the rest, then with both quotes extended',
    async () => {
      const { coordinator, organisation, roundId } = await aRound('T2');
      await withWorker(async () => {
        const run = await search(coordinator, roundId);
        expect(run.certificate).toMatchObject({ status: 'COMPLETE', gapPercent: 0, provenShare: 1 });
        expect(run.points).toHaveLength(48);
        expect(best(run)).toMatchObject({ benefit: '308.9540', cost: { amount: '360800.40' } });
        expect(codesOf(run, best(run)).join(' ')).toBe('D-02 D-03 D-06 D-09 D-11 D-13 D-14 D-15 D-19');
        expect(run.leftOut).toEqual([
          { code: 'D-05', reason: 'No quote is open on the decision date', mandatory: true },
          { code: 'D-16', reason: 'Needs D-17, which cannot be bought in this round', mandatory: false },
          { code: 'D-17', reason: 'No quote is open on the decision date', mandatory: false },
        ]);

        for (const number of ['D05-Q1', 'D17-Q1'])
          await extendQuote(coordinator, organisation.quote(number), '2027-04-30');
        const extended = await search(coordinator, roundId);
        expect(best(extended)).toMatchObject({ benefit: '311.4885', cost: { amount: '358460.40' } });
        expect(extended.leftOut).toEqual([]);
        expect(extended.fingerprint).not.toBe(run.fingerprint);
      });
    },
    SEARCH_SECONDS,
  );

  it(
    'can keep life-cycle cost low instead; the ceiling stays on capital',
    async () => {
      const { coordinator, roundId } = await aRound('T2');
      const run = await withWorker(() => search(coordinator, roundId, { costAxis: 'LIFE_CYCLE' }));
      expect(run.state).toBe('FINISHED');
      expect(best(run)).toMatchObject({ benefit: '308.9540', capital: { amount: '360800.40' } });
      expect(cents(best(run).cost.amount)).toBeGreaterThan(cents(best(run).capital.amount));
      expect(run.points.every(({ capital }) => cents(capital.amount) <= 36_100_000)).toBe(true);
    },
    SEARCH_SECONDS,
  );
});

describe('a search is not started', () => {
  it('before scoring has closed', async () => {
    const { coordinator, roundId } = await aRound('T2', 'SCORE');
    const { errors } = await coordinator.ask(
      'mutation ($input: StartSearchInput!) { startSearch(input: $input) { __typename } }',
      { input: { roundId, costAxis: 'CAPITAL' } },
    );
    expect(errors?.[0].extensions.code).toBe('WRONG_STAGE');
    expect(errors?.[0].message).toMatch(/^Close scoring first/);
  });

  it('when limits collide: they are named, with by how much', async () => {
    const { coordinator, organisation, roundId } = await aRound('T1');
    await change(
      organisation,
      `update metewand.round_limit set most = 1.5 where name = 'Installation days in house'`,
    );
    await change(organisation, 'update metewand.round set ceiling_minor = 20000000');
    const refused = await startSearch(coordinator, roundId);
    expect(refused).toMatchObject({
      __typename: 'LimitsCollide',
      message: 'No portfolio can meet all limits and links of this round.',
    });
    expect(refused.notes).toHaveLength(2);
    expect(refused.notes[0]).toMatch(
      /^What must be taken \(C-.+\) brings cost to 437.916\.00.EUR at least, 245.916\.00.EUR over the ceiling of 192.000\.00.EUR\.$/,
    );
    expect(refused.notes[1]).toMatch(
      /brings Installation days in house to \d+ at least, [\d.]+ over its limit of 1\.5\.$/,
    );
  });

  it('when no quote is open', async () => {
    const { coordinator, organisation, roundId } = await aRound('T2');
    await change(organisation, `update metewand.round set decision_date = '2030-01-01'`);
    expect(await startSearch(coordinator, roundId)).toEqual({
      __typename: 'NothingToSearch',
      message: 'No candidate of this round has a quote that is open on the decision date.',
    });
  });

  it('twice by a double click', async () => {
    const { coordinator, organisation, roundId } = await aRound('T2');
    const answers = await Promise.all([startSearch(coordinator, roundId), startSearch(coordinator, roundId)]);
    expect(answers.map((answer) => answer.__typename).sort()).toEqual(['Run', 'SearchAlreadyRunning']);
    await change(organisation, 'delete from metewand.run');
  });

  it('over a round of another organisation, nor is its run shown', async () => {
    const { coordinator } = await aRound('T2');
    const other = await aRound('T1');
    const START = 'mutation ($input: StartSearchInput!) { startSearch(input: $input) { __typename } }';
    const refused = await coordinator.ask(START, { input: { roundId: other.roundId, costAxis: 'CAPITAL' } });
    expect(refused.errors?.[0].extensions.code).toBe('NOT_FOUND');
    const { id } = await startSearch(other.coordinator, other.roundId);
    expect(
      (await coordinator.ask('query ($id: ID!) { run(id: $id) { id } }', { id })).errors?.[0].extensions.code,
    ).toBe('NOT_FOUND');
    await change(other.organisation, 'delete from metewand.run');
  });
});

function change({ id }: DemoOrganisation, sql: string) {
  return asOwner((client) => inOrganisation(client, id, sql));
}
