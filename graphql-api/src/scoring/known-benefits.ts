import { Injectable } from '@nestjs/common';
import { CandidateBenefits } from '../candidates/candidate-benefits.js';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { Role } from '../memberships/role.enum.js';
import { isScoringClosed } from '../rounds/round-stages.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { currentCaller, currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { BenefitsService } from './benefits.service.js';
import { CriteriaService } from './criteria.service.js';
import { ScoresService } from './scores.service.js';

/** Answers the candidates' table, and no more than the viewer may see. */
@Injectable()
export class KnownBenefits extends CandidateBenefits {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly criteria: CriteriaService,
    private readonly scores: ScoresService,
    private readonly benefits: BenefitsService,
  ) {
    super();
  }

  byCandidate(roundId: string): Promise<Map<string, number>> {
    return this.db.transaction(async () => {
      const { stage } = await this.rounds.find(roundId);
      if (!isScoringClosed(stage)) return new Map<string, number>();
      const benefits = await this.benefits.ofRound(roundId);
      return new Map([...benefits].map(([id, { tenThousandths }]) => [id, tenThousandths / 10_000]));
    });
  }

  async withScoresMissing(roundId: string): Promise<Set<string>> {
    const missing = await this.missingByCandidate(roundId);
    return new Set([...missing].filter(([, count]) => count > 0).map(([id]) => id));
  }

  /** Before closing an assessor is told of the own scores only; all others of everybody's. */
  missingByCandidate(roundId: string): Promise<Map<string, number>> {
    return this.db.transaction(async (em) => {
      const { stage } = await this.rounds.find(roundId);
      if (!isScoringClosed(stage) && currentCaller().roles.includes(Role.CLINICAL_ASSESSOR)) {
        const criteria = await this.criteria.ofRound(roundId);
        const candidates = await em.find(Candidate, { where: { roundId }, select: { id: true } });
        const missing = new Map(candidates.map(({ id }) => [id, criteria.length]));
        for (const { candidateId, membershipId } of await this.scores.ofRound(roundId)) {
          if (membershipId !== currentMembershipId()) continue;
          missing.set(candidateId, (missing.get(candidateId) ?? 0) - 1);
        }
        return missing;
      }
      const benefits = await this.benefits.ofRound(roundId);
      return new Map([...benefits].map(([id, { missingScores }]) => [id, missingScores]));
    });
  }
}
