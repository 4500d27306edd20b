import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Selections: portfolios submitted for approval, frozen as they were. At most one is open in a round. */
export class Selections1764600011000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.selection (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        run_id uuid not null,
        number int not null,
        state text not null default 'SUBMITTED' check (state in ('SUBMITTED','APPROVED','RETURNED','DECLINED')),
        memo jsonb not null,
        fingerprint text not null,
        reason text not null default '',
        submitted_by uuid not null,
        submitted_at timestamptz not null default now(),
        decided_by uuid,
        decided_at timestamptz,
        comment text not null default '',
        version int not null default 1,
        primary key (organisation_id, id),
        unique (organisation_id, round_id, number),
        check (submitted_by <> decided_by),
        check ((state = 'SUBMITTED') = (decided_by is null)),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade,
        foreign key (organisation_id, run_id) references metewand.run (organisation_id, id),
        foreign key (organisation_id, submitted_by) references metewand.membership (organisation_id, id),
        foreign key (organisation_id, decided_by) references metewand.membership (organisation_id, id)
      );
      create unique index selection_open on metewand.selection (organisation_id, round_id) where state in ('SUBMITTED','APPROVED');
      ${guard('selection')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.selection');
  }
}
