import type { ChildProcess } from 'node:child_process';
import { setTimeout as sleep } from 'node:timers/promises';
import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';
import { knottyProblem } from './knotty-problem.js';
import { ENDED, readRun, runOnce, startSearch, underWay, type RunView } from './runs.js';
import { startWorker, stopWorker } from './worker-process.js';

const STOP = 'mutation ($id: ID!) { stopSearch(runId: $id) { id stopRequested } }';
const SECONDS = 240_000;

let app: TestApp;
let organisation: DemoOrganisation;
let coordinator: Member;
let number = 0;
let alone: RunView;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T2', { stage: 'SEARCH' });
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  alone = await runOfOneWorker(1);
}, SECONDS);
afterAll(() => app.stop());

describe('a run whose proof takes several rounds', () => {
  it('is proven by one worker with one thread, and leaves no tasks behind', async () => {
    expect(alone.certificate).toMatchObject({ status: 'COMPLETE', gapPercent: 0, provenShare: 1 });
    expect(alone.points.length).toBeGreaterThan(1_000);
    expect(await change('select id from metewand.run_task')).toEqual([]);
  });

  it(
    'comes out the same on two threads',
    async () => expect(outcome(await runOfOneWorker(2))).toEqual(outcome(alone)),
    SECONDS,
  );

  it(
    'comes out the same with the help of another worker',
    async () => {
      const id = await aRun();
      await withWorkers(async (start) => {
        await start();
        await start();
        await once(() => isHelped(id));
        expect(outcome(await theEnd(id))).toEqual(outcome(alone));
      });
      expect(await change('select id from metewand.run_task')).toEqual([]);
    },
    SECONDS,
  );

  it(
    'comes out the same when the worker that helps is killed',
    async () => {
      const id = await aRun();
      await withWorkers(async (start) => {
        await start();
        await once(async () => (await stateOf(id)) === 'SEARCHING');
        const helper = await start();
        await once(() => isHelped(id));
        await stopWorker(helper, 'SIGKILL');
        expect(outcome(await theEnd(id))).toEqual(outcome(alone));
      });
    },
    SECONDS,
  );

  it(
    'comes out the same when the worker that holds it is killed, and nothing that was done is done again',
    async () => {
      const id = await aRun();
      await withWorkers(async (start) => {
        const holder = await start();
        await once(async () => (await stateOf(id)) === 'SEARCHING');
        await start();
        await once(() => isHelped(id));
        await stopWorker(holder, 'SIGKILL');
        const before = await finishedTasks(id);
        expect(before.length).toBeGreaterThan(0);
        await once(async () => (await finishedTasks(id)).length > before.length);
        const since = await finishedTasks(id);
        expect(since).toEqual(expect.arrayContaining(before));
        expect(outcome(await theEnd(id))).toEqual(outcome(alone));
      });
    },
    SECONDS,
  );
});

describe('a run under way', () => {
  it(
    'goes to another worker as soon as its own is told to end, and shows no less than before',
    async () => {
      const id = await aRun();
      await withWorkers(async (start) => {
        const leaving = await start();
        const before = await runOnce(coordinator, id, underWay);
        await stopWorker(leaving);
        const [{ free }] = await change(
          'select lease_until < now() as free from metewand.run where id = $1',
          [id],
        );
        expect(free).toBe(true);
        const { progress } = await readRun(coordinator, id);
        expect(progress?.evaluations).toBeGreaterThanOrEqual(before.progress?.evaluations ?? 0);
        await start();
        expect(outcome(await theEnd(id))).toEqual(outcome(alone));
      });
    },
    SECONDS,
  );

  it(
    'can be stopped, and what it has found is kept with what is proven of it',
    async () => {
      await change('delete from metewand.run');
      const { id } = await startSearch(coordinator, organisation.roundId);
      await change('update metewand.run set problem = $2 where id = $1', [id, knottyProblem()]);
      await withWorkers(async (start) => {
        await start();
        await runOnce(coordinator, id, (run) => underWay(run) && run.certificate.status === 'BOUNDED');
        expect(await startSearch(coordinator, organisation.roundId)).toEqual({
          __typename: 'SearchAlreadyRunning',
          message: 'Run 1 is still under way. Wait for its end, or stop and keep it.',
        });
        expect((await coordinator.get(STOP, { id })).stopSearch).toEqual({ id, stopRequested: true });
        const run = await theEnd(id);
        expect(run.state).toBe('STOPPED');
        expect(run.points.length).toBeGreaterThan(0);
        expect(run.certificate.status).toBe('BOUNDED');
        expect(run.certificate.gapPercent).toBeGreaterThan(0);
        expect(run.certificate.provenShare).toBeLessThan(1);
        expect(Math.max(...run.points.map(({ atMostMore }) => Number(atMostMore)))).toBeGreaterThan(0);
      });
      const { auditFeed } = await coordinator.get(
        'query ($id: ID!) { auditFeed(roundId: $id, first: 3) { items { sentence by { name } } } }',
        { id: organisation.roundId },
      );
      expect(auditFeed.items).toEqual([
        { sentence: 'Run 1 ended: stopped and kept', by: null },
        { sentence: 'Run 1 asked to stop', by: { name: 'Callum Reed' } },
        { sentence: 'Run 1 started', by: { name: 'Callum Reed' } },
      ]);
    },
    SECONDS,
  );
});

async function runOfOneWorker(threads: number): Promise<RunView> {
  const id = await aRun();
  const worker = await startWorker(threads);
  const run = await theEnd(id);
  await stopWorker(worker);
  return run;
}

/** However the work ends, the workers started for it do too. */
async function withWorkers(work: (start: () => Promise<ChildProcess>) => Promise<void>) {
  const workers: ChildProcess[] = [];
  try {
    await work(async () => {
      const worker = await startWorker(1);
      workers.push(worker);
      return worker;
    });
  } finally {
    for (const worker of workers) await stopWorker(worker);
  }
}

async function stateOf(id: string): Promise<unknown> {
  const [{ state }] = await change('select state from metewand.run where id = $1', [id]);
  return state;
}

/** The run once it has ended, asked for but once, because its answer is large. */
async function theEnd(id: string): Promise<RunView> {
  await once(async () => ENDED.includes((await stateOf(id)) as string));
  return readRun(coordinator, id);
}

/** The test's own time limit ends the wait for what never comes. */
async function once(isSo: () => Promise<boolean>) {
  while (!(await isSo())) await sleep(100);
}

/** Whether a worker is at the call to this run: the one that holds it passes it over. */
async function isHelped(id: string): Promise<boolean> {
  const called = await asOwner(async (client) => {
    const { rows } = await client.query(
      `select 1 from graphile_worker.jobs
       where task_identifier = 'frontier.task' and locked_at is not null and flags ? $1`,
      [id],
    );
    return rows.length > 0;
  });
  return called && (await finishedTasks(id)).length > 0;
}

/** With the transaction that wrote each, which tells whether it was written again. */
function finishedTasks(id: string) {
  return change(
    'select id, xmin::text as written from metewand.run_task where run_id = $1 and result is not null',
    [id],
  );
}

/** Equal up to its number. */
function outcome({ id: _id, number: _number, progress: _progress, ...run }: RunView) {
  return run;
}

async function aRun(): Promise<string> {
  const items = { currency: 'GBP', spendableMinor: 100, items: [], leftOut: [] };
  number += 1;
  const [{ id }] = await change(
    `insert into metewand.run (round_id, number, cost_axis, seed, evaluations, effort, problem, items, fingerprint, started_by)
     select $1, $2, 'CAPITAL', 1, 300000, 4000000000, $3, $4, 'sha256:none', id from metewand.membership where email = $5
     returning id`,
    [organisation.roundId, number, knottyProblem(), items, organisation.email('PURCHASING_COORDINATOR')],
  );
  await asOwner(async (client) => {
    await client.query('begin');
    await client.query(`select set_config('app.organisation_id', $1, true)`, [organisation.id]);
    await client.query(`select jobs.enqueue('frontier.search', $1)`, [JSON.stringify({ runId: id })]);
    await client.query('commit');
  });
  return id as string;
}

function change(sql: string, parameters: unknown[] = []) {
  return asOwner((client) => inOrganisation(client, organisation.id, sql, parameters));
}
