import type { MigrationInterface, QueryRunner } from 'typeorm';
import { guard } from '../guard.js';

/** Organisations with their sites, departments and members. */
export class Organisations1764600002000 implements MigrationInterface {
  up(db: QueryRunner) {
    return db.query(`
      create table metewand.organisation (
        id uuid primary key default gen_random_uuid(),
        name text not null,
        currency char(3) not null,
        locale text not null default 'en-GB',
        time_zone text not null default 'Europe/Berlin',
        demo boolean not null default false,
        version int not null default 1
      );
      ${guard('organisation', 'select', 'id')}

      create table metewand.site (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        code text not null,
        name text not null,
        note text not null default '',
        primary key (organisation_id, id),
        unique (organisation_id, code)
      );
      ${guard('site')}

      create table metewand.department (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        name text not null,
        primary key (organisation_id, id),
        unique (organisation_id, name)
      );
      ${guard('department')}

      create table metewand.membership (
        organisation_id uuid not null default metewand.current_organisation_id() references metewand.organisation,
        id uuid not null default gen_random_uuid(),
        user_id uuid not null,
        name text not null,
        email text not null,
        title text not null default '',
        roles text[] not null check (cardinality(roles) > 0 and roles <@ array[
          'PURCHASING_COORDINATOR','CLINICAL_ASSESSOR','FINANCE_DIRECTOR','ORGANISATION_ADMIN','AUDITOR','REQUESTER']),
        department_id uuid,
        active boolean not null default true,
        version int not null default 1,
        primary key (organisation_id, id),
        unique (organisation_id, user_id),
        foreign key (organisation_id, department_id) references metewand.department (organisation_id, id)
      );
      ${guard('membership', 'select')}
    `);
  }

  down(db: QueryRunner) {
    return db.query(
      'drop table metewand.membership, metewand.department, metewand.site, metewand.organisation',
    );
  }
}
