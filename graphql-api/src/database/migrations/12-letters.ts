import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Outgoing mail: written in the business transaction, sent by a job afterwards. */
export class Letters1764600012000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.letter (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        membership_id uuid not null,
        subject text not null,
        body text not null,
        state text not null default 'WAITING' check (state in ('WAITING','SENT')),
        created_at timestamptz not null default now(),
        sent_at timestamptz,
        primary key (organisation_id, id),
        foreign key (organisation_id, membership_id) references metewand.membership (organisation_id, id)
      );
      ${guard('letter')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.letter');
  }
}
