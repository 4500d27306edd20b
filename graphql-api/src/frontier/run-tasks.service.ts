import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { Problem } from '@metewand/frontier';
import { JobsService } from '../jobs/jobs.service.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { RunState } from './entities/run.entity.js';
import type { HeldRun } from './run-leases.service.js';
import { TASK_LEASE_SECONDS } from './search-settings.js';
import type { PackedResult, PackedTask, TaskName } from './threads/packed-task.js';
import type { ExchangeAnswer, ExchangeRequest } from './threads/task-exchange.js';

/** The tasks of runs that several workers share. What comes of a task does not depend on who does it, nor how often. */
@Injectable()
export class RunTasksService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly jobs: JobsService,
  ) {}

  /** For the worker that holds the run. With another one it is not heard. */
  exchange(run: HeldRun, { offer, done, wanted, claim }: ExchangeRequest): Promise<ExchangeAnswer> {
    return this.db.transaction(async (em) => {
      if (!(await isHeld(em, run))) return { finished: [], claimed: [] };
      for (const task of offer) await layOut(em, run.id, task);
      for (const result of done) await keep(em, run.id, result);
      if (offer.length > 0) await this.jobs.callToRun(em, run.id);
      const finished = await resultsOf(em, run.id, wanted);
      const claimed = claim > 0 ? await take(em, run.id, claim) : [];
      return { finished, claimed: claimed.map(({ id }) => id) };
    });
  }

  /** Undefined once the run has ended. */
  problemOf(runId: string): Promise<Problem | undefined> {
    return this.db.transaction(async (em) => {
      const [row] = await em.query<{ problem: Problem }[]>(
        'select problem from run where id = $1 and state = $2',
        [runId, RunState.SEARCHING],
      );
      return row?.problem;
    });
  }

  /** For a worker that helps: takes tasks that nobody is at. */
  claim(runId: string, most: number): Promise<PackedTask[]> {
    return this.db.transaction((em) => take(em, runId, most));
  }

  finish(runId: string, { id, digest, result }: PackedResult): Promise<void> {
    return this.db.transaction(async (em) => {
      await em.query(
        `update run_task set task = null, result = $4, lease_until = null
         where run_id = $1 and id = $2 and digest = $3 and task is not null`,
        [runId, id, digest, result],
      );
    });
  }

  /** Says that somebody is still at these tasks; with no seconds, that nobody is any more. */
  renew(runId: string, ids: readonly string[], seconds = TASK_LEASE_SECONDS): Promise<void> {
    return this.db.transaction(async (em) => {
      await em.query(
        `update run_task set lease_until = now() + make_interval(secs => $3)
         where run_id = $1 and id = any ($2) and task is not null`,
        [runId, ids, seconds],
      );
    });
  }
}

async function isHeld(em: EntityManager, { id, attempt }: HeldRun): Promise<boolean> {
  // locked, so that no task is laid out while the run ends
  const rows = await em.query<unknown[]>(
    'select 1 from run where id = $1 and attempt = $2 and state = $3 for share',
    [id, attempt, RunState.SEARCHING],
  );
  return rows.length > 0;
}

async function layOut(em: EntityManager, runId: string, { id, digest, task }: PackedTask): Promise<void> {
  await em.query(
    `insert into run_task (run_id, id, digest, task) values ($1, $2, $3, $4)
     on conflict (organisation_id, run_id, id)
     do update set digest = excluded.digest, task = excluded.task, result = null, lease_until = null
     where run_task.digest <> excluded.digest`,
    [runId, id, digest, task],
  );
}

async function keep(em: EntityManager, runId: string, { id, digest, result }: PackedResult): Promise<void> {
  await em.query(
    `insert into run_task (run_id, id, digest, result) values ($1, $2, $3, $4)
     on conflict (organisation_id, run_id, id)
     do update set digest = excluded.digest, task = null, result = excluded.result, lease_until = null`,
    [runId, id, digest, result],
  );
}

async function resultsOf(
  em: EntityManager,
  runId: string,
  names: readonly TaskName[],
): Promise<Uint8Array[]> {
  if (names.length === 0) return [];
  const rows = await em.query<{ result: Uint8Array }[]>(
    `select result from run_task join unnest($2::text[], $3::text[]) as wanted (id, digest) using (id, digest)
     where run_id = $1 and result is not null`,
    [runId, names.map(({ id }) => id), names.map(({ digest }) => digest)],
  );
  return rows.map(({ result }) => result);
}

async function take(em: EntityManager, runId: string, most: number): Promise<PackedTask[]> {
  const [rows] = await em.query<[PackedTask[], number]>(
    `update run_task set lease_until = now() + make_interval(secs => $3)
     where run_id = $1 and id in (
       select id from run_task
       where run_id = $1 and task is not null and (lease_until is null or lease_until < now())
       limit $2 for update skip locked)
     returning id, digest, task`,
    [runId, most, TASK_LEASE_SECONDS],
  );
  return rows;
}
