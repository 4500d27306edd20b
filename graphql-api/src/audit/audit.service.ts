import { Injectable } from '@nestjs/common';
import { LessThan, type EntityManager } from 'typeorm';
import { InvalidInputError } from '../common/domain-error.js';
import { LARGEST_PAGE } from '../common/page.args.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { sentenceOf, type AuditAction, type AuditData } from './audit-sentences.js';
import { AuditEntryRow } from './entities/audit-entry.entity.js';
import type { AuditEntry, AuditFeed, AuditVerification } from './models/audit-entry.model.js';

export interface AuditSubject {
  roundId?: string;
  objectId?: string;
  data?: AuditData;
}

@Injectable()
export class AuditService {
  constructor(private readonly db: TenantDatabase) {}

  /** Appends to the trail within the transaction of the change itself: both happen or neither. */
  async record(
    em: EntityManager,
    action: AuditAction,
    { roundId, objectId, data = {} }: AuditSubject,
  ): Promise<void> {
    await em.query('select metewand.audit_append($1, $2, $3, $4)', [
      action,
      roundId ?? null,
      objectId ?? null,
      JSON.stringify(data),
    ]);
  }

  /** Newest first. The cursor is the number of the last entry seen. */
  feed(roundId: string | undefined, first: number, after: string | undefined): Promise<AuditFeed> {
    if (first < 1 || first > LARGEST_PAGE) {
      throw new InvalidInputError([{ field: 'first', message: `Ask for 1 to ${LARGEST_PAGE} entries.` }]);
    }
    if (after !== undefined && !/^\d{1,15}$/.test(after)) {
      throw new InvalidInputError([{ field: 'after', message: 'This is not a cursor of the feed.' }]);
    }
    return this.db.transaction(async (em) => {
      const rows = await em.find(AuditEntryRow, {
        where: { ...(roundId && { roundId }), ...(after !== undefined && { seq: LessThan(Number(after)) }) },
        order: { seq: 'DESC' },
        take: first + 1,
      });
      const items = rows.slice(0, first).map(toEntry);
      const last = items.at(-1);
      return { items, endCursor: last ? String(last.seq) : null, hasMore: rows.length > first };
    });
  }

  verify(): Promise<AuditVerification> {
    return this.db.transaction(async (em) => {
      const broken = await em.query<{ seq: string }[]>(
        'select broken_seq as seq from metewand.audit_verify() order by 1',
      );
      return {
        entries: await em.count(AuditEntryRow),
        whole: broken.length === 0,
        brokenSeqs: broken.map(({ seq }) => Number(seq)),
      };
    });
  }
}

function toEntry({ seq, at, action, data, membershipId }: AuditEntryRow): AuditEntry {
  const detail = typeof data.detail === 'string' ? data.detail : '';
  return { seq, at, action, membershipId, sentence: sentenceOf(action, data), detail };
}
