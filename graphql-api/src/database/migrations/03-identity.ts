import type { MigrationInterface, QueryRunner } from 'typeorm';
import { NO_ORGANISATION } from '../guard.js';

/**
 * People and sessions belong to no organisation. The API role reaches them through the functions below only;
 * they run as app_login, because sign-in happens before an organisation is known.
 */
export class Identity1764600003000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table identity.app_user (
        id uuid primary key default gen_random_uuid(),
        email text not null unique check (email = lower(email)),
        password_hash text not null
      );
      create table identity.session (
        id uuid primary key default gen_random_uuid(),
        user_id uuid not null references identity.app_user on delete cascade,
        organisation_id uuid not null,
        created_at timestamptz not null default now(),
        last_used_at timestamptz not null default now(),
        ended_at timestamptz
      );
      create index on identity.session (user_id);
      create table identity.refresh_token (
        hash bytea primary key,
        session_id uuid not null references identity.session on delete cascade,
        used_at timestamptz
      );
      create index on identity.refresh_token (session_id);

      ${NO_ORGANISATION}
      alter table metewand.membership add foreign key (user_id) references identity.app_user;
      grant select on metewand.membership, metewand.organisation to app_login;
      grant select on identity.app_user to app_login;
      grant select, insert, update on identity.session, identity.refresh_token to app_login;

      create function identity.find_user(address text) returns table (user_id uuid, password_hash text)
        language sql stable security definer set search_path = identity, pg_temp
        as $$ select id, app_user.password_hash from app_user where email = lower(address) $$;

      create function identity.memberships_of(who uuid) returns table (organisation_id uuid, organisation_name text, roles text[])
        language sql stable security definer set search_path = metewand, pg_temp
        as $$ select o.id, o.name, m.roles from membership m join organisation o on o.id = m.organisation_id
              where m.user_id = who and m.active order by o.name $$;

      create function identity.open_session(who uuid, organisation uuid, token_hash bytea) returns uuid
        language plpgsql security definer set search_path = identity, pg_temp as $$
        declare opened uuid;
        begin
          if not exists (select from identity.memberships_of(who) m where m.organisation_id = organisation) then
            return null;
          end if;
          insert into session (user_id, organisation_id) values (who, organisation) returning id into opened;
          insert into refresh_token (hash, session_id) values (token_hash, opened);
          return opened;
        end $$;

      -- Each refresh token is good once. The same token again within 10 seconds is a lost reply and gets the same
      -- successor (the caller derives it); later it is theft, and the whole session ends.
      create function identity.rotate_session(old_hash bytea, new_hash bytea)
        returns table (session_id uuid, user_id uuid, organisation_id uuid)
        language plpgsql security definer set search_path = identity, pg_temp as $$
        declare token refresh_token; held session;
        begin
          select * into token from refresh_token where hash = old_hash for update;
          if not found then return; end if;
          select * into held from session where id = token.session_id for update;
          if held.ended_at is not null or held.created_at < now() - interval '30 days'
             or held.last_used_at < now() - interval '24 hours' then return; end if;
          if token.used_at is not null and token.used_at < now() - interval '10 seconds' then
            update session set ended_at = now() where id = held.id;
            return;
          end if;
          update refresh_token set used_at = coalesce(used_at, now()) where hash = old_hash;
          insert into refresh_token (hash, session_id) values (new_hash, held.id) on conflict do nothing;
          update session set last_used_at = now() where id = held.id;
          return query select held.id, held.user_id, held.organisation_id;
        end $$;

      create function identity.switch_session(which uuid, organisation uuid) returns boolean
        language sql volatile security definer set search_path = identity, pg_temp
        as $$ with moved as (
                update session set organisation_id = organisation
                where id = which and ended_at is null
                  and exists (select from identity.memberships_of(session.user_id) m where m.organisation_id = organisation)
                returning 1)
              select exists (select from moved) $$;

      create function identity.end_session(which uuid) returns void
        language sql volatile security definer set search_path = identity, pg_temp
        as $$ update session set ended_at = now() where id = which and ended_at is null $$;

      -- Read at every request, so that a removed member or a changed role counts from the next one on.
      create function identity.caller(which uuid, organisation uuid)
        returns table (user_id uuid, membership_id uuid, name text, email text, roles text[])
        language sql stable security definer set search_path = identity, metewand, pg_temp
        as $$ select m.user_id, m.id, m.name, m.email, m.roles
              from session s join membership m on m.user_id = s.user_id and m.organisation_id = s.organisation_id
              where s.id = which and s.organisation_id = organisation and s.ended_at is null and m.active $$;

      alter function identity.find_user(text) owner to app_login;
      alter function identity.memberships_of(uuid) owner to app_login;
      alter function identity.open_session(uuid, uuid, bytea) owner to app_login;
      alter function identity.rotate_session(bytea, bytea) owner to app_login;
      alter function identity.switch_session(uuid, uuid) owner to app_login;
      alter function identity.end_session(uuid) owner to app_login;
      alter function identity.caller(uuid, uuid) owner to app_login;
      revoke execute on all functions in schema identity from public;
      grant execute on all functions in schema identity to app_api;
    `);
  }

  down(db: QueryRunner) {
    return db.query(`
      drop function identity.caller, identity.end_session, identity.switch_session, identity.rotate_session,
        identity.open_session, identity.memberships_of, identity.find_user;
      drop table identity.refresh_token, identity.session, identity.app_user cascade;
    `);
  }
}
