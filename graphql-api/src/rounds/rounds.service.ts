import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { formatDecimal, money } from '@metewand/money';
import { AuditService } from '../audit/audit.service.js';
import { WrongStageError } from '../common/domain-error.js';
import { readAmounts } from '../common/read-amounts.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { findOrThrow, lockOrThrow, lockVersion } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { SetCeilingInput } from './dto/set-ceiling.input.js';
import { type AdvanceRoundInput, RoundNotReady, type StepBackRoundInput } from './dto/step-round.input.js';
import { ExchangeRate } from './entities/exchange-rate.entity.js';
import { Round } from './entities/round.entity.js';
import { canChangeContents, stageAfter, stageBefore, type RoundStage } from './round-stages.js';

/** Says what is missing before a round may leave its stage. Later features register what they know. */
export type ReadinessCheck = (em: EntityManager, round: Round) => Promise<string[]>;

@Injectable()
export class RoundsService {
  private readonly readinessChecks: ReadinessCheck[] = [];

  constructor(
    private readonly db: TenantDatabase,
    private readonly organisations: OrganisationsService,
    private readonly audit: AuditService,
  ) {}

  addReadinessCheck(check: ReadinessCheck) {
    this.readinessChecks.push(check);
  }

  /** Newest first. */
  all(): Promise<Round[]> {
    return this.db.transaction((em) => em.find(Round, { order: { openedOn: 'DESC', name: 'DESC' } }));
  }

  find(id: string): Promise<Round> {
    return this.db.transaction((em) => findOrThrow(em, Round, 'round', id));
  }

  exchangeRates(roundId: string): Promise<ExchangeRate[]> {
    return this.db.transaction((em) =>
      em.find(ExchangeRate, { where: { roundId }, order: { currency: 'ASC' } }),
    );
  }

  /**
   * The round, locked until the transaction ends, if its contents may be changed. Every change of candidates, quotes,
   * limits and scores passes here first, so changes of one round come one after the other.
   */
  async lockChangeable(em: EntityManager, roundId: string): Promise<Round> {
    const round = await lockOrThrow(em, Round, 'round', roundId);
    if (!canChangeContents(round.stage)) {
      throw new WrongStageError(
        'A portfolio of this round is submitted or approved, so its figures are frozen.',
      );
    }
    return round;
  }

  setCeiling(input: SetCeilingInput): Promise<Round> {
    return this.db.transaction(async (em) => {
      await this.lockChangeable(em, input.roundId);
      const round = await lockVersion(em, Round, 'round', input.roundId, input.version);
      const { currency } = await this.organisations.current();
      const before = formatDecimal(money(round.ceilingMinor, currency));
      round.ceilingMinor = readAmounts(currency, '', { ceiling: input.ceiling }).ceiling;
      round.heldBackPercent = input.heldBackPercent;
      const data = { before, after: input.ceiling, detail: `${input.heldBackPercent} % held back` };
      await this.audit.record(em, 'round.ceiling', { roundId: round.id, data });
      return em.save(round);
    });
  }

  advance({ roundId, version }: AdvanceRoundInput): Promise<Round | RoundNotReady> {
    return this.db.transaction(async (em) => {
      const round = await lockVersion(em, Round, 'round', roundId, version);
      const next = stageAfter(round.stage);
      if (!next)
        throw new WrongStageError('From here the round goes on by submitting and deciding a portfolio.');
      const missing: string[] = [];
      for (const check of this.readinessChecks) missing.push(...(await check(em, round)));
      if (missing.length) return { message: 'The round cannot go on yet.', missing };
      return this.moveTo(em, round, next, '');
    });
  }

  stepBack({ roundId, version, reason }: StepBackRoundInput): Promise<Round> {
    return this.db.transaction(async (em) => {
      const round = await lockVersion(em, Round, 'round', roundId, version);
      const previous = stageBefore(round.stage);
      if (!previous) throw new WrongStageError('The round cannot go back from here.');
      return this.moveTo(em, round, previous, reason);
    });
  }

  /** Changes the stage and writes it down; the caller holds the round's lock. */
  async moveTo(em: EntityManager, round: Round, stage: RoundStage, reason: string): Promise<Round> {
    const data = { before: round.stage, after: stage, detail: reason };
    round.stage = stage;
    await this.audit.record(em, 'round.stage', { roundId: round.id, data });
    return em.save(round);
  }
}
