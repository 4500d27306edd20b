import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Candidates and the links between them. */
export class Candidates1764600006000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.candidate (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        code text not null,
        name text not null,
        need text not null default '',
        department_id uuid not null,
        site_id uuid not null,
        kind text not null check (kind in ('REPLACEMENT','UPGRADE','EXPANSION','NEW_SERVICE','REGULATORY')),
        generic_group text not null default '',
        quantity int not null default 1 check (quantity between 1 and 1000),
        useful_life_years int not null check (useful_life_years between 1 and 50),
        residual_percent numeric(5,2) not null default 0 check (residual_percent between 0 and 100),
        works_net_minor bigint not null default 0 check (works_net_minor >= 0),
        consumables_yearly_minor bigint not null default 0 check (consumables_yearly_minor >= 0),
        energy_yearly_minor bigint not null default 0, -- negative where less is used than now
        current_running_yearly_minor bigint not null default 0 check (current_running_yearly_minor >= 0),
        installation_days numeric(8,2) not null default 0 check (installation_days >= 0),
        floor_area_m2 numeric(8,2) not null default 0 check (floor_area_m2 >= 0),
        mandatory boolean not null default false,
        mandatory_reason text not null default '',
        site_needs text[] not null default '{}',
        kept_quote_id uuid,
        kept_reason text not null default '',
        version int not null default 1,
        primary key (organisation_id, id),
        unique (organisation_id, round_id, code),
        check (not mandatory or mandatory_reason <> ''),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade,
        foreign key (organisation_id, department_id) references metewand.department (organisation_id, id),
        foreign key (organisation_id, site_id) references metewand.site (organisation_id, id)
      );
      ${guard('candidate')}

      -- NEEDS: candidate_id needs at least one member. EITHER_OR: at most one member. COUNT: between least and most.
      create table metewand.link (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        kind text not null check (kind in ('NEEDS','EITHER_OR','COUNT')),
        candidate_id uuid,
        least int check (least >= 0),
        most int check (most >= 0),
        reason text not null default '',
        version int not null default 1,
        primary key (organisation_id, id),
        check ((kind = 'NEEDS') = (candidate_id is not null)),
        check ((kind = 'COUNT') = (least is not null or most is not null)),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade,
        foreign key (organisation_id, candidate_id) references metewand.candidate (organisation_id, id) on delete cascade
      );
      create index on metewand.link (organisation_id, round_id);
      ${guard('link')}

      create table metewand.link_member (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        link_id uuid not null,
        candidate_id uuid not null,
        primary key (organisation_id, id),
        unique (organisation_id, link_id, candidate_id),
        foreign key (organisation_id, link_id) references metewand.link (organisation_id, id) on delete cascade,
        foreign key (organisation_id, candidate_id) references metewand.candidate (organisation_id, id) on delete cascade
      );
      create index on metewand.link_member (organisation_id, candidate_id);
      ${guard('link_member')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.link_member, metewand.link, metewand.candidate');
  }
}
