import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import { explainInfeasible } from '@metewand/frontier';
import { AuditService } from '../audit/audit.service.js';
import { WrongStageError } from '../common/domain-error.js';
import { JobsService } from '../jobs/jobs.service.js';
import { Round } from '../rounds/entities/round.entity.js';
import { isScoringClosed, RoundStage } from '../rounds/round-stages.js';
import { findOrThrow, lockOrThrow } from '../tenancy/find-or-throw.js';
import { currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { CostAxis } from './cost-axis.enum.js';
import type { StartSearchInput } from './dto/start-search.input.js';
import { LimitsCollide, NothingToSearch, SearchAlreadyRunning } from './dto/start-search.result.js';
import { Run, RunState } from './entities/run.entity.js';
import { ProblemService, UnsearchableError, type FrozenProblem } from './problem.service.js';
import { DEFAULT_SEED, EFFORT, EVALUATIONS } from './search-settings.js';

const UNDER_WAY = [RunState.WAITING, RunState.SEARCHING];

type Refusal = LimitsCollide | NothingToSearch | SearchAlreadyRunning;

/** The members' side of runs. What the worker does with them is in RunLeasesService. */
@Injectable()
export class RunsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly problems: ProblemService,
    private readonly jobs: JobsService,
    private readonly audit: AuditService,
  ) {}

  find(id: string): Promise<Run> {
    return this.db.transaction((em) => findOrThrow(em, Run, 'run', id));
  }

  /** Newest first. */
  ofRound(roundId: string): Promise<Run[]> {
    return this.db.transaction((em) => em.find(Run, { where: { roundId }, order: { number: 'DESC' } }));
  }

  /** Freezes the round's figures and queues a search over them. */
  start({ roundId, costAxis, seed }: StartSearchInput): Promise<Run | Refusal> {
    return this.db.transaction(async (em) => {
      const round = await lockSearchable(em, roundId);
      const underWay = await em.findOneBy(Run, { roundId, state: In(UNDER_WAY) });
      if (underWay) return new SearchAlreadyRunning(underWay.number);
      const frozen = await this.freeze(round, costAxis);
      if (frozen instanceof NothingToSearch) return frozen;
      const collisions = explainInfeasible(frozen.problem, frozen.write);
      if (collisions.length > 0) return new LimitsCollide(collisions);
      return this.queue(em, round, costAxis, seed ?? DEFAULT_SEED, frozen);
    });
  }

  /** Asks the worker to end the search and keep what it has. A run that has ended stays as it is. */
  stop(runId: string): Promise<Run> {
    return this.db.transaction(async (em) => {
      const { roundId, number } = await findOrThrow(em, Run, 'run', runId);
      const asked = await em.update(
        Run,
        { id: runId, state: In(UNDER_WAY), stopRequested: false },
        { stopRequested: true },
      );
      if (asked.affected)
        await this.audit.record(em, 'run.stop', { roundId, objectId: runId, data: { number } });
      return em.findOneByOrFail(Run, { id: runId });
    });
  }

  private async freeze(round: Round, costAxis: CostAxis): Promise<FrozenProblem | NothingToSearch> {
    try {
      const frozen = await this.problems.build(round, costAxis);
      if (frozen.problem.items.length > 0) return frozen;
      return new NothingToSearch('No candidate of this round has a quote that is open on the decision date.');
    } catch (error) {
      if (error instanceof UnsearchableError) return new NothingToSearch(error.message);
      throw error;
    }
  }

  private async queue(
    em: EntityManager,
    round: Round,
    costAxis: CostAxis,
    seed: number,
    frozen: FrozenProblem,
  ) {
    const { problem, input: items, fingerprint } = frozen;
    const latest = await em.maximum(Run, 'number', { roundId: round.id });
    const number = (latest ?? 0) + 1;
    const { id } = await em.save(
      em.create(Run, {
        roundId: round.id,
        number,
        costAxis,
        state: RunState.WAITING,
        seed,
        evaluations: EVALUATIONS,
        effort: EFFORT,
        problem,
        items,
        fingerprint,
        stopRequested: false,
        attempt: 0,
        startedBy: currentMembershipId(),
      }),
    );
    await this.jobs.enqueue(em, 'frontier.search', { runId: id });
    const data = { number, fingerprint };
    await this.audit.record(em, 'run.started', { roundId: round.id, objectId: id, data });
    return em.findOneByOrFail(Run, { id });
  }
}

/** The round, locked so that its stage stays and only one search is started. */
async function lockSearchable(em: EntityManager, roundId: string): Promise<Round> {
  const round = await lockOrThrow(em, Round, 'round', roundId);
  if (!isScoringClosed(round.stage))
    throw new WrongStageError('Close scoring first: the search needs the benefit of each candidate.');
  if (round.stage !== RoundStage.SEARCH) {
    throw new WrongStageError(
      'A portfolio of this round is submitted or approved, so there is nothing to search for.',
    );
  }
  return round;
}
