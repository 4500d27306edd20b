import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/**
 * Search runs. The row is the truth, the job only delivers it: attempt is the fencing number, lease_until says how
 * long the worker holding it may be silent.
 */
export class Runs1764600010000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.run (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        round_id uuid not null,
        number int not null,
        cost_axis text not null check (cost_axis in ('CAPITAL','LIFE_CYCLE')),
        state text not null default 'WAITING' check (state in ('WAITING','SEARCHING','FINISHED','STOPPED','INFEASIBLE','FAILED')),
        seed int not null,
        evaluations bigint not null check (evaluations > 0),
        problem jsonb not null,
        items jsonb not null,
        fingerprint text not null,
        stop_requested boolean not null default false,
        attempt int not null default 0,
        lease_until timestamptz,
        progress jsonb,
        result jsonb,
        failure text,
        started_by uuid not null,
        created_at timestamptz not null default now(),
        started_at timestamptz,
        finished_at timestamptz,
        primary key (organisation_id, id),
        unique (organisation_id, round_id, number),
        check ((state in ('FINISHED','STOPPED','INFEASIBLE')) = (result is not null)),
        foreign key (organisation_id, round_id) references metewand.round (organisation_id, id) on delete cascade,
        foreign key (organisation_id, started_by) references metewand.membership (organisation_id, id)
      );
      create index run_lease on metewand.run (organisation_id, lease_until) where state in ('WAITING','SEARCHING');
      ${guard('run')}
    `);
  }

  down(db: QueryRunner) {
    return db.query('drop table metewand.run');
  }
}
