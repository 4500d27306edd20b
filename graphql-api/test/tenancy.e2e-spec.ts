import { randomUUID } from 'node:crypto';
import { GraphQLSchemaHost } from '@nestjs/graphql';
import { OPERATION_ROLES, PUBLIC } from '../src/auth/operation-roles.js';
import { TestApp, type Answer, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';
import {
  documentFor,
  idPositions,
  operationsOf,
  variablesFor,
  withValueAt,
  type Operation,
} from './every-operation.js';

type Kind = keyof Objects;
type Objects = Awaited<ReturnType<typeof objectsOf>>;

/** What an `id` is the id of, by operation; every other position says it by its own name. */
const ID_OF: Record<string, Kind> = {
  round: 'round',
  candidate: 'candidate',
  updateCandidate: 'candidate',
  quote: 'quote',
  updateQuote: 'quote',
  openDocument: 'document',
  updateLimit: 'limit',
  deleteLimit: 'limitToDelete',
  run: 'run',
  selection: 'selection',
  decideSelection: 'selection',
};

let app: TestApp;
let own: DemoOrganisation;
let ownObjects: Objects;
let foreignObjects: Objects;
const members = new Map<string, Member>();

beforeAll(async () => {
  app = await TestApp.start();
  own = await aDemoOrganisation('T1');
  const foreign = await aDemoOrganisation('T2');
  ownObjects = await objectsOf(own);
  foreignObjects = await objectsOf(foreign);
});
afterAll(() => app.stop());

describe('an id of another organisation', () => {
  it('gets, in every operation and at every position, the answer of an id that does not exist', async () => {
    const operations = operationsOf(app.app.get(GraphQLSchemaHost).schema);
    const differing: string[] = [];
    const unproven: string[] = [];
    let positions = 0;
    for (const operation of operations) {
      const answers = await Promise.all(idPositions(operation).map((path) => answersAt(operation, path)));
      const mine = await ownAnswer(operation);
      for (const { path, foreign, unknown } of answers) {
        positions += 1;
        if (foreign !== unknown) differing.push(`${operation.name} ${path}: ${foreign} against ${unknown}`);
        if (mine.replaceAll(ownObjects[kindAt(operation, path)], 'ID') === unknown)
          unproven.push(`${operation.name} ${path}: ${mine}`);
      }
    }
    expect(differing).toEqual([]);
    expect(unproven).toEqual([]);
    expect(positions).toBeGreaterThan(30);
  });

  it('changes nothing where it points', async () => {
    const foreignChanges = await asOwner((client) =>
      inOrganisation(
        client,
        foreignObjects.organisation,
        `select action from metewand.audit_entry where action <> 'demo.loaded'`,
      ),
    );
    expect(foreignChanges).toEqual([]);
  });

  it('is not taken from a header either', async () => {
    const member = await memberFor('viewer');
    const response = await app
      .post()
      .set('authorization', `Bearer ${member.accessToken}`)
      .set('x-organisation-id', foreignObjects.organisation)
      .send({ query: '{ viewer { organisation { id } } }' });
    expect((response.body as Answer).data.viewer.organisation.id).toBe(own.id);
  });
});

/** The same call twice: with the foreign id, and with one that exists nowhere. */
async function answersAt(operation: Operation, path: string) {
  const member = await memberFor(operation.name);
  const ask = async (id: string) => {
    const answer = await member.ask(documentFor(operation), withValueAt(ownVariables(operation), path, id));
    return normalised(answer, id);
  };
  return {
    path,
    foreign: await ask(foreignObjects[kindAt(operation, path)]),
    unknown: await ask(randomUUID()),
  };
}

/** The same call with nothing but one's own ids: if it gave the same answer, the position would prove nothing. */
async function ownAnswer(operation: Operation) {
  if (idPositions(operation).length === 0) return '';
  const member = await memberFor(operation.name);
  return normalised(await member.ask(documentFor(operation), ownVariables(operation)));
}

function ownVariables(operation: Operation) {
  return variablesFor(operation, (path) => ownObjects[kindAt(operation, path)]);
}

function kindAt(operation: Operation, path: string): Kind {
  const name = path.split('.').at(-1) ?? '';
  const kind = name === 'id' ? ID_OF[operation.name] : (name.replace(/Id$/, '') as Kind);
  if (!kind || !(kind in ownObjects))
    throw new Error(`The test does not know whose id ${operation.name} takes at ${path}.`);
  return kind;
}

function normalised(answer: Answer, id?: string): string {
  const text = JSON.stringify(answer, (key, value: unknown) => (key === 'requestId' ? undefined : value));
  return id ? text.replaceAll(id, 'ID') : text;
}

async function memberFor(operation: string): Promise<Member> {
  const allowed = OPERATION_ROLES[operation];
  const role = allowed === PUBLIC ? 'PURCHASING_COORDINATOR' : allowed[0];
  const known = members.get(role);
  if (known) return known;
  const member = await app.as(own.email(role));
  members.set(role, member);
  return member;
}

/** One object of each kind; those that the demo does not hold are put in by the owner. */
async function objectsOf(organisation: DemoOrganisation) {
  const { id, roundId, rows } = organisation;
  const [membership] = rows.membership;
  const inserted = await asOwner(async (client) => {
    const insert = async (sql: string, parameters: unknown[]) => {
      const [row] = await inOrganisation(client, id, `${sql} returning id`, parameters);
      return row.id as string;
    };
    const document = await insert(
      `insert into metewand.document (candidate_id, file_name, content_type, size_bytes, state, sha256, uploaded_by)
       values ($1, 'quote.pdf', 'application/pdf', 1, 'READY', 'none', $2)`,
      [rows.candidate[0].id, membership.id],
    );
    const run = await insert(
      `insert into metewand.run (round_id, number, cost_axis, state, seed, evaluations, effort, problem, items, fingerprint, result, started_by)
       values ($1, 1, 'CAPITAL', 'FINISHED', 1, 1, 1, '{}', '[]', 'none', '{}', $2)`,
      [roundId, membership.id],
    );
    const selection = await insert(
      `insert into metewand.selection (round_id, run_id, number, state, memo, fingerprint, submitted_by, decided_by)
       values ($1, $2, 1, 'RETURNED', '{}', 'none', $3, $4)`,
      [roundId, run, membership.id, rows.membership[1].id],
    );
    return { document, run, selection };
  });
  return {
    organisation: id,
    round: roundId,
    candidate: rows.candidate[0].id,
    quote: rows.quote[0].id,
    site: rows.site[0].id,
    department: rows.department[0].id,
    limit: rows.round_limit[0].id,
    limitToDelete: rows.round_limit[1].id,
    criterion: rows.criterion[0].id,
    ...inserted,
  };
}
