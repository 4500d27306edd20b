import { randomBytes } from 'node:crypto';
import { hash } from 'bcryptjs';
import { Client } from 'pg';
import { demoPassword, seedOrganisation, type SeededOrganisation } from '../../scripts/seed/demo.mjs';
import { PEOPLE } from '../../scripts/seed/people.mjs';

// The lowest cost that bcrypt takes: the tests sign in often, and the strength of a demo hash is nobody's gain.
const passwordHash = hash(demoPassword, 4);

export interface DemoOrganisation {
  id: string;
  roundId: string;
  rows: SeededOrganisation;
  /** The e-mail address of the first member with this role, or of the assessor with this scenario name. */
  email(roleOrAssessor: string): string;
  /** The id of the candidate with this code of the scenario, such as "C08". */
  candidate(code: string): string;
  /** The id of the quote with this number of the scenario, such as "C08-Q1". */
  quote(number: string): string;
}

/** A fresh copy of a demo organisation, with people of its own, for one test file. */
export async function aDemoOrganisation(
  key: 'T1' | 'T2',
  { stage }: { stage?: string } = {},
): Promise<DemoOrganisation> {
  const suffix = randomBytes(4).toString('hex');
  const people = PEOPLE[key].map((person) => ({
    ...person,
    email: person.email.replace('@', `.${suffix}@`),
  }));
  const rows = await asOwner(async (client) => {
    const seeded = await seedOrganisation(client, key, people, await passwordHash);
    if (stage) await inOrganisation(client, seeded.id, 'update metewand.round set stage = $1', [stage]);
    return seeded;
  });
  return {
    id: rows.id,
    roundId: rows.round[0].id,
    rows,
    email: (wanted) =>
      must(people.find(({ roles, assessor }) => assessor === wanted || roles.includes(wanted))).email,
    candidate: (code) => must(rows.candidate.find((row) => row.code === `${code[0]}-${code.slice(1)}`)).id,
    quote: (number) => must(rows.quote.find((row) => row.number === number)).id,
  };
}

/** Runs with the owner's connection, which no product process has. */
export async function asOwner<T>(work: (client: Client) => Promise<T>): Promise<T> {
  const client = new Client({ connectionString: process.env.DATABASE_OWNER_URL });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** One statement in the context of an organisation, as the owner. */
export async function inOrganisation(
  client: Client,
  organisationId: string,
  sql: string,
  parameters: unknown[] = [],
) {
  await client.query('begin');
  await client.query(`select set_config('app.organisation_id', $1, true)`, [organisationId]);
  const result = await client.query(sql, parameters);
  await client.query('commit');
  return result.rows as Record<string, unknown>[];
}

function must<T>(found: T | undefined): T {
  if (!found) throw new Error('The demo scenario holds no such row.');
  return found;
}
