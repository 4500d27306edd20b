import { TestApp, type Answer, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';

const TABLE = `query ($roundId: ID!, $filter: CandidateFilter, $sort: CandidateSort, $page: Int, $pageSize: Int) {
  candidates(roundId: $roundId, filter: $filter, sort: $sort, page: $page, pageSize: $pageSize) {
    total page pageSize all somethingMissing mandatory askedFor { amount currency }
    items { code name quoteInForceReason quoteInForce { number cost { capital { amount } lifeCycleCost { amount } equivalentAnnualCost { amount } } } }
  }
}`;
const CANDIDATE = `query ($id: ID!) {
  candidate(id: $id) {
    id code name need kind genericGroup quantity usefulLifeYears residualPercent installationDays floorAreaM2
    mandatory mandatoryReason siteNeeds version department { id name } site { id code }
    worksNet { amount currency } consumablesYearly { amount } energyYearly { amount } currentRunningYearly { amount }
    links { kind reason candidate { code } members { code } }
  }
}`;
const CREATE = `mutation ($input: CreateCandidateInput!) {
  createCandidate(input: $input) { __typename ... on Candidate { id code version } ... on MandatoryNeedsReason { message } }
}`;
const UPDATE = `mutation ($input: UpdateCandidateInput!) {
  updateCandidate(input: $input) { __typename ... on Candidate { id name version } ... on MandatoryNeedsReason { message } }
}`;

let app: TestApp;
let organisation: DemoOrganisation;
let other: DemoOrganisation;
let coordinator: Member;
let auditor: Member;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1', { stage: 'SEARCH' });
  other = await aDemoOrganisation('T2');
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  auditor = await app.as(organisation.email('AUDITOR'));
});
afterAll(() => app.stop());

const table = async (variables: Record<string, unknown> = {}) =>
  (await auditor.get(TABLE, { roundId: organisation.roundId, ...variables })).candidates;
const codesOf = (page: { items: { code: string }[] }) => page.items.map(({ code }) => code);
const read = async (id: string) => (await auditor.get(CANDIDATE, { id })).candidate;
const howMany = async () => {
  const query = 'query ($id: ID!) { candidates(roundId: $id, pageSize: 1) { all } }';
  return (await auditor.get(query, { id: organisation.roundId })).candidates.all as number;
};

function fields(changes: Record<string, unknown> = {}) {
  return {
    name: 'Infusion pump',
    need: 'The old ones are no longer served.',
    departmentId: organisation.rows.department[0].id,
    siteId: organisation.rows.site[0].id,
    kind: 'REPLACEMENT',
    genericGroup: 'Infusion pump',
    quantity: 4,
    usefulLifeYears: 8,
    residualPercent: '2.5',
    worksNet: '0',
    consumablesYearly: '1200.50',
    energyYearly: '-30',
    currentRunningYearly: '900',
    installationDays: '0.5',
    floorAreaM2: '0',
    mandatory: false,
    mandatoryReason: '',
    ...changes,
  };
}

describe('the table of candidates', () => {
  // The figures are those that an independent solver of the demo scenario worked with.
  it('counts the round and adds up the capital of the quotes in force', async () => {
    expect(await table({ pageSize: 3 })).toMatchObject({
      total: 56,
      all: 56,
      page: 1,
      pageSize: 3,
      askedFor: { amount: '6450912.00', currency: 'EUR' },
    });
    // In the other round D05 and D17 have no quote that is open on the decision date, so they ask for nothing yet.
    const theirs = await app.as(other.email('PURCHASING_COORDINATOR'));
    const { candidates } = await theirs.get(TABLE, { roundId: other.roundId });
    expect(candidates).toMatchObject({ all: 19, askedFor: { amount: '721052.40', currency: 'GBP' } });
  });

  it('shows each candidate by its quote in force', async () => {
    const { items } = await table({ pageSize: 3 });
    const shown = items.map(({ code, quoteInForce: { number, cost } }: never) => [
      code,
      number,
      ...Object.values(cost as Record<string, { amount: string }>).map(({ amount }) => amount),
    ]);
    expect(shown).toEqual([
      ['C-01', 'C01-Q2', '620280.00', '959041.62', '115316.48'],
      ['C-02', 'C02-Q2', '40980.00', '144622.71', '21039.23'],
      ['C-03', 'C03-Q1', '1477800.00', '2332824.04', '280501.95'],
    ]);
    expect(items[0].quoteInForceReason).toBe('LOWEST_ANNUAL_COST');
  });

  it('turns numbered pages', async () => {
    const last = await table({ page: 3, pageSize: 25 });
    expect(last).toMatchObject({ total: 56, page: 3 });
    expect(codesOf(last)).toEqual(['C-51', 'C-52', 'C-53', 'C-54', 'C-55', 'C-56']);
    expect(codesOf(await table({ page: 4, pageSize: 25 }))).toEqual([]);
  });

  it('sorts by what is computed', async () => {
    const dearest = await table({ sort: { key: 'CAPITAL', direction: 'DESC' }, pageSize: 1 });
    expect(codesOf(dearest)).toEqual(['C-03']);
    const best = await table({ sort: { key: 'BENEFIT', direction: 'DESC' }, pageSize: 1 });
    expect(codesOf(best)).toEqual(['C-01']);
    const byCost = await table({ sort: { key: 'LIFE_CYCLE_COST', direction: 'ASC' }, pageSize: 56 });
    const costs = byCost.items.map(({ quoteInForce }: never) =>
      Number((quoteInForce as { cost: { lifeCycleCost: { amount: string } } }).cost.lifeCycleCost.amount),
    );
    expect(costs).toEqual([...costs].sort((left: number, right: number) => left - right));
  });

  it('searches code, name, department and generic group', async () => {
    expect(codesOf(await table({ filter: { search: 'c-07' } }))).toEqual(['C-07']);
    expect(codesOf(await table({ filter: { search: '  64-SLICE ' } }))).toEqual(['C-01']);
    expect(codesOf(await table({ filter: { search: '%' } }))).toEqual([]);
  });

  it('shows the views and the places asked for', async () => {
    const mandatory = await table({ filter: { view: 'MANDATORY' } });
    expect(mandatory.total).toBe(mandatory.mandatory);
    expect(mandatory.total).toBeGreaterThan(0);
    const missing = await table({ filter: { view: 'SOMETHING_MISSING' } });
    expect(missing.total).toBe(missing.somethingMissing);
    expect(codesOf(missing)).toContain('C-38');
    const site = organisation.rows.site[1];
    const atSite = organisation.rows.candidate.filter(({ site_id }) => site_id === site.id);
    expect((await table({ filter: { siteId: site.id } })).total).toBe(atSite.length);
  });

  it.each([
    ['a page before the first', { page: 0 }, 'page must not be less than 1.'],
    ['too large a page', { pageSize: 101 }, 'pageSize must not be greater than 100.'],
  ])('refuses %s', async (_case, variables, message) => {
    const { errors } = await auditor.ask(TABLE, { roundId: organisation.roundId, ...variables });
    expect(errors?.[0]).toMatchObject({ message, extensions: { code: 'BAD_USER_INPUT' } });
  });
});

describe('a candidate', () => {
  it('names its place and the links that bind it', async () => {
    const needing = await read(organisation.candidate('C13'));
    expect(needing).toMatchObject({
      code: 'C-13',
      department: { name: expect.any(String) },
      site: { code: expect.any(String) },
    });
    expect(needing.links).toContainEqual({
      kind: 'NEEDS',
      reason: expect.any(String),
      candidate: { code: 'C-13' },
      members: [{ code: 'C-14' }],
    });
    const { links } = await read(organisation.candidate('C04'));
    expect(links).toContainEqual({
      kind: 'EITHER_OR',
      reason: expect.any(String),
      candidate: null,
      members: [{ code: 'C-03' }, { code: 'C-04' }],
    });
  });

  it('is found among the links of its round', async () => {
    const { round } = await auditor.get('query ($id: ID!) { round(id: $id) { links { kind } } }', {
      id: organisation.roundId,
    });
    expect(round.links.length).toBe(organisation.rows.link.length);
  });
});

describe('adding a candidate', () => {
  const create = (changes: Record<string, unknown> = {}, roundId = organisation.roundId) =>
    coordinator.ask(CREATE, { input: { roundId, fields: fields(changes) } });

  it('gives it the next code and writes it down', async () => {
    const { data } = await create({ name: '  Infusion pump  ' });
    expect(data.createCandidate).toMatchObject({ __typename: 'Candidate', code: 'C-57', version: 1 });
    expect(await read(data.createCandidate.id)).toMatchObject({
      name: 'Infusion pump',
      residualPercent: '2.50',
      consumablesYearly: { amount: '1200.50' },
      energyYearly: { amount: '-30.00' },
      worksNet: { amount: '0.00', currency: 'EUR' },
      siteNeeds: [],
      links: [],
    });
    const { auditFeed } = await auditor.get('{ auditFeed(first: 1) { items { sentence detail } } }');
    expect(auditFeed.items).toEqual([{ sentence: 'Candidate added', detail: 'C-57 Infusion pump' }]);
  });

  it('gives two people who add at once a code each', async () => {
    const answers = await Promise.all([create(), create(), create()]);
    expect(new Set(answers.map(({ data }) => data.createCandidate.code)).size).toBe(3);
  });

  it('asks for the reason of a mandatory one', async () => {
    const before = await howMany();
    const { data } = await create({ mandatory: true, mandatoryReason: '   ' });
    expect(data.createCandidate).toEqual({
      __typename: 'MandatoryNeedsReason',
      message: expect.stringContaining('Write the reason'),
    });
    expect(await howMany()).toBe(before);
  });

  it.each([
    ['a negative amount', { worksNet: '-1' }, 'fields.worksNet', 'it cannot be negative'],
    [
      'more decimals than the currency has',
      { energyYearly: '1.005' },
      'fields.energyYearly',
      'at most 2 for EUR',
    ],
    ['an amount that is no number', { worksNet: '12 000' }, undefined, 'Write a number as text'],
    ['a share above all', { residualPercent: '101' }, 'fields.residualPercent', 'between 0 and 100'],
    ['no pieces', { quantity: 0 }, 'fields.quantity', 'must not be less than 1'],
    ['an empty name', { name: ' ' }, 'fields.name', 'must not be empty'],
    ['days without end', { installationDays: '1000000' }, 'fields.installationDays', 'less than a million'],
    [
      'an amount beyond counting',
      { worksNet: '9999999999999' },
      'fields.worksNet',
      'more than can be planned',
    ],
    ['an id that is none', { siteId: 'OST' }, 'fields.siteId', 'must be a UUID'],
  ])('refuses %s and saves nothing', async (_case, changes, field, words) => {
    const before = await howMany();
    const { errors } = await create(changes);
    expect(errors).toHaveLength(1);
    expect(errors?.[0].message).toContain(words);
    expect(errors?.[0].extensions.code).toBe('BAD_USER_INPUT');
    if (field) expect(errors?.[0].extensions.fields).toEqual([{ field, message: expect.any(String) }]);
    expect(await howMany()).toBe(before);
  });

  it.each([
    ['department', () => create({ departmentId: other.rows.department[0].id })],
    ['site', () => create({ siteId: other.rows.site[0].id })],
    ['round', () => create({}, other.roundId)],
  ])('does not know the %s of another organisation', async (what, attempt: () => Promise<Answer>) => {
    const { errors } = await attempt();
    expect(errors?.[0].message).toMatch(new RegExp(`^No ${what} with id `));
    expect(errors?.[0].extensions.code).toBe('NOT_FOUND');
  });

  it('is for the coordinator only', async () => {
    const { errors } = await auditor.ask(CREATE, {
      input: { roundId: organisation.roundId, fields: fields() },
    });
    expect(errors?.[0].extensions.code).toBe('FORBIDDEN');
  });
});

describe('changing a candidate', () => {
  const update = (id: string, version: number, changes: Record<string, unknown> = {}) =>
    coordinator.ask(UPDATE, { input: { id, version, fields: fields(changes) } });

  it('raises the version, and refuses the edit that comes too late', async () => {
    const id = organisation.candidate('C20');
    const { data } = await update(id, 1, { name: 'Drying cabinet' });
    expect(data.updateCandidate).toEqual({ __typename: 'Candidate', id, name: 'Drying cabinet', version: 2 });

    const { errors } = await update(id, 1, { name: 'Another name' });
    expect(errors?.[0]).toMatchObject({
      message: expect.stringContaining('changed by somebody else in the meantime'),
      extensions: { code: 'CONFLICT', currentVersion: 2 },
    });
    expect(await read(id)).toMatchObject({ name: 'Drying cabinet', version: 2 });
  });

  it('keeps what it was when a mandatory one has no reason', async () => {
    const id = organisation.candidate('C20');
    const { version } = await read(id);
    const { data } = await update(id, version, { mandatory: true });
    expect(data.updateCandidate.__typename).toBe('MandatoryNeedsReason');
    expect(await read(id)).toMatchObject({ version, mandatory: false });
  });

  it('is refused once a portfolio is submitted', async () => {
    const frozen = await aDemoOrganisation('T1', { stage: 'DECIDE' });
    const member = await app.as(frozen.email('PURCHASING_COORDINATOR'));
    const places = { departmentId: frozen.rows.department[0].id, siteId: frozen.rows.site[0].id };
    const { errors } = await member.ask(UPDATE, {
      input: { id: frozen.candidate('C20'), version: 1, fields: fields(places) },
    });
    expect(errors?.[0]).toMatchObject({
      message: expect.stringContaining('figures are frozen'),
      extensions: { code: 'WRONG_STAGE' },
    });
  });

  it('treats another organisation’s candidate as one that does not exist', async () => {
    const { errors } = await update(other.candidate('D01'), 1);
    expect(errors?.[0].extensions.code).toBe('NOT_FOUND');
    const untouched = await asOwner((client) =>
      inOrganisation(client, other.id, 'select version from metewand.candidate where id = $1', [
        other.candidate('D01'),
      ]),
    );
    expect(untouched).toEqual([{ version: 1 }]);
  });
});
