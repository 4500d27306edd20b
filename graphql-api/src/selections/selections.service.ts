import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { ConflictError } from '../common/domain-error.js';
import { Membership } from '../memberships/entities/membership.entity.js';
import { selectionDecided } from '../notifications/messages/selection-decided.js';
import { NotificationsService } from '../notifications/notifications.service.js';
import { PageLinks } from '../notifications/page-links.js';
import { Round } from '../rounds/entities/round.entity.js';
import { RoundStage } from '../rounds/round-stages.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { findOrThrow, lockOrThrow } from '../tenancy/find-or-throw.js';
import { currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { DecideSelectionInput } from './dto/decide-selection.input.js';
import { CommentNeeded, OwnSubmission, SelectionAlreadyDecided } from './dto/decide-selection.result.js';
import { Selection } from './entities/selection.entity.js';
import { OPEN_STATES, transitionOf, type Transition } from './selection-transitions.js';

type Refusal = SelectionAlreadyDecided | OwnSubmission | CommentNeeded;

@Injectable()
export class SelectionsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly audit: AuditService,
    private readonly notifications: NotificationsService,
    private readonly links: PageLinks,
  ) {}

  find(id: string): Promise<Selection> {
    return this.db.transaction((em) => findOrThrow(em, Selection, 'selection', id));
  }

  /** Newest first. */
  ofRound(roundId: string): Promise<Selection[]> {
    return this.db.transaction((em) => em.find(Selection, { where: { roundId }, order: { number: 'DESC' } }));
  }

  /**
   * Approves, returns or declines; never twice, and never by the person who submitted. The round's lock comes first, as
   * in submitting, so that neither overtakes the other.
   */
  decide(input: DecideSelectionInput): Promise<Selection | Refusal> {
    return this.db.transaction(async (em) => {
      const { roundId } = await findOrThrow(em, Selection, 'selection', input.id);
      const round = await lockOrThrow(em, Round, 'round', roundId);
      const selection = await lockOrThrow(em, Selection, 'selection', input.id);
      const transition = transitionOf(selection.state, input.decision);
      if (!transition) return new SelectionAlreadyDecided(selection.number, selection.state);
      if (selection.version !== input.version) throw new ConflictError('selection', selection.version);
      if (selection.submittedBy === currentMembershipId()) return new OwnSubmission();
      if (transition.needsComment && !input.comment) return new CommentNeeded();
      return this.carryOut(em, round, selection, transition, input.comment);
    });
  }

  private async carryOut(
    em: EntityManager,
    round: Round,
    selection: Selection,
    transition: Transition,
    comment: string,
  ) {
    const { state, stage, action } = transition;
    Object.assign(selection, { state, comment, decidedBy: currentMembershipId(), decidedAt: new Date() });
    const decided = await em.save(selection);
    const { id, number } = decided;
    await this.audit.record(em, action, {
      roundId: round.id,
      objectId: id,
      data: { memo: number, detail: comment },
    });
    await this.rounds.moveTo(em, round, stage, `Memo ${number} ${state.toLowerCase()}`);
    await this.tellSubmitter(em, round, decided);
    return decided;
  }

  private async tellSubmitter(
    em: EntityManager,
    round: Round,
    { number, state, comment, submittedBy }: Selection,
  ) {
    const { name } = await em.findOneByOrFail(Membership, { id: currentMembershipId() });
    const message = selectionDecided({
      roundName: round.name,
      memoNumber: number,
      outcome: state.toLowerCase(),
      decidedBy: name,
      comment,
      next:
        round.stage === RoundStage.ORDER ? 'The orders can go out.' : 'The round is open for search again.',
      link: this.links.approval(round.id),
    });
    await this.notifications.write(em, [submittedBy], message);
  }
}

export function hasOpenSelection(em: EntityManager, roundId: string): Promise<boolean> {
  return em.existsBy(Selection, { roundId, state: In([...OPEN_STATES]) });
}
