import { TestApp, type Answer, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';

const QUOTE = `query ($id: ID!) {
  quote(id: $id) {
    id number version quoteDate validUntil quantity pricesIncludeVat warrantyYears serviceTier leadWeeks incoterm namedPlace paymentTerms
    candidate { code } vendor { id name } unitPrice { amount currency } delivery { amount } installation { amount } training { amount }
    discount { amount } serviceYearly { amount currency } faults inForce documents { id }
    cost {
      capital { amount currency } lifeCycleCost { amount } equivalentAnnualCost { amount } runningYearly { amount } addedRunningYearly { amount }
      years parts { kind amount { amount } } yearly { year amount { amount } presentValue { amount } }
    }
  }
}`;
const QUOTES = `query ($roundId: ID!, $filter: QuoteFilter, $page: Int, $pageSize: Int) {
  quotes(roundId: $roundId, filter: $filter, page: $page, pageSize: $pageSize) { total page pageSize items { id number faults } }
}`;
const CANDIDATE = `query ($id: ID!) {
  candidate(id: $id) {
    version keptReason quoteInForceReason quoteInForce { number } quotes { number inForce faults }
  }
}`;
const MESSAGES = ['UnknownCurrency', 'QuoteNumberTaken', 'QuoteDatesReversed', 'DiscountExceedsPrice']
  .map((refusal) => `... on ${refusal} { message }`)
  .join(' ');
const CREATE = `mutation ($input: CreateQuoteInput!) { createQuote(input: $input) { __typename ... on Quote { id version } ${MESSAGES} } }`;
const UPDATE = `mutation ($input: UpdateQuoteInput!) { updateQuote(input: $input) { __typename ... on Quote { id version } ${MESSAGES} } }`;
const KEEP = `mutation ($input: KeepQuoteInput!) {
  keepQuote(input: $input) { __typename ... on Candidate { version keptReason quoteInForceReason quoteInForce { number } } ... on QuoteNotUsable { message } }
}`;

let app: TestApp;
let organisation: DemoOrganisation;
let other: DemoOrganisation;
let coordinator: Member;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1', { stage: 'GATHER' });
  other = await aDemoOrganisation('T2');
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
});
afterAll(() => app.stop());

const read = async (id: string) => (await coordinator.get(QUOTE, { id })).quote;
const candidate = async (code: string) =>
  (await coordinator.get(CANDIDATE, { id: organisation.candidate(code) })).candidate;
const list = async (variables: Record<string, unknown> = {}) =>
  (await coordinator.get(QUOTES, { roundId: organisation.roundId, ...variables })).quotes;
const vendorNames = async () =>
  (await coordinator.get('{ vendors { name } }')).vendors.map(
    ({ name }: { name: string }) => name,
  ) as string[];
const latest = async () =>
  (await coordinator.get('{ auditFeed(first: 1) { items { sentence detail } } }')).auditFeed.items[0];

const aKnownVendor = () => (organisation.rows.vendor as { id: string; name: string }[])[0];

function fields(changes: Record<string, unknown> = {}) {
  return {
    vendorName: 'Halvard Medical (demo)',
    number: 'HM-1',
    quoteDate: '2027-01-04',
    validUntil: '2027-06-30',
    currency: 'EUR',
    pricesIncludeVat: false,
    unitPrice: '1000.00',
    quantity: 2,
    delivery: '50',
    installation: '30',
    training: '20',
    discount: '100',
    warrantyYears: 1,
    serviceTier: 'planned visits only',
    serviceYearly: '120',
    leadWeeks: 6,
    incoterm: 'DAP',
    namedPlace: 'Ostermere Clinic',
    paymentTerms: '30 days net',
    ...changes,
  };
}

const create = (code: string, changes: Record<string, unknown> = {}) =>
  coordinator.ask(CREATE, { input: { candidateId: organisation.candidate(code), fields: fields(changes) } });
const update = (id: string, version: number, changes: Record<string, unknown> = {}) =>
  coordinator.ask(UPDATE, { input: { id, version, fields: fields(changes) } });

describe('what a quote costs', () => {
  // The figures are those that an independent solver of the demo scenario worked with.
  it('is told gross and in the organisation’s currency, to the cent', async () => {
    const { cost, inForce, faults } = await read(organisation.quote('C01-Q2'));
    expect({ inForce, faults }).toEqual({ inForce: true, faults: [] });
    expect(cost).toMatchObject({
      capital: { amount: '620280.00', currency: 'EUR' },
      lifeCycleCost: { amount: '959041.62' },
      equivalentAnnualCost: { amount: '115316.48' },
      runningYearly: { amount: '50400.00' },
      addedRunningYearly: { amount: '3600.00' },
      years: 10,
    });
  });

  it('adds up from its parts, and from its years', async () => {
    const { cost } = await read(organisation.quote('C12-Q2'));
    const cents = (amount: string) => Number(amount.replace('.', ''));
    const total = cents(cost.lifeCycleCost.amount);
    const sum = (amounts: string[]) => amounts.reduce((all, amount) => all + cents(amount), 0);
    expect(sum(cost.parts.map(({ amount }: never) => (amount as { amount: string }).amount))).toBe(total);
    expect(
      sum(cost.yearly.map(({ presentValue }: never) => (presentValue as { amount: string }).amount)),
    ).toBe(total);
    expect(cost.yearly).toHaveLength(cost.years + 1);
  });

  it('leaves service out when its price is missing, and says so', async () => {
    const quote = await read(organisation.quote('C30-Q3'));
    expect(quote).toMatchObject({ faults: ['SERVICE_PRICE_MISSING'], inForce: false, serviceYearly: null });
    expect(quote.cost.parts).toContainEqual({ kind: 'SERVICE', amount: { amount: '0.00' } });
  });

  it('keeps the vendor’s own currency beside it', async () => {
    const quote = await read(organisation.quote('C12-Q2'));
    expect(quote.unitPrice).toEqual({ amount: '107500.00', currency: 'CHF' });
    expect(quote.cost.capital.currency).toBe('EUR');
  });
});

describe('the list of quotes', () => {
  it('turns pages, by candidate and number', async () => {
    const first = await list({ pageSize: 4 });
    const numbers = first.items.map(({ number }: { number: string }) => number);
    expect(numbers).toEqual(['C01-Q1', 'C01-Q2', 'C01-Q3', 'C02-Q1']);
    expect(first.total).toBe(organisation.rows.quote.length);
  });

  it('finds the quotes that need settling', async () => {
    const faulty = await list({ filter: { faultyOnly: true }, pageSize: 100 });
    expect(faulty.total).toBe(29); // so many does the scenario's reference leave out
    expect(faulty.items.every(({ faults }: { faults: string[] }) => faults.length > 0)).toBe(true);
  });

  it('searches number, vendor and candidate', async () => {
    expect((await list({ filter: { search: 'c07-q2' } })).items).toMatchObject([{ number: 'C07-Q2' }]);
    expect((await list({ filter: { search: '64-slice' } })).total).toBe(3);
    const vendor = aKnownVendor();
    const own = organisation.rows.quote.filter(({ vendor_id }) => vendor_id === vendor.id);
    expect((await list({ filter: { search: vendor.name } })).total).toBe(own.length);
  });
});

describe('entering a quote', () => {
  it('costs it at once and makes a vendor that was not known', async () => {
    const { data } = await create('C40');
    expect(data.createQuote).toMatchObject({ __typename: 'Quote', version: 1 });
    const quote = await read(data.createQuote.id);
    expect(quote).toMatchObject({
      number: 'HM-1',
      candidate: { code: 'C-40' },
      vendor: { name: 'Halvard Medical (demo)' },
      unitPrice: { amount: '1000.00', currency: 'EUR' },
      serviceYearly: { amount: '120.00', currency: 'EUR' },
      faults: [],
    });
    // 2 × 1000 + 50 + 30 + 20 − 100 and a fifth of it as VAT; the candidate needs no works
    const works = organisation.rows.candidate.find(({ code }) => code === 'C-40')?.works_net_minor ?? 0;
    expect(quote.cost.capital.amount).toBe((2400 + (Number(works) / 100) * 1.2).toFixed(2));
    expect(await vendorNames()).toContain('Halvard Medical (demo)');
    expect(await latest()).toEqual({
      sentence: 'Quote HM-1 of Halvard Medical (demo) entered',
      detail: expect.stringMatching(/^C-40 /),
    });
  });

  it('takes a known vendor in any capitals', async () => {
    const before = await vendorNames();
    const vendor = aKnownVendor();
    const { data } = await create('C41', { vendorName: vendor.name.toUpperCase() });
    expect((await read(data.createQuote.id)).vendor.id).toBe(vendor.id);
    expect(await vendorNames()).toEqual(before);
  });

  it.each([
    ['UnknownCurrency', { currency: 'JPY' }, 'no exchange rate for JPY'],
    ['UnknownCurrency', { currency: 'eur' }, 'no exchange rate for eur'],
    [
      'QuoteDatesReversed',
      { validUntil: '2027-01-03' },
      'run out on 3 Jan 2027, before its own date, 4 Jan 2027',
    ],
    [
      'DiscountExceedsPrice',
      { discount: '2100.01' },
      '2\u00a0100.01\u00a0EUR, is more than all that is quoted, 2\u00a0100.00\u00a0EUR',
    ],
    [
      'QuoteNumberTaken',
      { vendorName: 'TAKEN VENDOR', number: 'T-1' },
      'Quote T-1 of Taken Vendor is already entered',
    ],
  ])('answers %s when it is so, and saves nothing', async (refusal, changes, words) => {
    await create('C42', { vendorName: 'Taken Vendor', number: 'T-1' });
    const [before, vendors] = [(await list()).total, await vendorNames()];
    const { data } = await create('C42', { vendorName: 'New vendor of a refused quote', ...changes });
    expect(data.createQuote).toEqual({ __typename: refusal, message: expect.stringContaining(words) });
    expect([(await list()).total, await vendorNames()]).toEqual([before, vendors]);
  });

  it('names the currencies that can be used', async () => {
    const { data } = await create('C43', { currency: 'JPY' });
    expect(data.createQuote.message).toContain('Enter it in EUR, CHF, GBP, USD');
  });

  it.each([
    ['a negative price', { unitPrice: '-1' }, 'fields.unitPrice', 'it cannot be negative'],
    ['a third decimal', { delivery: '1.005' }, 'fields.delivery', 'delivery: "1.005" has 3 decimals'],
    [
      'a sum beyond counting',
      { unitPrice: '900000000', quantity: 1000 },
      'fields.unitPrice',
      'more than can be planned',
    ],
    ['no number', { number: '  ' }, 'fields.number', 'must not be empty'],
    ['a lead time of eleven years', { leadWeeks: 572 }, 'fields.leadWeeks', 'must not be greater than 520'],
    ['a day no calendar has', { quoteDate: '2027-02-30' }, undefined, 'Write a day as year-month-day'],
    ['a day of the year 0', { quoteDate: '0000-01-01' }, undefined, 'Write a day as year-month-day'],
  ])('refuses %s and saves nothing', async (_case, changes, field, words) => {
    const before = (await list()).total;
    const { errors } = await create('C43', changes);
    expect(errors).toHaveLength(1);
    expect(errors?.[0].message).toContain(words);
    expect(errors?.[0].extensions.code).toBe('BAD_USER_INPUT');
    if (field) expect(errors?.[0].extensions.fields).toEqual([{ field, message: expect.any(String) }]);
    expect((await list()).total).toBe(before);
  });

  it.each([
    [
      'candidate',
      () => coordinator.ask(CREATE, { input: { candidateId: other.candidate('D01'), fields: fields() } }),
    ],
    ['document', () => create('C43', { documentId: '00000000-0000-4000-8000-000000000000' })],
    ['quote', () => update(other.quote('D01-Q1'), 1)],
  ])('does not know a %s of somebody else', async (what, attempt: () => Promise<Answer>) => {
    const [before, vendors] = [(await list()).total, await vendorNames()];
    const { errors } = await attempt();
    expect(errors?.[0].message).toMatch(new RegExp(`^No ${what} with id `));
    expect(errors?.[0].extensions.code).toBe('NOT_FOUND');
    expect([(await list()).total, await vendorNames()]).toEqual([before, vendors]);
  });
});

describe('changing a quote', () => {
  it('raises the version, and refuses the edit that comes too late', async () => {
    const id = organisation.quote('C44-Q1');
    const { data } = await update(id, 1, { unitPrice: '2222' });
    expect(data.updateQuote).toEqual({ __typename: 'Quote', id, version: 2 });
    const { errors } = await update(id, 1, { unitPrice: '3333' });
    expect(errors?.[0].extensions).toMatchObject({ code: 'CONFLICT', currentVersion: 2 });
    expect((await read(id)).unitPrice.amount).toBe('2222.00');
  });

  it('may keep its own number, and not take another’s', async () => {
    const id = organisation.quote('C45-Q1');
    await update(id, 1, { number: 'own' });
    await create('C45', { number: 'taken' });
    expect((await update(id, 2, { number: 'own', leadWeeks: 7 })).data.updateQuote.__typename).toBe('Quote');
    expect((await update(id, 3, { number: 'taken' })).data.updateQuote.__typename).toBe('QuoteNumberTaken');
    expect(await read(id)).toMatchObject({ number: 'own', version: 3 });
  });

  it('is refused once a portfolio is submitted', async () => {
    const frozen = await aDemoOrganisation('T1', { stage: 'DECIDE' });
    const member = await app.as(frozen.email('PURCHASING_COORDINATOR'));
    const { errors } = await member.ask(UPDATE, {
      input: { id: frozen.quote('C01-Q1'), version: 1, fields: fields() },
    });
    expect(errors?.[0].extensions.code).toBe('WRONG_STAGE');
  });
});

describe('keeping a quote', () => {
  const keep = (code: string, number: string | null, version: number, reason = 'Same make as the rest') =>
    coordinator.ask(KEEP, {
      input: {
        candidateId: organisation.candidate(code),
        quoteId: number && organisation.quote(number),
        reason,
        version,
      },
    });

  it('puts it in force with the reason, and back to the rule', async () => {
    const { data } = await keep('C01', 'C01-Q3', 1);
    expect(data.keepQuote).toEqual({
      __typename: 'Candidate',
      version: 2,
      keptReason: 'Same make as the rest',
      quoteInForceReason: 'KEPT',
      quoteInForce: { number: 'C01-Q3' },
    });
    expect(await latest()).toEqual({
      sentence: expect.stringMatching(/^Quote C01-Q3 of .* kept$/),
      detail: expect.stringContaining('Same make as the rest'),
    });
    const back = await keep('C01', null, 2, '');
    expect(back.data.keepQuote).toMatchObject({
      version: 3,
      keptReason: '',
      quoteInForceReason: 'LOWEST_ANNUAL_COST',
      quoteInForce: { number: 'C01-Q2' },
    });
    expect((await latest()).sentence).toBe('Choice of the quote left to the rule');
  });

  it.each([
    ['C08', 'C08-Q1', 'it runs out on'],
    ['C30', 'C30-Q3', 'it gives no price for service'],
    ['C25', 'C25-Q2', 'longer than the 48 of the round'],
  ])('refuses one of %s that cannot be used: %s', async (code, number, words) => {
    const before = await candidate(code);
    const { data } = await keep(code, number, before.version);
    expect(data.keepQuote).toEqual({ __typename: 'QuoteNotUsable', message: expect.stringContaining(words) });
    expect(await candidate(code)).toEqual(before);
  });

  it('goes back to the rule when the kept quote is amended into a fault', async () => {
    await keep('C03', 'C03-Q1', 1);
    await update(organisation.quote('C03-Q1'), 1, { validUntil: '2027-02-14' });
    expect(await candidate('C03')).toMatchObject({
      quoteInForceReason: 'LOWEST_ANNUAL_COST',
      quoteInForce: { number: 'C03-Q3' },
    });
  });

  it('refuses what was decided on an old page', async () => {
    const { errors } = await keep('C05', 'C05-Q1', 9);
    expect(errors?.[0].extensions).toMatchObject({ code: 'CONFLICT', currentVersion: 1 });
  });

  it('does not know another candidate’s quote, or another organisation’s', async () => {
    const foreign = [organisation.quote('C06-Q1'), other.quote('D01-Q1')];
    for (const quoteId of foreign) {
      const input = { candidateId: organisation.candidate('C05'), quoteId, reason: 'why not', version: 1 };
      const { errors } = await coordinator.ask(KEEP, { input });
      expect(errors?.[0]).toMatchObject({
        message: `No quote with id ${quoteId}.`,
        extensions: { code: 'NOT_FOUND' },
      });
    }
  });
});

describe('two people at once', () => {
  it('enter the same number only once', async () => {
    const answers = await Promise.all([create('C46'), create('C46'), create('C46')]);
    const kinds = answers.map(({ data }) => data.createQuote.__typename as string).sort();
    expect(kinds).toEqual(['Quote', 'QuoteNumberTaken', 'QuoteNumberTaken']);
    const rows = await asOwner((client) =>
      inOrganisation(
        client,
        organisation.id,
        `select 1 from metewand.quote where candidate_id = $1 and number = 'HM-1'`,
        [organisation.candidate('C46')],
      ),
    );
    expect(rows).toHaveLength(1);
  });

  it('bring the same new vendor once', async () => {
    const vendorName = 'Twice Brought';
    const answers = await Promise.all([create('C47', { vendorName }), create('C48', { vendorName })]);
    expect(answers.map(({ data }) => data.createQuote.__typename)).toEqual(['Quote', 'Quote']);
    expect((await vendorNames()).filter((name) => name === vendorName)).toHaveLength(1);
  });
});
