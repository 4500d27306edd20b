import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The two doors to the job queue. graphile-worker's schema belongs to app_worker; the API role has no rights on it. */
export class Jobs1764600013000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      -- Stamps the organisation of the open transaction on the job, so that a handler never takes it from a caller.
      create function jobs.enqueue(task text, payload jsonb) returns void
        language plpgsql security definer set search_path = pg_temp as $$
        begin
          perform graphile_worker.add_job(task,
            json_build_object('organisationId', current_setting('app.organisation_id')::uuid, 'payload', payload),
            max_attempts := 5);
        end $$;
      alter function jobs.enqueue(text, jsonb) owner to app_worker;

      -- Runs whose worker fell silent, over all organisations: only their ids leave this function.
      create function jobs.lost_runs() returns table (organisation_id uuid, run_id uuid)
        language sql stable security definer set search_path = metewand, pg_temp
        as $$ select organisation_id, id from run
              where (state = 'SEARCHING' and lease_until < now())
                 or (state = 'WAITING' and created_at < now() - interval '30 seconds') $$;
      grant select (organisation_id, id, state, lease_until, created_at) on metewand.run to app_login;
      alter function jobs.lost_runs() owner to app_login;

      revoke execute on all functions in schema jobs from public;
      grant execute on all functions in schema jobs to app_api;
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop function jobs.lost_runs; drop function jobs.enqueue;');
  }
}
