import { Injectable } from '@nestjs/common';
import type { Candidate } from '../candidates/entities/candidate.entity.js';
import { RequestLoader } from '../common/request-loader.js';
import { isScoringClosed } from '../rounds/round-stages.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { BenefitsService } from './benefits.service.js';
import type { CandidateBenefit } from './models/candidate-benefit.model.js';
import { formatPoints } from './points.js';

/** Nothing before scoring has closed, or the sum would tell what others scored. */
@Injectable()
export class BenefitByCandidateLoader extends RequestLoader<Candidate, CandidateBenefit | null> {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly benefits: BenefitsService,
  ) {
    super();
  }

  protected batch(candidates: readonly Candidate[]) {
    return this.db.transaction(async () => {
      const byId = new Map<string, CandidateBenefit>();
      for (const roundId of new Set(candidates.map((candidate) => candidate.roundId))) {
        const { stage } = await this.rounds.find(roundId);
        if (!isScoringClosed(stage)) continue;
        for (const [id, benefit] of await this.benefits.ofRound(roundId)) {
          byId.set(id, {
            points: formatPoints(benefit.tenThousandths),
            lowest: formatPoints(benefit.lowest),
            highest: formatPoints(benefit.highest),
            missingScores: benefit.missingScores,
          });
        }
      }
      return candidates.map(({ id }) => byId.get(id) ?? null);
    });
  }
}
