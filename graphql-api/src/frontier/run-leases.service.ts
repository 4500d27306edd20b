import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import type { Problem } from '@metewand/frontier';
import { AuditService } from '../audit/audit.service.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Run, RunState } from './entities/run.entity.js';
import type { RunProgressRow, RunResultRow } from './run-result.js';
import { LEASE_SECONDS, MOST_ATTEMPTS } from './search-settings.js';

/** A run as the worker holds it. Every later word about the run names the attempt; with another one it is not heard. */
export interface HeldRun {
  id: string;
  attempt: number;
  problem: Problem;
  seed: number;
  evaluations: number;
  effort: number;
  /** How far somebody has seen this run before. */
  seenEvaluations: number;
}

export type LeaseAnswer = 'GO_ON' | 'STOP' | 'LOST';

/** The worker's side of a run: who holds it, for how long, and what comes of it. */
@Injectable()
export class RunLeasesService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly audit: AuditService,
  ) {}

  /** Takes a run that waits or whose worker fell silent. Nothing when another worker holds it or it has ended. */
  claim(runId: string): Promise<HeldRun | undefined> {
    return this.db.transaction(async (em) => {
      const [row] = await updated<HeldRun>(
        em,
        `update run set attempt = attempt + 1, state = 'SEARCHING', started_at = coalesce(started_at, now()),
                lease_until = now() + make_interval(secs => $2)
         where id = $1 and (state = 'WAITING' or (state = 'SEARCHING' and lease_until < now()))
         returning id, attempt, problem, seed, evaluations::float8 as evaluations,
                   effort::float8 as effort,
                   coalesce((progress->>'evaluations')::float8, 0) as "seenEvaluations"`,
        [runId, LEASE_SECONDS],
      );
      if (!row) return undefined;
      if (row.attempt <= MOST_ATTEMPTS) return row;
      const message = `The search broke off ${MOST_ATTEMPTS} times and was given up. Start it again.`;
      await this.end(em, row, { state: RunState.FAILED, failure: message });
      return undefined;
    });
  }

  /** Says that the worker is alive, and how far it is; a front seen before is never replaced by an earlier one. */
  renew({ id, attempt }: HeldRun, progress?: RunProgressRow): Promise<LeaseAnswer> {
    return this.db.transaction(async (em) => {
      const [row] = await updated<{ stop: boolean }>(
        em,
        `update run set lease_until = now() + make_interval(secs => $3),
                progress = case when $4::jsonb is null
                                  or (progress->>'evaluations')::float8 > ($4::jsonb->>'evaluations')::float8
                                then progress else $4::jsonb end
         where id = $1 and attempt = $2 and state = 'SEARCHING' returning stop_requested as stop`,
        [id, attempt, LEASE_SECONDS, progress ? JSON.stringify(progress) : null],
      );
      if (!row) return 'LOST';
      return row.stop ? 'STOP' : 'GO_ON';
    });
  }

  /** Keeps the result and ends the run. Does nothing when the run was lost meanwhile. */
  finish(run: HeldRun, result: RunResultRow): Promise<void> {
    return this.db.transaction((em) => this.end(em, run, { state: stateOf(result), result }));
  }

  fail(run: HeldRun, failure: string): Promise<void> {
    return this.db.transaction((em) => this.end(em, run, { state: RunState.FAILED, failure }));
  }

  /** The worker goes down: whoever asks next may have the run at once. */
  handBack({ id, attempt }: HeldRun): Promise<void> {
    return this.db.transaction(async (em) => {
      await em.query(
        `update run set lease_until = now() - interval '1 second'
         where id = $1 and attempt = $2 and state = 'SEARCHING'`,
        [id, attempt],
      );
    });
  }

  private async end(em: EntityManager, { id, attempt }: { id: string; attempt: number }, outcome: Outcome) {
    const { affected } = await em.update(
      Run,
      { id, attempt, state: RunState.SEARCHING },
      { ...outcome, finishedAt: () => 'now()' },
    );
    if (!affected) return;
    await em.query('delete from run_task where run_id = $1', [id]);
    const { roundId, number } = await em.findOneByOrFail(Run, { id });
    const data = { number, outcome: WORDS[outcome.state], detail: outcome.failure };
    await this.audit.record(em, 'run.ended', { roundId, objectId: id, data });
  }
}

interface Outcome {
  state: RunState.FINISHED | RunState.STOPPED | RunState.INFEASIBLE | RunState.FAILED;
  result?: RunResultRow;
  failure?: string;
}

const WORDS: Record<Outcome['state'], string> = {
  [RunState.FINISHED]: 'finished',
  [RunState.STOPPED]: 'stopped and kept',
  [RunState.INFEASIBLE]: 'no portfolio meets every limit',
  [RunState.FAILED]: 'failed',
};

function stateOf({ status, stopped }: RunResultRow): Outcome['state'] {
  if (status === 'INFEASIBLE') return RunState.INFEASIBLE;
  return stopped ? RunState.STOPPED : RunState.FINISHED;
}

/** TypeORM gives the rows of an UPDATE … RETURNING beside their number. */
async function updated<T>(em: EntityManager, sql: string, parameters: unknown[]): Promise<T[]> {
  const [rows] = await em.query<[T[], number]>(sql, parameters);
  return rows;
}
