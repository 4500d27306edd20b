import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Criteria of a round and the scores that assessors give. */
export class Scoring1764600009000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.criterion (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        name text not null,
        low_anchor text not null,
        high_anchor text not null,
        swing_weight int not null check (swing_weight between 0 and 1000),
        position int not null,
        primary key (organisation_id, id),
        unique (organisation_id, round_id, name),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade
      );
      ${guard('criterion')}

      create table metewand.score (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        candidate_id uuid not null,
        criterion_id uuid not null,
        membership_id uuid not null,
        points int check (points between 0 and 100),
        cannot_judge boolean not null default false,
        reason text not null default '',
        version int not null default 1,
        updated_at timestamptz not null default now(),
        primary key (organisation_id, id),
        unique (organisation_id, candidate_id, criterion_id, membership_id),
        check (cannot_judge = (points is null)),
        foreign key (organisation_id, candidate_id) references metewand.candidate (organisation_id, id) on delete cascade,
        foreign key (organisation_id, criterion_id) references metewand.criterion (organisation_id, id) on delete cascade,
        foreign key (organisation_id, membership_id) references metewand.membership (organisation_id, id)
      );
      ${guard('score')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.score, metewand.criterion');
  }
}
