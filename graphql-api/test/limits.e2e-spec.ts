import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';

const LIMITS = `query ($id: ID!) {
  round(id: $id) { limits { id name measure site { code } least most asked version } }
}`;
const PARTS = `__typename
  ... on Limit { id name measure site { code } least most asked version }
  ... on LimitNameTaken { message }
  ... on LimitEmpty { message }`;
const CREATE = `mutation ($input: CreateLimitInput!) { createLimit(input: $input) { ${PARTS} } }`;
const UPDATE = `mutation ($input: UpdateLimitInput!) { updateLimit(input: $input) { ${PARTS} } }`;
const DELETE = `mutation ($id: ID!) { deleteLimit(id: $id) }`;
const TRAIL = `query ($id: ID!) { auditFeed(roundId: $id, first: 1) { items { sentence detail } } }`;

const DAYS = 'Installation days in house';

let app: TestApp;
let organisation: DemoOrganisation;
let coordinator: Member;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1');
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
});
afterAll(() => app.stop());

const limits = async () => (await coordinator.get(LIMITS, { id: organisation.roundId })).round.limits;
const limitNamed = async (name: string) =>
  (await limits()).find((limit: { name: string }) => limit.name === name);
const lastEntry = async () => (await coordinator.get(TRAIL, { id: organisation.roundId })).auditFeed.items[0];
const siteId = (code: string) => organisation.rows.site.find((site) => site.code === code)?.id;

const fields = (own: Record<string, unknown> = {}) => ({
  name: 'Power',
  measure: 'INSTALLATION_DAYS',
  most: '10.00',
  ...own,
});
const create = async (own: Record<string, unknown>) =>
  (await coordinator.get(CREATE, { input: { roundId: organisation.roundId, fields: fields(own) } }))
    .createLimit;
const attempt = (own: Record<string, unknown>, member = coordinator) =>
  member.ask(CREATE, { input: { roundId: organisation.roundId, fields: fields(own) } });

describe('the limits of a round', () => {
  it('say what all candidates together would take', async () => {
    const days = organisation.rows.candidate.reduce((sum, row) => sum + Number(row.installation_days), 0);
    expect(await limitNamed(DAYS)).toMatchObject({
      most: '50.00',
      least: null,
      site: null,
      asked: String(days),
    });
  });

  it('count only their own site', async () => {
    const atHome = organisation.rows.candidate.filter((row) => row.site_id === siteId('HAL'));
    const floor = atHome.reduce((sum, row) => sum + Number(row.floor_area_m2), 0);
    const all = (await limits()) as { measure: string; site: { code: string } | null; asked: string }[];
    const own = (measure: string) =>
      all.find((limit) => limit.measure === measure && limit.site?.code === 'HAL');
    expect(own('FLOOR_AREA')?.asked).toBe(String(floor));
    expect(own('CANDIDATES')?.asked).toBe(String(atHome.length));
  });

  it('are added, changed and removed, each written down', async () => {
    const added = await create({ name: ' Beds moved ', least: '2', siteId: siteId('OST') });
    expect(added).toMatchObject({
      name: 'Beds moved',
      least: '2.00',
      most: '10.00',
      site: { code: 'OST' },
      version: 1,
    });
    expect(await lastEntry()).toEqual({
      sentence: 'Limit “Beds moved” added',
      detail: 'at least 2.00, at most 10.00',
    });

    const input = { id: added.id, version: 1, fields: fields({ name: 'Beds moved', most: '12.50' }) };
    const { updateLimit } = await coordinator.get(UPDATE, { input });
    expect(updateLimit).toMatchObject({ least: null, most: '12.50', site: null, version: 2 });
    expect(await lastEntry()).toMatchObject({ sentence: 'Limit “Beds moved” changed' });

    expect(await coordinator.get(DELETE, { id: added.id })).toEqual({ deleteLimit: true });
    expect(await limitNamed('Beds moved')).toBeUndefined();
    expect(await lastEntry()).toMatchObject({ sentence: 'Limit “Beds moved” removed' });
  });

  it('may ask for a saving: a running cost below zero', async () => {
    const input = { name: 'Savings', measure: 'ADDED_RUNNING_COST', most: '-1500.00' };
    expect(await create(input)).toMatchObject({ __typename: 'Limit', most: '-1500.00' });
  });
});

describe('a limit is not saved', () => {
  it.each([
    [
      'under a name that is taken',
      { name: DAYS },
      'LimitNameTaken',
      'This round has a limit named “Installation days in house” already.',
    ],
    [
      'under the name of the ceiling',
      { name: 'Budget ceiling' },
      'LimitNameTaken',
      'This round has a limit named “Budget ceiling” already.',
    ],
    ['without a bound', { most: null }, 'LimitEmpty', 'Say the least or the most that the limit allows.'],
    [
      'when nothing lies between its bounds',
      { least: '11', most: '10' },
      'LimitEmpty',
      'No portfolio can hold at least 11 and at most 10.',
    ],
  ])('%s', async (_case, own, type, message) => {
    const before = await limits();
    expect(await create(own)).toEqual({ __typename: type, message });
    expect(await limits()).toEqual(before);
  });

  it.each([
    ['with days below zero', { most: '-1' }, 'BAD_USER_INPUT', 'Only a running cost can be below zero.'],
    ['with thousandths of a day', { most: '1.125' }, 'BAD_USER_INPUT', 'at most two decimals'],
    [
      'with parts of a candidate',
      { measure: 'CANDIDATES', most: '1.5' },
      'BAD_USER_INPUT',
      'no number of candidates',
    ],
    ['without a name', { name: '' }, 'BAD_USER_INPUT', 'Give the limit a name'],
    ['with a name of blanks', { name: '   ' }, 'BAD_USER_INPUT', 'Give the limit a name'],
    ['with a name that cannot be kept', { name: 'a\u0000b' }, 'BAD_USER_INPUT', 'cannot be kept'],
    ['with half a character', { name: 'a\ud800' }, 'BAD_USER_INPUT', 'cannot be kept'],
  ])('%s', async (_case, own, code, message) => {
    const { errors } = await attempt(own);
    expect(errors?.[0].extensions.code).toBe(code);
    expect(errors?.[0].message).toContain(message);
  });

  it('for a site of another organisation, as if there were no such site', async () => {
    const other = await aDemoOrganisation('T2');
    const { errors } = await attempt({ siteId: other.rows.site[0].id });
    expect(errors?.[0].extensions.code).toBe('NOT_FOUND');
  });

  it('by somebody who is no coordinator', async () => {
    const assessor = await app.as(organisation.email('A1'));
    expect((await attempt({}, assessor)).errors?.[0].extensions.code).toBe('FORBIDDEN');
  });

  it('over a change that somebody else made in the meantime', async () => {
    const { id, version } = await limitNamed(DAYS);
    const change = (most: string) =>
      coordinator.ask(UPDATE, { input: { id, version, fields: fields({ name: DAYS, most }) } });
    expect((await change('51')).data.updateLimit.version).toBe(version + 1);
    const { errors } = await change('40');
    expect(errors?.[0].extensions).toMatchObject({ code: 'CONFLICT', currentVersion: version + 1 });
    expect(await limitNamed(DAYS)).toMatchObject({ most: '51.00', version: version + 1 });
  });

  it('once a portfolio is submitted', async () => {
    const { id } = await limitNamed(DAYS);
    const setStage = (stage: string) =>
      asOwner((client) =>
        inOrganisation(client, organisation.id, 'update metewand.round set stage = $1', [stage]),
      );
    await setStage('DECIDE');
    expect((await attempt({})).errors?.[0].extensions.code).toBe('WRONG_STAGE');
    expect((await coordinator.ask(DELETE, { id })).errors?.[0].extensions.code).toBe('WRONG_STAGE');
    await setStage('SCORE');
  });
});
