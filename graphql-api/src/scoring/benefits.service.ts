import { Injectable } from '@nestjs/common';
import { candidateBenefit } from '@metewand/scoring';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { namesById } from '../common/names-by-id.js';
import { groupByKey } from '../common/request-loader.js';
import { MembershipsService } from '../memberships/memberships.service.js';
import { Role } from '../memberships/role.enum.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { CriteriaService } from './criteria.service.js';
import { ScoresService } from './scores.service.js';

/** Points are whole ten-thousandths. `lowest` and `highest` are what single assessors see. */
export interface Benefit {
  tenThousandths: number;
  lowest: number;
  highest: number;
  /** Scores asked for and not given; who says "cannot judge" has answered. */
  missingScores: number;
  /** Names of the criteria that nobody scored; each counts 0. */
  unscoredCriteria: string[];
}

@Injectable()
export class BenefitsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly criteria: CriteriaService,
    private readonly scores: ScoresService,
    private readonly memberships: MembershipsService,
  ) {}

  /**
   * The benefit of every candidate by id, as the scores stand now. Before scoring closes it must not leave the server:
   * the caller sees to that. Empty while the round has no criteria.
   */
  ofRound(roundId: string): Promise<Map<string, Benefit>> {
    return this.db.transaction(async (em) => {
      const criteria = await this.criteria.ofRound(roundId);
      if (criteria.every(({ swingWeight }) => swingWeight === 0)) return new Map<string, Benefit>();
      const assessorIds = (await this.memberships.withRole(Role.CLINICAL_ASSESSOR)).map(({ id }) => id);
      const candidates = await em.find(Candidate, { where: { roundId }, select: { id: true } });
      const ids = candidates.map(({ id }) => id);
      const scores = await this.scores.ofRound(roundId);
      const scoresOf = groupByKey(ids, scores, ({ candidateId }) => candidateId);
      const nameOf = namesById(criteria);
      return new Map(
        ids.map((id, i) => {
          const given = scoresOf[i].map((score) => ({ ...score, assessorId: score.membershipId }));
          const { benefitTenThousandths, lowest, highest, unscoredCriteria } = candidateBenefit(
            criteria,
            assessorIds,
            given,
          );
          const answered = given.filter(({ assessorId }) => assessorIds.includes(assessorId)).length;
          return [
            id,
            {
              tenThousandths: benefitTenThousandths,
              lowest: Math.round((lowest ?? 0) * 10_000),
              highest: Math.round((highest ?? 0) * 10_000),
              missingScores: assessorIds.length * criteria.length - answered,
              unscoredCriteria: unscoredCriteria.map((criterionId) => nameOf.get(criterionId) ?? criterionId),
            },
          ];
        }),
      );
    });
  }
}
