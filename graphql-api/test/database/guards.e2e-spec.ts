import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Client } from 'pg';
import { aDemoOrganisation, asOwner, type DemoOrganisation } from '../demo-organisation.js';

const CHECK = readFileSync(join(__dirname, 'check.sql'), 'utf8');
const ROLES = ['app_api', 'app_login', 'app_worker'];

const faults = (client: Client) =>
  client.query(CHECK, ROLES).then(({ rows }) => rows as { fault: string; what: string }[]);

describe('every table', () => {
  it('is guarded', async () => {
    expect(await asOwner(faults)).toEqual([]);
  });

  it.each([
    ['create table metewand.planted (id uuid)', 'no organisation_id column'],
    ['alter table metewand.quote disable row level security', 'row level security not enabled and forced'],
    ['create policy wide on metewand.quote using (true)', 'policy allows writes without check'],
    ['create unique index on metewand.quote (id)', 'unique index without organisation_id'],
    [
      'grant truncate on metewand.quote to app_api',
      'truncate, references or trigger granted to the API role',
    ],
    ['grant select on identity.app_user to app_api', 'API role has a right on an identity table'],
    ['create view metewand.peek as select * from metewand.quote', 'view without security_invoker'],
    ['grant insert on metewand.audit_entry to app_api', 'API role may write the audit trail'],
  ])('would be found out after: %s', async (statement, fault) => {
    const found = await asOwner(async (client) => {
      await client.query('begin');
      await client.query(statement);
      const rows = await faults(client);
      await client.query('rollback');
      return rows;
    });
    expect(found.map((row) => row.fault)).toContain(fault);
  });
});

describe('the API role', () => {
  let first: DemoOrganisation;
  let second: DemoOrganisation;

  beforeAll(async () => {
    first = await aDemoOrganisation('T1');
    second = await aDemoOrganisation('T2');
  });

  it('is refused without a context instead of getting an empty list', async () => {
    await expect(asApi((client) => client.query('select * from metewand.candidate'))).rejects.toMatchObject({
      code: '42704',
    });
  });

  it('is refused on a pooled connection that once had a context', async () => {
    await expect(
      asApi(async (client) => {
        await inContext(client, first.id, 'select 1');
        return client.query('select * from metewand.candidate');
      }),
    ).rejects.toMatchObject({ code: '22P02' });
  });

  it('sees in each table nothing but the rows of its organisation', async () => {
    await asApi(async (client) => {
      const { rows: tables } = await client.query(
        `select c.relname as name from pg_class c
         join pg_attribute a on a.attrelid = c.oid and a.attname = 'organisation_id'
         where c.relnamespace = 'metewand'::regnamespace and c.relkind = 'r' and has_table_privilege(c.oid, 'select')`,
      );
      expect(tables.length).toBeGreaterThan(15);
      for (const { name } of tables as { name: string }[]) {
        const rows = await inContext(
          client,
          second.id,
          `select distinct organisation_id as id from metewand."${name}"`,
        );
        expect([name, rows.filter(({ id }) => id !== second.id)]).toEqual([name, []]);
      }
    });
  });

  it('can neither write into another organisation nor point at its rows', async () => {
    await asApi(async (client) => {
      const insert = `insert into metewand.vendor (organisation_id, name) values ($1, 'planted')`;
      await expect(inContext(client, first.id, insert, [second.id])).rejects.toMatchObject({ code: '42501' });
    });
    await asApi(async (client) => {
      const point = `insert into metewand.quote (candidate_id, vendor_id, number, quote_date, valid_until, currency, unit_price_minor)
                     values ($1, $2, 'planted', '2027-01-01', '2027-02-01', 'EUR', 1)`;
      const parameters = [first.candidate('C01'), (second.rows.vendor as { id: string }[])[0].id];
      await expect(inContext(client, first.id, point, parameters)).rejects.toMatchObject({ code: '23503' });
    });
  });
});

describe('the audit trail', () => {
  it('is found broken after an edit and after a cut, even by a role that passes all guards', async () => {
    const organisation = await aDemoOrganisation('T2');
    await asOwner(async (client) => {
      await client.query('begin');
      await client.query(`select set_config('app.organisation_id', $1, true)`, [organisation.id]);
      for (const action of ['session.opened', 'session.opened', 'session.opened']) {
        await client.query('select metewand.audit_append($1, null, null, $2)', [action, {}]);
      }
      const verify = async () =>
        (await client.query('select broken_seq::int as seq from metewand.audit_verify()')).rows;
      expect(await verify()).toEqual([]);
      await client.query('savepoint whole');
      await client.query(`update metewand.audit_entry set data = '{"detail":"other"}' where seq = 2`);
      expect(await verify()).toEqual([{ seq: 2 }]);
      await client.query('rollback to whole');
      await client.query('delete from metewand.audit_entry where seq = 4');
      expect(await verify()).toEqual([{ seq: 4 }]);
      await client.query('rollback');
    });
  });
});

async function asApi<T>(work: (client: Client) => Promise<T>): Promise<T> {
  const client = new Client({ connectionString: process.env.DATABASE_URL });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

async function inContext(client: Client, organisationId: string, sql: string, parameters: unknown[] = []) {
  await client.query('begin');
  await client.query(`select set_config('app.organisation_id', $1, true)`, [organisationId]);
  const { rows } = await client.query(sql, parameters);
  await client.query('commit');
  return rows as Record<string, unknown>[];
}
