import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/**
 * Tasks of the proofs of runs, for workers that do not hold the run themselves, and what came of them. A row is about
 * the task its digest names; lease_until says until when somebody is at it. They go when the run ends.
 *
 * The job that calls other workers to a run bears the run as a flag, by which the worker that holds it passes it over.
 */
export class RunTasks1764600016000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.run_task (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        run_id uuid not null,
        id text not null,
        digest text not null,
        task bytea,
        result bytea,
        lease_until timestamptz,
        primary key (organisation_id, run_id, id),
        check ((task is null) = (result is not null)),
        foreign key (organisation_id, run_id) references metewand.run (organisation_id, id) on delete cascade
      );
      create index run_task_open on metewand.run_task (organisation_id, run_id, lease_until) where task is not null;
      ${guard('run_task')}

      create function jobs.call_to_run(run_id uuid) returns void
        language plpgsql security definer set search_path = pg_temp as $$
        declare organisation uuid := current_setting('app.organisation_id')::uuid;
        begin
          perform graphile_worker.add_job('frontier.task',
            json_build_object('organisationId', organisation, 'payload', json_build_object('runId', run_id)),
            max_attempts := 1, job_key := concat_ws(' ', organisation, 'frontier.task', run_id),
            flags := array[run_id::text]);
        end $$;
      alter function jobs.call_to_run(uuid) owner to app_worker;
      revoke execute on function jobs.call_to_run(uuid) from public;
      grant execute on function jobs.call_to_run(uuid) to app_api;
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop function jobs.call_to_run; drop table metewand.run_task;');
  }
}
