import { sign } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { TestApp } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';

const VIEWER = '{ viewer { email organisation { id name } memberships { organisationId } } }';
const REFRESH = 'mutation { refreshSession { accessToken } }';

let app: TestApp;
let organisation: DemoOrganisation;
let email: string;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1');
  email = organisation.email('PURCHASING_COORDINATOR');
});
afterAll(() => app.stop());

describe('signing in', () => {
  it('lets a member in and says who it is', async () => {
    const member = await app.as(email);
    expect(await member.get(VIEWER)).toMatchObject({
      viewer: { email, organisation: { id: organisation.id } },
    });
  });

  it('takes the address in any case', async () => {
    expect((await app.signIn(email.toUpperCase())).result.accessToken).toEqual(expect.any(String));
  });

  it('gives a wrong password and an unknown address the same answer, and no cookie', async () => {
    const wrong = await app.signIn(email, 'not the password');
    const unknown = await app.signIn('nobody@marrowfen.example');
    expect(wrong.result).toEqual({
      __typename: 'SignInRefused',
      message: 'The e-mail address or the password is not right.',
    });
    expect(unknown.result).toEqual(wrong.result);
    expect([wrong.cookie, unknown.cookie]).toEqual(['', '']);
  });

  it('writes each sign-in into the audit trail', async () => {
    const member = await app.as(email);
    const { auditFeed } = await member.get('{ auditFeed(first: 1) { items { sentence by { name } } } }');
    expect(auditFeed.items).toEqual([{ sentence: 'Signed in', by: { name: 'Hanne Vos' } }]);
  });
});

describe('the access token', () => {
  const refusal = { code: 'UNAUTHENTICATED', message: 'You are signed out. Sign in to go on.' };

  it.each([
    ['is missing', undefined],
    ['is no token', 'rubbish'],
    ['is not signed', () => forged({ alg: 'none' }, {}, () => '')],
    ['has expired', () => forged({ alg: 'ES256' }, { exp: 1_700_000_000 }, signed)],
    ['is for another audience', () => forged({ alg: 'ES256' }, { aud: 'somebody else' }, signed)],
    ['names a session that does not exist', () => forged({ alg: 'ES256' }, {}, signed)],
    ['is signed by another algorithm', () => forged({ alg: 'HS256' }, {}, signed)],
  ])('is refused when it %s', async (_case, token) => {
    const { errors } = await app.ask(VIEWER, {}, typeof token === 'function' ? token() : token);
    expect(errors).toHaveLength(1);
    expect({ code: errors?.[0].extensions.code, message: errors?.[0].message }).toEqual(refusal);
  });

  it('stops counting with the next request after the member is removed', async () => {
    const removed = await app.as(organisation.email('AUDITOR'));
    await asOwner((client) =>
      inOrganisation(
        client,
        organisation.id,
        `update metewand.membership set active = false where roles = '{AUDITOR}'`,
      ),
    );
    expect((await removed.ask(VIEWER)).errors?.[0].extensions.code).toBe('UNAUTHENTICATED');
  });
});

describe('the refresh cookie', () => {
  const refresh = (cookie: string) => app.post().set('cookie', cookie).send({ query: REFRESH });
  const cookieOf = (response: { headers: Record<string, unknown> }) =>
    ((response.headers['set-cookie'] ?? []) as string[]).map((line) => line.split(';')[0]).join('; ');

  it('gives a new access token and is replaced', async () => {
    const { cookie } = await app.signIn(email);
    const response = await refresh(cookie);
    expect(response.body.data.refreshSession.accessToken).toEqual(expect.any(String));
    expect(cookieOf(response)).not.toBe(cookie);
    expect(response.headers['set-cookie'][0]).toMatch(
      /^__Host-.*; Path=\/; .*HttpOnly; Secure; SameSite=Strict/,
    );
  });

  it('gives the same successor to a reply that was lost', async () => {
    const { cookie } = await app.signIn(email);
    expect(cookieOf(await refresh(cookie))).toBe(cookieOf(await refresh(cookie)));
  });

  it('ends the session for thief and victim when an old one comes back later', async () => {
    const { cookie, result } = await app.signIn(email);
    const successor = cookieOf(await refresh(cookie));
    await asOwner((client) =>
      client.query(
        `update identity.refresh_token set used_at = used_at - interval '11 seconds' where used_at is not null`,
      ),
    );
    for (const stale of [cookie, successor]) {
      const response = await refresh(stale);
      expect(response.body.errors[0].extensions.code).toBe('UNAUTHENTICATED');
    }
    expect((await app.ask(VIEWER, {}, result.accessToken)).errors?.[0].extensions.code).toBe(
      'UNAUTHENTICATED',
    );
  });

  it('is worth nothing after signing out', async () => {
    const { cookie, result } = await app.signIn(email);
    await app.ask('mutation { signOut }', {}, result.accessToken);
    expect((await refresh(cookie)).body.errors[0].extensions.code).toBe('UNAUTHENTICATED');
  });
});

describe('a member of two organisations', () => {
  it('moves between them, and to no other', async () => {
    const other = await aDemoOrganisation('T2');
    const stranger = await aDemoOrganisation('T2');
    await asOwner((client) =>
      inOrganisation(
        client,
        other.id,
        `insert into metewand.membership (user_id, name, email, roles)
         select id, 'Hanne Vos', email, '{AUDITOR}' from identity.app_user where email = $1`,
        [email],
      ),
    );
    const member = await app.as(email);
    const SWITCH = 'mutation ($id: ID!) { switchOrganisation(organisationId: $id) { accessToken } }';
    const { viewer } = await member.get(VIEWER);
    const target = viewer.organisation.id === other.id ? organisation.id : other.id;
    const { switchOrganisation } = await member.get(SWITCH, { id: target });
    const moved = await app.ask(VIEWER, {}, switchOrganisation.accessToken);
    expect(moved.data.viewer.organisation.id).toBe(target);
    expect((await member.ask(VIEWER)).errors?.[0].extensions.code).toBe('UNAUTHENTICATED');

    const refused = await app.ask(SWITCH, { id: stranger.id }, switchOrganisation.accessToken);
    const unknown = await app.ask(
      SWITCH,
      { id: '00000000-0000-4000-8000-000000000000' },
      switchOrganisation.accessToken,
    );
    expect(refused.errors?.[0].extensions.code).toBe('NOT_FOUND');
    expect(refused.errors?.[0].message.replace(stranger.id, 'ID')).toBe(
      unknown.errors?.[0].message.replace('00000000-0000-4000-8000-000000000000', 'ID'),
    );
    const shapeless = await app.ask(SWITCH, { id: '-'.repeat(36) }, switchOrganisation.accessToken);
    expect(shapeless.errors?.[0].extensions.code).toBe('NOT_FOUND');
  });
});

type Claims = Record<string, unknown>;

function forged(header: Claims, claims: Claims, signature: (input: string) => string): string {
  const now = Math.floor(Date.now() / 1000);
  const sound = {
    sid: organisation.id,
    org: organisation.id,
    iss: 'metewand',
    aud: 'metewand-api',
    iat: now,
    exp: now + 600,
  };
  const input = [
    { typ: 'JWT', ...header },
    { ...sound, ...claims },
  ]
    .map((part) => Buffer.from(JSON.stringify(part)).toString('base64url'))
    .join('.');
  return `${input}.${signature(input)}`;
}

function signed(input: string): string {
  const key = readFileSync(process.env.JWT_PRIVATE_KEY_FILE ?? '', 'utf8');
  return sign('sha256', Buffer.from(input), { key, dsaEncoding: 'ieee-p1363' }).toString('base64url');
}
