import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Limits of a round beside its ceiling. "limit" is a reserved word, so the table is called round_limit. */
export class Limits1764600008000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.round_limit (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        name text not null,
        measure text not null check (measure in ('ADDED_RUNNING_COST','INSTALLATION_DAYS','FLOOR_AREA','CANDIDATES')),
        site_id uuid,
        least numeric(14,2),
        most numeric(14,2),
        version int not null default 1,
        primary key (organisation_id, id),
        unique (organisation_id, round_id, name),
        check (least is not null or most is not null),
        check (least is null or most is null or least <= most),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade,
        foreign key (organisation_id, site_id) references metewand.site (organisation_id, id)
      );
      ${guard('round_limit')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.round_limit');
  }
}
