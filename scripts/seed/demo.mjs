import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { hash } from 'bcryptjs';
import pg from 'pg';
import { PEOPLE } from './people.mjs';
import { rowsOf } from './rows.mjs';

/** For the two demo organisations only; they are marked as demo everywhere. */
export const demoPassword = 'measure twice buy once';
const BCRYPT_COST = 12;

const SETTINGS = {
  T1: { locale: 'en-GB', timeZone: 'Europe/Berlin', stage: 'SCORE' },
  T2: { locale: 'en-GB', timeZone: 'Europe/London', stage: 'SEARCH' },
};

const scenario = JSON.parse(readFileSync(new URL('./demo-scenario.json', import.meta.url), 'utf8'));

export const demoSignIns = scenario.organisations.flatMap(({ id, name: organisation }) =>
  PEOPLE[id].map(({ name, email, roles: [role] }) => ({ organisation, role, name, email })),
);

/**
 * Puts the demo organisations that are not there yet into the database, each in one transaction; says whether there
 * were any. Needs the owner's connection: only a role that owns the tables may create organisations.
 */
export async function seedDemo(ownerUrl) {
  const client = new pg.Client(ownerUrl);
  await client.connect();
  try {
    const missing = [];
    for (const { id } of scenario.organisations) if (!(await isThere(client, id))) missing.push(id);
    if (missing.length === 0) return false;
    const passwordHash = await hash(demoPassword, BCRYPT_COST);
    for (const id of missing) await seedOrganisation(client, id, PEOPLE[id], passwordHash);
    return true;
  } finally {
    await client.end();
  }
}

/**
 * One organisation of the scenario ('T1' or 'T2') with the people given, in one transaction. Returns its id and its
 * rows by table. All people get the same hash: it is one published demo password.
 */
export async function seedOrganisation(client, key, people, passwordHash) {
  const organisation = scenario.organisations.find(({ id }) => id === key);
  const { locale, timeZone, stage } = SETTINGS[key];
  const id = randomUUID();
  await client.query('begin');
  await client.query(`select set_config('app.organisation_id', $1, true)`, [id]);
  const { name, currency } = organisation;
  await insert(client, 'metewand', 'organisation', [
    { id, name, currency, locale, time_zone: timeZone, demo: true },
  ]);
  const users = await createUsers(client, people, passwordHash);
  const tables = rowsOf({ ...organisation, stage }, users);
  for (const [table, rows] of tables) await insert(client, 'metewand', table, rows);
  const rows = Object.fromEntries(tables);
  const [round] = rows.round;
  await client.query('select metewand.audit_append($1, $2, $2, $3)', [
    'demo.loaded',
    round.id,
    { detail: round.name },
  ]);
  await client.query('commit');
  return { id, ...rows };
}

/** An organisation is there with its people: its first person belongs to no other. */
async function isThere(client, key) {
  const [{ email }] = PEOPLE[key];
  const { rowCount } = await client.query('select from identity.app_user where email = $1', [email]);
  return rowCount > 0;
}

/** Somebody who is a member of both organisations has one account. */
async function createUsers(client, people, passwordHash) {
  const users = [];
  for (const person of people) {
    const { rows } = await client.query(
      `insert into identity.app_user (email, password_hash) values ($1, $2)
       on conflict (email) do update set email = excluded.email returning id`,
      [person.email, passwordHash],
    );
    users.push({ ...person, userId: rows[0].id });
  }
  return users;
}

async function insert(client, schema, table, rows) {
  const columns = Object.keys(rows[0]).join(', ');
  await client.query(
    `insert into ${schema}.${table} (${columns})
     select ${columns} from jsonb_populate_recordset(null::${schema}.${table}, $1)`,
    [JSON.stringify(rows)],
  );
}
