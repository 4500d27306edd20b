import { TestApp, type Answer, type Member } from './app.js';
import { aDemoOrganisation } from './demo-organisation.js';

let app: TestApp;
let member: Member;

beforeAll(async () => {
  app = await TestApp.start();
  member = await app.as((await aDemoOrganisation('T2')).email('PURCHASING_COORDINATOR'));
});
afterAll(() => app.stop());

const INSIDES = /at \w+.*\.(ts|js):\d+|select |insert |node_modules|\/src\/|QueryFailedError|stacktrace/i;

describe('the edge of the API', () => {
  it.each([
    ['deeper than ten levels', `{ viewer { rounds ${nested(6)} } }`, /depth limit/],
    [
      'with more than thirty aliases',
      `{ ${times(31, (n) => `a${n}: viewer { email }`)} }`,
      /[Aa]liases limit/,
    ],
    [
      'with more than fifty directives',
      `{ viewer { email ${times(51, () => '@include(if: true)')} } }`,
      /[Dd]irectives limit/,
    ],
    ['with more than five thousand tokens', `{ viewer { ${times(5001, () => 'email')} } }`, /[Tt]oken limit/],
    ['that does not parse', '{ viewer { ', /Syntax Error/],
    ['for a field that does not exist', '{ viewer { emial } }', /Cannot query field/],
  ])('refuses a query %s, before running it and without hints', async (_case, query, reason) => {
    const { data, errors } = await member.ask(query);
    expect(data).toBeUndefined();
    expect(errors?.[0].message).toMatch(reason);
    expect(JSON.stringify(errors)).not.toMatch(INSIDES);
    expect(JSON.stringify(errors)).not.toMatch(/did you mean/i);
  });

  it('refuses an array of operations', async () => {
    const response = await app
      .post()
      .send([{ query: '{ viewer { email } }' }, { query: '{ viewer { email } }' }]);
    expect(response.status).toBe(400);
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data'])(
    'refuses a body of type %s, which any page could send',
    async (type) => {
      const response = await app.post().set('content-type', type).send('query=%7B__typename%7D');
      expect(response.status).toBe(400);
    },
  );

  it.each([
    [
      'of a name that it does not hold',
      { query: 'query A { __typename }', operationName: 'B' },
      'OPERATION_RESOLUTION_FAILURE',
    ],
    [
      'known by its hash alone',
      { extensions: { persistedQuery: { version: 1, sha256Hash: '0'.repeat(64) } } },
      'PERSISTED_QUERY_NOT_SUPPORTED',
    ],
  ])('refuses an operation %s', async (_case, body, code) => {
    const { errors } = (await app.post().send(body)).body as Answer;
    expect(errors?.[0].extensions.code).toBe(code);
  });

  it('refuses a body over one megabyte', async () => {
    const response = await app
      .post()
      .send({ query: '{ __typename }', variables: { filler: 'x'.repeat(1_100_000) } });
    expect(response.status).toBe(413);
    expect(response.text).not.toMatch(INSIDES);
  });

  it('names an unknown field of an input and takes none of it', async () => {
    const input = { email: 'a@example.org', password: 'x', role: 'ORGANISATION_ADMIN' };
    const { errors } = await app.ask(
      'mutation ($input: SignInInput!) { signIn(input: $input) { __typename } }',
      { input },
    );
    expect(errors?.[0].message).toMatch(/"role" is not defined/);
  });

  it('gives every answer a request id, and every error the same one', async () => {
    const response = await app.post().send({ query: '{ viewer { email } }' });
    const { errors } = response.body as Answer;
    expect(errors?.[0].extensions.requestId).toBe(response.headers['x-request-id']);
  });

  it('sends the headers that keep a page to itself', async () => {
    const { headers } = await app.post().send({ query: '{ __typename }' });
    expect(headers['content-security-policy']).toMatch(
      /default-src 'none'.*frame-ancestors 'none'.*object-src 'none'/,
    );
    expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'referrer-policy': 'no-referrer' });
    expect(headers).not.toHaveProperty('x-powered-by');
  });
});

function nested(levels: number): string {
  return levels === 0 ? '{ id }' : `{ runs { round ${nested(levels - 1)} } }`;
}

function times(count: number, text: (n: number) => string): string {
  return Array.from({ length: count }, (_, n) => text(n)).join(' ');
}
