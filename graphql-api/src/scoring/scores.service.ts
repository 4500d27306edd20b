import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { InvalidInputError, NotFoundError, WrongStageError } from '../common/domain-error.js';
import { Membership } from '../memberships/entities/membership.entity.js';
import { MembershipsService } from '../memberships/memberships.service.js';
import { Role } from '../memberships/role.enum.js';
import { isScoringClosed, RoundStage } from '../rounds/round-stages.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { findOrThrow } from '../tenancy/find-or-throw.js';
import { currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { CriteriaService } from './criteria.service.js';
import type { SaveScoreInput } from './dto/save-score.input.js';
import { Criterion } from './entities/criterion.entity.js';
import { Score } from './entities/score.entity.js';
import type { AssessorProgress, ScoreSheet } from './models/score-sheet.model.js';

@Injectable()
export class ScoresService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly criteria: CriteriaService,
    private readonly memberships: MembershipsService,
    private readonly audit: AuditService,
  ) {}

  /** Everything the viewer may see of the round's scores. What others gave stays hidden until scoring has closed. */
  sheet(roundId: string): Promise<ScoreSheet> {
    return this.db.transaction(async (em) => {
      const round = await this.rounds.find(roundId);
      const criteria = await this.criteria.ofRound(roundId);
      const candidates = await em.find(Candidate, { where: { roundId }, order: { code: 'ASC' } });
      const scores = await this.ofRound(roundId);
      const viewer = currentMembershipId();
      const others = scores.filter(({ membershipId }) => membershipId !== viewer);
      return {
        round,
        criteria,
        candidates,
        own: scores.filter(({ membershipId }) => membershipId === viewer),
        others: isScoringClosed(round.stage) ? others : [],
        assessors: await this.progress(em, scores, candidates.length * criteria.length),
      };
    });
  }

  /** Every score of the round, whoever gave it: for sums, not for showing. */
  ofRound(roundId: string): Promise<Score[]> {
    return this.db.transaction((em) =>
      em
        .createQueryBuilder(Score, 'score')
        .innerJoin(Candidate, 'candidate', 'candidate.id = score.candidateId')
        .where('candidate.roundId = :roundId', { roundId })
        .orderBy('candidate.code')
        .addOrderBy('score.id')
        .getMany(),
    );
  }

  /** Gives or changes the caller's own score. */
  save(input: SaveScoreInput): Promise<Score> {
    if (input.cannotJudge === (typeof input.points === 'number')) {
      throw new InvalidInputError([
        { field: 'points', message: 'Give points, or say that you cannot judge; one of the two.' },
      ]);
    }
    return this.db.transaction(async (em) => {
      const candidate = await findOrThrow(em, Candidate, 'candidate', input.candidateId);
      const criterion = await findOrThrow(em, Criterion, 'criterion', input.criterionId);
      if (criterion.roundId !== candidate.roundId) throw new NotFoundError('criterion', input.criterionId);
      const { stage } = await this.rounds.lockChangeable(em, candidate.roundId);
      if (stage !== RoundStage.SCORE) {
        throw new WrongStageError(
          isScoringClosed(stage)
            ? 'Scoring has closed, so scores are frozen.'
            : 'Scoring has not opened yet.',
        );
      }
      const score = await upsert(em, input);
      const detail = `${candidate.code} ${candidate.name}, ${criterion.name}`;
      const subject = { roundId: candidate.roundId, objectId: score.id, data: { detail } };
      await this.audit.record(em, 'score.saved', subject);
      return score;
    });
  }

  /** Everybody who is asked to score, and everybody else who did; of these nothing more is wanted. */
  private async progress(
    em: EntityManager,
    scores: readonly Score[],
    of: number,
  ): Promise<AssessorProgress[]> {
    const given = new Map<string, number>();
    for (const { membershipId } of scores) given.set(membershipId, (given.get(membershipId) ?? 0) + 1);
    const asked = await this.memberships.withRole(Role.CLINICAL_ASSESSOR);
    const askedIds = new Set(asked.map(({ id }) => id));
    const formerIds = [...given.keys()].filter((id) => !askedIds.has(id));
    const former = await em.find(Membership, { where: { id: In(formerIds) }, order: { name: 'ASC' } });
    const givenBy = ({ id }: Membership) => given.get(id) ?? 0;
    return [
      ...asked.map((membership) => ({ membership, given: givenBy(membership), of })),
      ...former.map((membership) => ({
        membership,
        given: givenBy(membership),
        of: givenBy(membership),
      })),
    ];
  }
}

/** One statement, so that a double click cannot give two scores. */
async function upsert(
  em: EntityManager,
  { candidateId, criterionId, points, cannotJudge, reason }: SaveScoreInput,
) {
  const [{ id }] = await em.query<{ id: string }[]>(
    `insert into score (candidate_id, criterion_id, membership_id, points, cannot_judge, reason)
     values ($1, $2, $3, $4, $5, $6)
     on conflict (organisation_id, candidate_id, criterion_id, membership_id) do update
       set points = excluded.points, cannot_judge = excluded.cannot_judge, reason = excluded.reason,
           version = score.version + 1, updated_at = now()
     returning id`,
    [candidateId, criterionId, currentMembershipId(), cannotJudge ? null : points, cannotJudge, reason],
  );
  return em.findOneByOrFail(Score, { id });
}
