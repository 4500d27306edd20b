import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Jobs are tried for some days instead of a minute and a half, so that a letter outlasts a mail server that is down;
 * and a job that already waits is not queued a second time.
 */
export class PatientJobs1764600014000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create or replace function jobs.enqueue(task text, payload jsonb) returns void
        language plpgsql security definer set search_path = pg_temp as $$
        declare organisation uuid := current_setting('app.organisation_id')::uuid;
        begin
          perform graphile_worker.add_job(task,
            json_build_object('organisationId', organisation, 'payload', payload),
            max_attempts := 25, job_key := concat_ws(' ', organisation, task, payload));
        end $$;
    `);
  }

  down(db: QueryRunner) {
    return db.query(`
      create or replace function jobs.enqueue(task text, payload jsonb) returns void
        language plpgsql security definer set search_path = pg_temp as $$
        begin
          perform graphile_worker.add_job(task,
            json_build_object('organisationId', current_setting('app.organisation_id')::uuid, 'payload', payload),
            max_attempts := 5);
        end $$;
    `);
  }
}
