import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { AuditData } from '../audit-sentences.js';
import { safeInteger } from '../../common/bigint.transformer.js';

/** One line of the append-only trail. Written by the database function only. */
@Entity('audit_entry')
export class AuditEntryRow {
  @PrimaryColumn('bigint', { transformer: safeInteger }) seq: number;
  @Column('timestamptz') at: Date;
  @Column('uuid', { nullable: true }) membershipId: string | null;
  @Column('text') action: string;
  @Column('uuid', { nullable: true }) roundId: string | null;
  @Column('uuid', { nullable: true }) objectId: string | null;
  @Column('jsonb') data: AuditData;
}
