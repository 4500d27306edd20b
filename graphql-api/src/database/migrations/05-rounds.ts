import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Rounds with their assumptions and exchange rates. */
export class Rounds1764600005000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.round (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        name text not null,
        stage text not null default 'GATHER' check (stage in ('GATHER','SCORE','SEARCH','DECIDE','ORDER','CLOSED')),
        opened_on date not null default current_date,
        scoring_closes_on date not null,
        decision_date date not null,
        ceiling_minor bigint not null check (ceiling_minor >= 0),
        held_back_percent numeric(5,2) not null default 0 check (held_back_percent between 0 and 100),
        discount_rate numeric(7,5) not null check (discount_rate > -1 and discount_rate < 1),
        payment_timing text not null default 'END_OF_YEAR' check (payment_timing in ('END_OF_YEAR','MIDDLE_OF_YEAR')),
        vat_rate numeric(6,4) not null check (vat_rate >= 0 and vat_rate < 1),
        longest_lead_weeks int not null default 48 check (longest_lead_weeks > 0),
        price_basis text not null default '',
        version int not null default 1,
        primary key (organisation_id, id),
        unique (organisation_id, name)
      );
      ${guard('round')}

      create table metewand.exchange_rate (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        currency char(3) not null,
        rate numeric(18,8) not null check (rate > 0),
        as_of date not null,
        source text not null default '',
        primary key (organisation_id, id),
        unique (organisation_id, round_id, currency),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade
      );
      ${guard('exchange_rate')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.exchange_rate, metewand.round');
  }
}
