import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import type { Round } from '../rounds/entities/round.entity.js';
import { RoundStage } from '../rounds/round-stages.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { BenefitsService } from './benefits.service.js';
import { CriteriaService } from './criteria.service.js';

/** What scoring asks for before a round opens it, and before a round closes it. */
@Injectable()
export class ScoringReadiness implements OnModuleInit {
  constructor(
    private readonly rounds: RoundsService,
    private readonly criteria: CriteriaService,
    private readonly benefits: BenefitsService,
  ) {}

  onModuleInit() {
    this.rounds.addReadinessCheck((em, round) => this.missing(em, round));
  }

  private async missing(em: EntityManager, round: Round): Promise<string[]> {
    const candidates = await em.find(Candidate, { where: { roundId: round.id }, order: { code: 'ASC' } });
    if (round.stage === RoundStage.GATHER) return this.missingToOpen(round, candidates);
    if (round.stage === RoundStage.SCORE) return this.missingToClose(round, candidates);
    return [];
  }

  private async missingToOpen({ id }: Round, candidates: readonly Candidate[]): Promise<string[]> {
    const criteria = await this.criteria.ofRound(id);
    const missing = candidates.length ? [] : ['There is no candidate yet.'];
    if (criteria.every(({ swingWeight }) => swingWeight === 0))
      missing.push('No criterion has a weight yet.');
    return missing;
  }

  /** A single missing score only lowers the number behind a mean; a criterion nobody scored would count as 0. */
  private async missingToClose({ id }: Round, candidates: readonly Candidate[]): Promise<string[]> {
    const benefits = await this.benefits.ofRound(id);
    return candidates.flatMap(({ id: candidateId, code, name }) =>
      (benefits.get(candidateId)?.unscoredCriteria ?? []).map(
        (criterion) => `Nobody has scored ${code} ${name} on ${criterion}.`,
      ),
    );
  }
}
