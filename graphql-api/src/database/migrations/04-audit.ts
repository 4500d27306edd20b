import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** The audit trail: append-only, one hash chain per organisation. The API role can append through the function only. */
export class Audit1764600004000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.audit_entry (
        organisation_id uuid not null references metewand.organisation,
        seq bigint not null,
        at timestamptz not null default clock_timestamp(),
        membership_id uuid,
        action text not null,
        round_id uuid,
        object_id uuid,
        data jsonb not null,
        previous_hash bytea not null,
        hash bytea not null,
        primary key (organisation_id, seq)
      );
      create index on metewand.audit_entry (organisation_id, round_id, seq);
      ${guard('audit_entry', 'select')}

      create table metewand.audit_head (
        organisation_id uuid primary key references metewand.organisation,
        seq bigint not null,
        hash bytea not null
      );
      ${guard('audit_head', 'select')}

      create function metewand.audit_hash(previous bytea, organisation uuid, seq bigint, at timestamptz, who uuid,
          action text, round uuid, object uuid, data jsonb) returns bytea language sql stable
        as $$ select sha256(previous || convert_to(jsonb_build_array(organisation, seq,
                to_char(at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.US'), who, action, round, object, data)::text, 'UTF8')) $$;

      -- Locking the head row keeps the chain in one line within an organisation, to the end of the transaction.
      create function metewand.audit_append(what text, round uuid, object uuid, details jsonb) returns bigint
        language plpgsql security definer set search_path = metewand, pg_temp as $$
        declare
          organisation uuid := current_organisation_id();
          who uuid := current_membership_id();
          head audit_head;
          moment timestamptz := clock_timestamp();
          linked bytea;
        begin
          insert into audit_head values (organisation, 0, '\\x') on conflict do nothing;
          select * into head from audit_head where organisation_id = organisation for update;
          linked := audit_hash(head.hash, organisation, head.seq + 1, moment, who, what, round, object, details);
          insert into audit_entry values (organisation, head.seq + 1, moment, who, what, round, object, details, head.hash, linked);
          update audit_head set seq = head.seq + 1, hash = linked where organisation_id = organisation;
          return head.seq + 1;
        end $$;

      -- Sequence numbers at which the chain is broken; empty when the trail is whole.
      create function metewand.audit_verify() returns table (broken_seq bigint) language sql stable as $$
        select seq from (
          select e.*, lag(hash, 1, '\\x'::bytea) over (order by seq) as expected, row_number() over (order by seq) as position
          from metewand.audit_entry e where organisation_id = (select metewand.current_organisation_id())) chain
        where previous_hash <> expected or position <> seq
           or hash <> metewand.audit_hash(previous_hash, organisation_id, seq, at, membership_id, action, round_id, object_id, data)
        union all
        select seq from metewand.audit_head h
        where organisation_id = (select metewand.current_organisation_id()) and seq > 0
          and not exists (select from metewand.audit_entry e
                          where e.organisation_id = h.organisation_id and e.seq = h.seq and e.hash = h.hash) $$;

      revoke execute on function metewand.audit_append(text, uuid, uuid, jsonb), metewand.audit_verify(),
        metewand.audit_hash(bytea, uuid, bigint, timestamptz, uuid, text, uuid, uuid, jsonb) from public;
      grant execute on function metewand.audit_append(text, uuid, uuid, jsonb), metewand.audit_verify(),
        metewand.audit_hash(bytea, uuid, bigint, timestamptz, uuid, text, uuid, uuid, jsonb) to app_api;
    `);
  }

  down(db: QueryRunner) {
    return db.query(`
      drop function metewand.audit_verify, metewand.audit_append, metewand.audit_hash;
      drop table metewand.audit_head, metewand.audit_entry;
    `);
  }
}
