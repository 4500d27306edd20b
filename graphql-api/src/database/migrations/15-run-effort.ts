import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What a run may spend on its proof is stored with it, in branches. Runs from before had no proof. */
export class RunEffort1764600015000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      alter table metewand.run add column effort bigint not null default 0 check (effort >= 0);
      alter table metewand.run alter column effort drop default;
    `);
  }

  down(db: QueryRunner) {
    return db.query('alter table metewand.run drop column effort');
  }
}
