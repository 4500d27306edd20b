import { Injectable } from '@nestjs/common';
import { QueryFailedError, type EntityManager } from 'typeorm';
import { describeViolation, totalsOf, violationsOf } from '@metewand/frontier';
import { AuditService } from '../audit/audit.service.js';
import { InvalidInputError, WrongStageError } from '../common/domain-error.js';
import { amountInWords } from '../common/words.js';
import { capitalOf } from '../costing/round-costs.service.js';
import { Run, RunState } from '../frontier/entities/run.entity.js';
import { fingerprintOf } from '../frontier/fingerprint.js';
import { ProblemService, UnsearchableError, type FrozenProblem } from '../frontier/problem.service.js';
import type { RunPointRow, RunResultRow } from '../frontier/run-result.js';
import { LimitsService } from '../limits/limits.service.js';
import { Membership } from '../memberships/entities/membership.entity.js';
import { MembershipsService } from '../memberships/memberships.service.js';
import { Role } from '../memberships/role.enum.js';
import { approvalAsked } from '../notifications/messages/approval-asked.js';
import { NotificationsService } from '../notifications/notifications.service.js';
import { PageLinks } from '../notifications/page-links.js';
import { Round } from '../rounds/entities/round.entity.js';
import { RoundStage } from '../rounds/round-stages.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { BenefitsService } from '../scoring/benefits.service.js';
import { CriteriaService } from '../scoring/criteria.service.js';
import { formatPoints } from '../scoring/points.js';
import { findOrThrow, lockOrThrow } from '../tenancy/find-or-throw.js';
import { currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { buildMemo } from './build-memo.js';
import type { SubmitSelectionInput } from './dto/submit-selection.input.js';
import { RunOutdated, SelectionAlreadyOpen } from './dto/submit-selection.result.js';
import { Selection } from './entities/selection.entity.js';
import { chosenOf, picksOf, type MemoSource } from './memo-source.js';
import { SelectionState } from './selection-transitions.js';
import { hasOpenSelection } from './selections.service.js';

const OPEN_SELECTION_INDEX = 'selection_open';

type Refusal = SelectionAlreadyOpen | RunOutdated;

@Injectable()
export class SubmissionsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly problems: ProblemService,
    private readonly benefits: BenefitsService,
    private readonly criteria: CriteriaService,
    private readonly limits: LimitsService,
    private readonly rounds: RoundsService,
    private readonly memberships: MembershipsService,
    private readonly audit: AuditService,
    private readonly notifications: NotificationsService,
    private readonly links: PageLinks,
  ) {}

  /** Freezes a point of a run as a memo and asks the finance directors to decide on it. */
  async submit(input: SubmitSelectionInput): Promise<Selection | Refusal> {
    try {
      return await this.db.transaction((em) => this.submitLocked(em, input));
    } catch (error) {
      if (breaksOpenIndex(error)) return new SelectionAlreadyOpen();
      throw error;
    }
  }

  private async submitLocked(em: EntityManager, input: SubmitSelectionInput): Promise<Selection | Refusal> {
    const run = await findOrThrow(em, Run, 'run', input.runId);
    const round = await lockOrThrow(em, Round, 'round', run.roundId);
    if (await hasOpenSelection(em, round.id)) return new SelectionAlreadyOpen();
    if (round.stage !== RoundStage.SEARCH) {
      throw new WrongStageError(
        'A portfolio can be submitted once scoring has closed and the search is done.',
      );
    }
    const { result, point } = await this.pointOf(em, run, input.pointIndex);
    const frozen = await this.unchanged(em, round, run);
    if (!frozen) return new RunOutdated(run.number);
    const source = await this.memoSource(round, run, result, point, frozen);
    checkAgain(source, point);
    return this.open(em, source, input.reason);
  }

  private async pointOf(em: EntityManager, run: Run, pointIndex: number) {
    if (run.state !== RunState.FINISHED && run.state !== RunState.STOPPED) {
      throw new WrongStageError(
        `Run ${run.number} has not ended with a result, so there is nothing to submit.`,
      );
    }
    const { result } = await em.findOneOrFail(Run, {
      where: { id: run.id },
      select: { id: true, result: true },
    });
    const point = result?.points[pointIndex];
    if (!result || !point) {
      const message = `Run ${run.number} has no portfolio with the index ${pointIndex}.`;
      throw new InvalidInputError([{ field: 'pointIndex', message }]);
    }
    return { result, point };
  }

  /** The round's problem as it is now, if it is still the one that the run searched. */
  private async unchanged(em: EntityManager, round: Round, run: Run): Promise<FrozenProblem | undefined> {
    const { items } = await em.findOneOrFail(Run, {
      where: { id: run.id },
      select: { id: true, items: true },
    });
    try {
      const frozen = await this.problems.build(round, run.costAxis);
      const sameQuotes = frozen.input.items.every(
        ({ quoteId }, index) => quoteId === items.items[index]?.quoteId,
      );
      return frozen.fingerprint === run.fingerprint && sameQuotes ? frozen : undefined;
    } catch (error) {
      if (error instanceof UnsearchableError) return undefined;
      throw error;
    }
  }

  private async memoSource(
    round: Round,
    run: Run,
    result: RunResultRow,
    { picks }: RunPointRow,
    { problem, input, costs }: FrozenProblem,
  ): Promise<MemoSource> {
    return {
      ...{ round, run, result, problem, input, costs, picks },
      benefits: await this.benefits.ofRound(round.id),
      limits: await this.limits.ofRound(round.id),
      criteria: await this.criteria.ofRound(round.id),
      exchangeRates: await this.rounds.exchangeRates(round.id),
    };
  }

  private async open(em: EntityManager, source: MemoSource, reason: string): Promise<Selection> {
    const { round, run } = source;
    const memo = buildMemo(source);
    const latest = await em.maximum(Selection, 'number', { roundId: round.id });
    const number = (latest ?? 0) + 1;
    const { id } = await em.save(
      em.create(Selection, {
        roundId: round.id,
        runId: run.id,
        number,
        state: SelectionState.SUBMITTED,
        memo,
        fingerprint: fingerprintOf(memo),
        reason,
        comment: '',
        submittedBy: currentMembershipId(),
      }),
    );
    const data = { run: run.number, memo: number, detail: reason };
    await this.audit.record(em, 'selection.submitted', { roundId: round.id, objectId: id, data });
    await this.rounds.moveTo(em, round, RoundStage.DECIDE, `Memo ${number} submitted`);
    await this.askForApproval(em, source, number, reason);
    return em.findOneByOrFail(Selection, { id });
  }

  private async askForApproval(em: EntityManager, source: MemoSource, memoNumber: number, reason: string) {
    const { round, input } = source;
    const chosen = chosenOf(source);
    const capitalMinor = capitalOf(chosen);
    const { name } = await em.findOneByOrFail(Membership, { id: currentMembershipId() });
    const directors = await this.memberships.withRole(Role.FINANCE_DIRECTOR);
    const message = approvalAsked({
      roundName: round.name,
      memoNumber,
      submittedBy: name,
      capital: amountInWords(capitalMinor, input.currency),
      left: amountInWords(input.spendableMinor - capitalMinor, input.currency),
      benefit: formatPoints(totalsOf(source.problem, picksOf(source)).benefit),
      candidates: chosen.length,
      reason,
      link: this.links.approval(round.id),
    });
    await this.notifications.write(
      em,
      directors.map(({ id }) => id),
      message,
    );
  }
}

/** The search's own sums are not believed: feasibility and figures are worked out again from the problem. */
function checkAgain(source: MemoSource, { benefit, cost }: RunPointRow): void {
  const picks = picksOf(source);
  const broken = violationsOf(source.problem, picks);
  if (broken.length > 0)
    throw new Error(`The portfolio breaks a rule: ${broken.map(describeViolation).join('; ')}.`);
  const totals = totalsOf(source.problem, picks);
  if (totals.benefit !== benefit || totals.cost !== cost)
    throw new Error('The sums of the portfolio do not add up.');
}

function breaksOpenIndex(error: unknown): boolean {
  if (!(error instanceof QueryFailedError)) return false;
  const { code, constraint } = error.driverError as { code?: string; constraint?: string };
  return code === '23505' && constraint === OPEN_SELECTION_INDEX;
}
