import { Injectable } from '@nestjs/common';
import type { Candidate } from '../candidates/entities/candidate.entity.js';
import { LinksService } from '../candidates/links.service.js';
import { toMoneyModel } from '../common/models/money.model.js';
import { capitalOf, RoundCostsService, type RoundCosts } from '../costing/round-costs.service.js';
import { MembershipsService } from '../memberships/memberships.service.js';
import { Role } from '../memberships/role.enum.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import type { Department } from '../organisations/entities/department.entity.js';
import { isScoringClosed } from '../rounds/round-stages.js';
import type { Score } from '../scoring/entities/score.entity.js';
import { KnownBenefits } from '../scoring/known-benefits.js';
import type { ScoreSheet } from '../scoring/models/score-sheet.model.js';
import { ScoresService } from '../scoring/scores.service.js';
import { currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { DepartmentAsk, RoundCounts, RoundOverview } from './models/round-overview.model.js';
import { scoreSpreads } from './score-spreads.js';
import { toSettle } from './to-settle.js';

@Injectable()
export class OverviewService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly costs: RoundCostsService,
    private readonly scores: ScoresService,
    private readonly benefits: KnownBenefits,
    private readonly links: LinksService,
    private readonly memberships: MembershipsService,
    private readonly organisations: OrganisationsService,
  ) {}

  /** Where a round stands, from its own figures. */
  ofRound(roundId: string): Promise<RoundOverview> {
    return this.db.transaction(async () => {
      const costs = await this.costs.ofRound(roundId);
      const sheet = await this.scores.sheet(roundId);
      const [coordinator = null] = await this.memberships.withRole(Role.PURCHASING_COORDINATOR);
      const { open, settled } = toSettle({
        costs,
        coordinator,
        round: sheet.round,
        assessors: sheet.assessors,
        unscoredCandidateIds: unscored(sheet),
        spreads: spreadsOf(sheet),
        links: await this.links.ofRound(roundId),
      });
      const quotes = [...costs.priced, ...costs.unpriced].flatMap((each) => each.quotes);
      return {
        toSettle: open,
        settled,
        asked: toMoneyModel(capitalOf(costs.priced), costs.currency),
        askedByDepartment: askedByDepartment(costs, await this.organisations.departments()),
        scoresGiven: sheet.assessors.reduce((sum, { given }) => sum + given, 0),
        scoresWanted: sheet.assessors.reduce((sum, { of }) => sum + of, 0),
        quotesUsable: quotes.filter(({ faults }) => faults.length === 0).length,
        quotes: quotes.length,
        candidates: sheet.candidates.length,
      };
    });
  }

  countsOfRound(roundId: string): Promise<RoundCounts> {
    return this.db.transaction(async () => {
      const { priced, unpriced } = await this.costs.ofRound(roundId);
      const all = [...priced, ...unpriced];
      const missing = await this.benefits.missingByCandidate(roundId);
      return {
        candidates: all.length,
        quotes: all.reduce((sum, { quotes }) => sum + quotes.length, 0),
        quotesToSettle: unpriced.length,
        scoresMissing: [...missing.values()].reduce((sum, count) => sum + count, 0),
      };
    });
  }
}

/** Candidates with scores missing by assessor, out of the scores that the sheet shows to the viewer. */
function unscored(sheet: ScoreSheet): Map<string, string[]> {
  const shown = [...sheet.own, ...sheet.others];
  const known = isScoringClosed(sheet.round.stage)
    ? sheet.assessors.map(({ membership }) => membership.id)
    : [currentMembershipId()];
  return new Map(known.map((membershipId) => [membershipId, unscoredBy(membershipId, sheet, shown)]));
}

function unscoredBy(
  membershipId: string,
  { candidates, criteria }: ScoreSheet,
  scores: readonly Score[],
): string[] {
  const given = new Map<string, number>();
  for (const score of scores) {
    if (score.membershipId === membershipId)
      given.set(score.candidateId, (given.get(score.candidateId) ?? 0) + 1);
  }
  return candidates.filter(({ id }) => (given.get(id) ?? 0) < criteria.length).map(({ id }) => id);
}

function spreadsOf({ round, candidates, criteria, own, others, assessors }: ScoreSheet) {
  if (!isScoringClosed(round.stage)) return undefined;
  const members = assessors.map(({ membership }) => membership);
  return scoreSpreads([...own, ...others], candidates, criteria, members);
}

function askedByDepartment(
  { priced, unpriced, currency }: RoundCosts,
  departments: readonly Department[],
): DepartmentAsk[] {
  const of = <T extends { candidate: Candidate }>(list: readonly T[], { id }: Department) =>
    list.filter(({ candidate }) => candidate.departmentId === id);
  return departments
    .map((department) => ({
      department,
      minor: capitalOf(of(priced, department)),
      candidates: of(priced, department).length + of(unpriced, department).length,
    }))
    .filter(({ candidates }) => candidates > 0)
    .sort((one, other) => other.minor - one.minor)
    .map(({ department, minor, candidates }) => ({
      department,
      candidates,
      asked: toMoneyModel(minor, currency),
    }));
}
