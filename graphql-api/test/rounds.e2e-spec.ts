import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';

const ROUND = `query ($id: ID!) { round(id: $id) { name stage version ceiling { amount currency } spendable { amount } } }`;
const SET_CEILING = `mutation ($input: SetCeilingInput!) { setCeiling(input: $input) { version ceiling { amount } spendable { amount } } }`;
const ADVANCE = `mutation ($input: AdvanceRoundInput!) {
  advanceRound(input: $input) { __typename ... on Round { stage version } ... on RoundNotReady { message missing } }
}`;
const STEP_BACK = `mutation ($input: StepBackRoundInput!) { stepBackRound(input: $input) { stage version } }`;

let app: TestApp;
let organisation: DemoOrganisation;
let coordinator: Member;
let financeDirector: Member;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1', { stage: 'GATHER' });
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  financeDirector = await app.as(organisation.email('FINANCE_DIRECTOR'));
});
afterAll(() => app.stop());

const read = () => coordinator.get(ROUND, { id: organisation.roundId }).then(({ round }) => round);
const trail = () =>
  coordinator.get(
    'query ($id: ID!) { auditFeed(roundId: $id, first: 1) { items { sentence detail by { name } } } }',
    {
      id: organisation.roundId,
    },
  );

describe('the ceiling', () => {
  it('leaves what is not held back to be spent', async () => {
    expect(await read()).toMatchObject({
      ceiling: { amount: '2400000.00', currency: 'EUR' },
      spendable: { amount: '2304000.00' },
    });
  });

  it('is set by the finance director and written down with what it was', async () => {
    const { version } = await read();
    const input = { roundId: organisation.roundId, version, ceiling: '2500000.50', heldBackPercent: '2.5' };
    const { setCeiling } = await financeDirector.get(SET_CEILING, { input });
    expect(setCeiling).toEqual({
      version: version + 1,
      ceiling: { amount: '2500000.50' },
      spendable: { amount: '2437500.48' },
    });
    expect((await trail()).auditFeed.items[0]).toEqual({
      sentence: 'Budget ceiling set to 2500000.50, was 2400000.00',
      detail: '2.5 % held back',
      by: { name: 'Margit Sole' },
    });
  });

  it.each([
    [
      'a coordinator',
      () => coordinator,
      {},
      'FORBIDDEN',
      'Your roles do not allow this. It needs the role finance director.',
    ],
    [
      'a negative amount',
      () => financeDirector,
      { ceiling: '-1' },
      'BAD_USER_INPUT',
      /ceiling must be zero or more/,
    ],
    [
      'more than all held back',
      () => financeDirector,
      { heldBackPercent: '101' },
      'BAD_USER_INPUT',
      /between 0 and 100/,
    ],
    ['cents of a cent', () => financeDirector, { ceiling: '1.234' }, 'BAD_USER_INPUT', /ceiling/],
    ['a stale version', () => financeDirector, { version: 1 }, 'CONFLICT', /changed by somebody else/],
    ['words', () => financeDirector, { ceiling: 'much' }, 'BAD_USER_INPUT', /Write a number as text/],
  ])('refuses %s and saves nothing', async (_case, who, change, code, message) => {
    const before = await read();
    const sound = {
      roundId: organisation.roundId,
      version: before.version,
      ceiling: '1',
      heldBackPercent: '0',
    };
    const { errors } = await who().ask(SET_CEILING, { input: { ...sound, ...change } });
    expect(errors?.[0].extensions.code).toBe(code);
    expect(errors?.[0].message).toMatch(message);
    expect(await read()).toEqual(before);
  });

  it('is set by one of several who set it at the same time', async () => {
    const { version } = await read();
    const set = (ceiling: string) =>
      financeDirector.ask(SET_CEILING, {
        input: { roundId: organisation.roundId, version, ceiling, heldBackPercent: '4' },
      });
    const answers = await Promise.all(['1000', '2000', '3000', '4000'].map(set));
    const codes = answers.map(({ errors }) => errors?.[0].extensions.code ?? 'SAVED');
    expect(codes.sort()).toEqual(['CONFLICT', 'CONFLICT', 'CONFLICT', 'SAVED']);
    expect((await read()).version).toBe(version + 1);
  });
});

describe('the stage', () => {
  it('goes forward by the coordinator, and back with a reason that stays in the trail', async () => {
    const { version } = await read();
    const { advanceRound } = await coordinator.get(ADVANCE, {
      input: { roundId: organisation.roundId, version },
    });
    expect(advanceRound).toEqual({ __typename: 'Round', stage: 'SCORE', version: version + 1 });

    const back = { roundId: organisation.roundId, version: version + 1, reason: 'Two quotes came late' };
    const { stepBackRound } = await coordinator.get(STEP_BACK, { input: back });
    expect(stepBackRound.stage).toBe('GATHER');
    expect((await trail()).auditFeed.items[0]).toEqual({
      sentence: 'Round moved from Score to Gather',
      detail: 'Two quotes came late',
      by: { name: 'Hanne Vos' },
    });
  });

  it('cannot be stepped out of a frozen round', async () => {
    await asOwner((client) =>
      inOrganisation(client, organisation.id, `update metewand.round set stage = 'DECIDE'`),
    );
    const { version } = await read();
    const { errors } = await coordinator.ask(ADVANCE, { input: { roundId: organisation.roundId, version } });
    expect(errors?.[0].extensions.code).toBe('WRONG_STAGE');
    const input = { roundId: organisation.roundId, version, ceiling: '1', heldBackPercent: '0' };
    const refused = await financeDirector.ask(SET_CEILING, { input });
    expect(refused.errors?.[0].message).toMatch(/its figures are frozen/);
  });
});
