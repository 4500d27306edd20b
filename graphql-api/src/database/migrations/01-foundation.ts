import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The schemas and the one function that says for which organisation the transaction asks. */
export class Foundation1764600001000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create schema if not exists metewand;
      create schema identity;
      create schema jobs;
      grant usage on schema metewand, identity, jobs to app_api;
      grant usage, create on schema identity, jobs to app_login, app_worker;
      grant usage on schema metewand to app_login;
      revoke execute on all functions in schema metewand, identity, jobs from public;
      alter default privileges revoke execute on functions from public;

      -- no missing_ok: a forgotten context is an error, never an empty list
      create function metewand.current_organisation_id() returns uuid language sql stable parallel safe
        as $$ select current_setting('app.organisation_id')::uuid $$;
      create function metewand.current_membership_id() returns uuid language sql stable parallel safe
        as $$ select nullif(current_setting('app.membership_id', true), '')::uuid $$;
      grant execute on function metewand.current_organisation_id(), metewand.current_membership_id() to app_api, app_login;
    `);
  }

  down(db: QueryRunner) {
    return db.query(`
      drop function metewand.current_membership_id();
      drop function metewand.current_organisation_id();
      drop schema jobs; drop schema identity;
    `);
  }
}
