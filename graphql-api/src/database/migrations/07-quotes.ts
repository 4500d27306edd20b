import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard, NO_ORGANISATION } from '../guard.js';

/** Vendors, quotes and the documents behind them. Amounts are in minor units of the quote's currency. */
export class Quotes1764600007000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.vendor (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        name text not null,
        primary key (organisation_id, id),
        unique (organisation_id, name)
      );
      ${guard('vendor')}

      create table metewand.quote (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        candidate_id uuid not null,
        vendor_id uuid not null,
        number text not null,
        quote_date date not null,
        valid_until date not null,
        currency char(3) not null,
        prices_include_vat boolean not null default false,
        unit_price_minor bigint not null check (unit_price_minor >= 0),
        quantity int not null default 1 check (quantity between 1 and 1000),
        delivery_minor bigint not null default 0 check (delivery_minor >= 0),
        installation_minor bigint not null default 0 check (installation_minor >= 0),
        training_minor bigint not null default 0 check (training_minor >= 0),
        discount_minor bigint not null default 0 check (discount_minor >= 0),
        warranty_years int not null default 0 check (warranty_years between 0 and 50),
        service_tier text not null default '',
        service_yearly_minor bigint check (service_yearly_minor >= 0),
        lead_weeks int not null default 0 check (lead_weeks between 0 and 520),
        incoterm text not null default '',
        named_place text not null default '',
        payment_terms text not null default '',
        version int not null default 1,
        primary key (organisation_id, id),
        unique (organisation_id, candidate_id, id),
        unique (organisation_id, candidate_id, vendor_id, number),
        check (valid_until >= quote_date),
        foreign key (organisation_id, candidate_id) references metewand.candidate (organisation_id, id) on delete cascade,
        foreign key (organisation_id, vendor_id) references metewand.vendor (organisation_id, id)
      );
      ${guard('quote')}

      -- A kept quote is one of the candidate's own.
      ${NO_ORGANISATION}
      alter table metewand.candidate add foreign key (organisation_id, id, kept_quote_id)
        references metewand.quote (organisation_id, candidate_id, id) on delete set null (kept_quote_id);

      create table metewand.document (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        candidate_id uuid not null,
        quote_id uuid,
        state text not null default 'EXPECTED' check (state in ('EXPECTED','READY')),
        file_name text not null,
        content_type text not null,
        size_bytes bigint not null check (size_bytes > 0),
        sha256 text,
        uploaded_by uuid not null,
        created_at timestamptz not null default now(),
        primary key (organisation_id, id),
        check ((state = 'READY') = (sha256 is not null)),
        foreign key (organisation_id, candidate_id) references metewand.candidate (organisation_id, id) on delete cascade,
        foreign key (organisation_id, quote_id) references metewand.quote (organisation_id, id) on delete set null (quote_id),
        foreign key (organisation_id, uploaded_by) references metewand.membership (organisation_id, id)
      );
      create index on metewand.document (organisation_id, candidate_id);
      ${guard('document')}
    `);
  }

  down(db: QueryRunner) {
    return db.query(`
      alter table metewand.candidate drop constraint candidate_organisation_id_id_kept_quote_id_fkey;
      drop table metewand.document, metewand.quote, metewand.vendor;
    `);
  }
}
