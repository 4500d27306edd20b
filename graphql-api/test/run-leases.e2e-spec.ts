import { AuditService } from '../src/audit/audit.service.js';
import { RunLeasesService, type HeldRun } from '../src/frontier/run-leases.service.js';
import type { RunProgressRow, RunResultRow } from '../src/frontier/run-result.js';
import { runInScope } from '../src/tenancy/request-context.js';
import { TenantDatabase } from '../src/tenancy/tenant-database.js';
import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';
import { readRun, runOnce } from './runs.js';
import { startWorker, stopWorker } from './worker-process.js';

const PROBLEM = { format: 'metewand-problem/1', items: [{ id: 'A', benefit: 10, cost: 10 }] };

let app: TestApp;
let organisation: DemoOrganisation;
let coordinator: Member;
let leases: RunLeasesService;
let number = 0;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T2', { stage: 'SEARCH' });
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  leases = new RunLeasesService(app.app.get(TenantDatabase), app.app.get(AuditService));
});
afterAll(() => app.stop());

/** Asks as a worker does, in the context of the organisation and of no member. */
function asWorker<T>(work: () => Promise<T>): Promise<T> {
  const caller = {
    organisationId: organisation.id,
    membershipId: null,
    userId: null,
    sessionId: null,
    roles: [],
  };
  return runInScope({ requestId: 'test', caller, loaders: new Map() }, work);
}

const change = (sql: string, parameters: unknown[] = []) =>
  asOwner((client) => inOrganisation(client, organisation.id, sql, parameters));

async function aRun(problem: object = PROBLEM): Promise<string> {
  const items = { currency: 'GBP', spendableMinor: 100, items: [], leftOut: [] };
  number += 1;
  const [{ id }] = await change(
    `insert into metewand.run (round_id, number, cost_axis, seed, evaluations, effort, problem, items, fingerprint, started_by)
     select $1, $2, 'CAPITAL', 1, 1000, 1000, $3, $4, 'sha256:none', id from metewand.membership where email = $5 returning id`,
    [organisation.roundId, number, problem, items, organisation.email('PURCHASING_COORDINATOR')],
  );
  return id as string;
}

const claim = (id: string) => asWorker(() => leases.claim(id));
const renew = (run: HeldRun, progress?: RunProgressRow) => asWorker(() => leases.renew(run, progress));
const fallSilent = (id: string) =>
  change(`update metewand.run set lease_until = now() - interval '1 second' where id = $1`, [id]);

const progressOf = (evaluations: number): RunProgressRow => ({
  evaluations,
  kept: 1,
  points: [{ benefit: evaluations, cost: 10, picks: [] }],
});
const resultOf = (evaluations: number): RunResultRow => ({
  status: 'UNPROVEN',
  stopped: false,
  evaluations,
  points: [{ benefit: evaluations, cost: 10, picks: [] }],
  kneeIndex: null,
  lookedAt: [],
  onceKept: [],
  counts: { lookedAt: evaluations, kept: 1, sinceBeaten: 0 },
  notes: [],
});

async function claimed(id: string): Promise<HeldRun> {
  const run = await claim(id);
  if (!run) throw new Error('The run could not be claimed.');
  return run;
}

describe('a run', () => {
  it('is held by one worker at a time, however often it is delivered', async () => {
    const id = await aRun();
    const claims = await Promise.all([claim(id), claim(id)]);
    expect(claims.map((run) => run?.attempt).sort()).toEqual([1, undefined]);
    expect(await claim(id)).toBeUndefined();
  });

  it('goes to another worker once its own falls silent, which is then heard no more', async () => {
    const id = await aRun();
    const silent = await claimed(id);
    expect(await renew(silent, progressOf(500))).toBe('GO_ON');
    await fallSilent(id);
    const successor = await claimed(id);
    expect(successor).toMatchObject({ attempt: 2, seenEvaluations: 500, problem: PROBLEM });

    expect(await renew(silent, progressOf(900))).toBe('LOST');
    await asWorker(() => leases.finish(silent, resultOf(900)));
    expect(await readRun(coordinator, id)).toMatchObject({
      state: 'SEARCHING',
      progress: { evaluations: 500 },
    });

    await asWorker(() => leases.finish(successor, resultOf(1_000)));
    expect(await readRun(coordinator, id)).toMatchObject({
      state: 'FINISHED',
      progress: { evaluations: 1_000 },
    });
    expect(await claim(id)).toBeUndefined();
  });

  it('never shows less than it has shown before', async () => {
    const id = await aRun();
    await renew(await claimed(id), progressOf(500));
    await fallSilent(id);
    const successor = await claimed(id);
    await renew(successor, progressOf(200));
    expect((await readRun(coordinator, id)).progress?.evaluations).toBe(500);
    await renew(successor, progressOf(700));
    expect((await readRun(coordinator, id)).progress?.evaluations).toBe(700);
  });

  it('tells its worker that somebody wants it to stop', async () => {
    const id = await aRun();
    const run = await claimed(id);
    await coordinator.get('mutation ($id: ID!) { stopSearch(runId: $id) { id } }', { id });
    expect(await renew(run)).toBe('STOP');
  });

  it('is given up once five workers were lost over it', async () => {
    const id = await aRun();
    for (let attempt = 1; attempt <= 5; attempt += 1) {
      await claimed(id);
      await fallSilent(id);
    }
    expect(await claim(id)).toBeUndefined();
    expect(await readRun(coordinator, id)).toMatchObject({
      state: 'FAILED',
      failure: 'The search broke off 5 times and was given up. Start it again.',
    });
  });

  it('waits in the queue once, however often it is found, and for days', async () => {
    const jobs = await asOwner(async (client) => {
      await client.query('begin');
      await client.query(`select set_config('app.organisation_id', $1, true)`, [organisation.id]);
      const payload = JSON.stringify({ runId: organisation.roundId });
      for (let time = 1; time <= 3; time += 1)
        await client.query(`select jobs.enqueue('frontier.search', $1)`, [payload]);
      const { rows } = await client.query('select max_attempts from graphile_worker.jobs where key like $1', [
        `%${organisation.roundId}%`,
      ]);
      await client.query('rollback');
      return rows;
    });
    expect(jobs).toEqual([{ max_attempts: 25 }]);
  });

  it('that waits is found by a worker that starts, and fails in words when its search breaks', async () => {
    const id = await aRun({ ...PROBLEM, items: [{ id: 'A', benefit: 1, cost: 1, secondCost: 1 }] });
    await change(`update metewand.run set created_at = now() - interval '1 minute' where id = $1`, [id]);
    const worker = await startWorker();
    const run = await runOnce(coordinator, id, ({ state }) => state === 'FAILED');
    await stopWorker(worker);
    expect(run.failure).toBe(
      'The search broke off by an error of ours. Nothing you entered is lost; start it again.',
    );
  });
});
