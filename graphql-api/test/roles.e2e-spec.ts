import { randomUUID } from 'node:crypto';
import { GraphQLSchemaHost } from '@nestjs/graphql';
import { OPERATION_ROLES, PUBLIC } from '../src/auth/operation-roles.js';
import { Role } from '../src/memberships/role.enum.js';
import { TestApp, type Member } from './app.js';
import { aDemoOrganisation } from './demo-organisation.js';
import { documentFor, operationsOf, variablesFor, type Operation } from './every-operation.js';

let app: TestApp;
let operations: Operation[];
const members = new Map<Role, Member>();

beforeAll(async () => {
  app = await TestApp.start();
  operations = operationsOf(app.app.get(GraphQLSchemaHost).schema);
  const organisation = await aDemoOrganisation('T1');
  for (const role of Object.values(Role)) members.set(role, await app.as(organisation.email(role)));
});
afterAll(() => app.stop());

const variables = (operation: Operation) => variablesFor(operation, () => randomUUID());

describe('the table of roles', () => {
  it('names every operation of the schema and no other', () => {
    expect(Object.keys(OPERATION_ROLES).sort()).toEqual(operations.map(({ name }) => name).sort());
  });

  it.each(Object.values(Role))('is kept for %s, operation by operation', async (role) => {
    const differing: string[] = [];
    for (const operation of operations.filter(({ name }) => name !== 'signOut')) {
      const allowed = OPERATION_ROLES[operation.name];
      const { errors } = (await members.get(role)?.ask(documentFor(operation), variables(operation))) ?? {};
      const refused = errors?.some(({ extensions }) => extensions.code === 'FORBIDDEN') ?? false;
      if (refused !== (allowed !== PUBLIC && !allowed.includes(role))) differing.push(operation.name);
    }
    expect(differing).toEqual([]);
  });

  it('lets nobody in who is not signed in, save to sign in', async () => {
    const open: string[] = [];
    for (const operation of operations) {
      const { errors } = await app.ask(documentFor(operation), variables(operation));
      if (errors?.[0]?.extensions.code !== 'UNAUTHENTICATED') open.push(operation.name);
    }
    expect(open).toEqual(['signIn']);
  });
});
