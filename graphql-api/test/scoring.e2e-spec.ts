import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';

const SHEET = `query ($id: ID!) {
  scoreSheet(roundId: $id) {
    round { stage version } candidates { code } criteria { id name swingWeight weight lowAnchor highAnchor }
    own { candidateId criterionId membershipId points cannotJudge reason version }
    others { membershipId points }
    assessors { membership { id name } given of }
  }
}`;
const SAVE = `mutation ($input: SaveScoreInput!) { saveScore(input: $input) { id points cannotJudge reason version } }`;
const BENEFIT = `query ($id: ID!) { candidate(id: $id) { benefit { points lowest highest missingScores } } }`;
const ADVANCE = `mutation ($input: AdvanceRoundInput!) {
  advanceRound(input: $input) { __typename ... on Round { stage version } ... on RoundNotReady { message missing } }
}`;
const COUNTS = `query ($id: ID!) { round(id: $id) { counts { candidates quotes quotesToSettle scoresMissing } } }`;
const TRAIL = `query ($id: ID!) { auditFeed(roundId: $id, first: 1) { items { sentence detail by { name } } } }`;

let app: TestApp;
let organisation: DemoOrganisation;
let coordinator: Member;
let assessor: Member;

beforeAll(async () => {
  app = await TestApp.start();
  organisation = await aDemoOrganisation('T1');
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  assessor = await app.as(organisation.email('A3'));
});
afterAll(() => app.stop());

const sheet = async (member: Member) => (await member.get(SHEET, { id: organisation.roundId })).scoreSheet;
const criterionId = (position: number) => organisation.rows.criterion[position].id;
const score = (own: Record<string, unknown> = {}) => ({
  candidateId: organisation.candidate('C38'),
  criterionId: criterionId(2),
  points: 61,
  cannotJudge: false,
  reason: 'Fewer patients sent elsewhere',
  ...own,
});
const save = (own: Record<string, unknown> = {}, member = assessor) =>
  member.ask(SAVE, { input: score(own) });
const setStage = (stage: string) =>
  asOwner((client) =>
    inOrganisation(client, organisation.id, 'update metewand.round set stage = $1', [stage]),
  );

describe('before scoring closes', () => {
  it('criteria carry their share of all weights', async () => {
    const { criteria } = await sheet(assessor);
    expect(
      criteria.map(({ swingWeight, weight }: { swingWeight: number; weight: string }) => [
        swingWeight,
        weight,
      ]),
    ).toEqual([
      [100, '0.285714'],
      [85, '0.242857'],
      [70, '0.200000'],
      [55, '0.157143'],
      [40, '0.114286'],
    ]);
  });

  it('an assessor sees the own scores, and of the others only how many they gave', async () => {
    const { own, others, assessors, candidates } = await sheet(assessor);
    const me = assessors.find(
      ({ membership }: { membership: { name: string } }) => membership.name === 'Jonas Prell',
    );
    expect(candidates).toHaveLength(56);
    expect(own).toHaveLength(279);
    expect(new Set(own.map(({ membershipId }: { membershipId: string }) => membershipId))).toEqual(
      new Set([me.membership.id]),
    );
    expect(others).toEqual([]);
    expect(assessors.map(({ given, of }: { given: number; of: number }) => [given, of])).toEqual([
      [280, 280],
      [279, 280],
      [280, 280],
      [280, 280],
    ]);
  });

  it('somebody who no longer scores is asked for nothing more', async () => {
    const setRoles = (roles: string) =>
      asOwner((client) =>
        inOrganisation(
          client,
          organisation.id,
          'update metewand.membership set roles = $1 where email = $2',
          [roles, organisation.email('A3')],
        ),
      );
    await setRoles('{AUDITOR}');
    const { assessors } = await sheet(coordinator);
    await setRoles('{CLINICAL_ASSESSOR}');
    expect(assessors.map(({ given, of }: { given: number; of: number }) => [given, of])).toContainEqual([
      279, 279,
    ]);
  });

  it('nobody else sees any score, nor what they add up to', async () => {
    expect(await sheet(coordinator)).toMatchObject({ own: [], others: [] });
    expect((await coordinator.get(BENEFIT, { id: organisation.candidate('C08') })).candidate).toEqual({
      benefit: null,
    });
  });

  it('an assessor gives a score, changes it, and the trail tells neither', async () => {
    const given = await save();
    expect(given.data.saveScore).toMatchObject({ points: 61, cannotJudge: false, version: 1 });
    const changed = await save({ points: null, cannotJudge: true, reason: '' });
    expect(changed.data.saveScore).toMatchObject({
      id: given.data.saveScore.id,
      points: null,
      cannotJudge: true,
      version: 2,
    });
    const { auditFeed } = await coordinator.get(TRAIL, { id: organisation.roundId });
    expect(auditFeed.items[0]).toEqual({
      sentence: 'Score given',
      detail: expect.stringMatching(/^C-38 .+, .+/),
      by: { name: 'Jonas Prell' },
    });
    const trail = await asOwner((client) =>
      inOrganisation(
        client,
        organisation.id,
        `select data from metewand.audit_entry where action = 'score.saved'`,
      ),
    );
    expect(JSON.stringify(trail)).not.toContain('61');
    await asOwner((client) =>
      inOrganisation(client, organisation.id, 'delete from metewand.score where id = $1', [
        given.data.saveScore.id,
      ]),
    );
  });

  it('counts the own missing scores for an assessor, all for others', async () => {
    const counts = async (member: Member) =>
      (await member.get(COUNTS, { id: organisation.roundId })).round.counts;
    expect(await counts(coordinator)).toEqual({
      candidates: 56,
      quotes: 134,
      quotesToSettle: 0,
      scoresMissing: 1,
    });
    expect(await counts(await app.as(organisation.email('A1')))).toMatchObject({ scoresMissing: 0 });
  });
});

describe('a score is not saved', () => {
  it.each([
    ['above 100', { points: 101 }, 'Give whole points from 0 to 100'],
    ['below 0', { points: -1 }, 'Give whole points from 0 to 100'],
    ['with neither points nor the word that it cannot be judged', { points: null }, 'one of the two'],
    ['with both', { cannotJudge: true }, 'one of the two'],
  ])('%s', async (_case, own, message) => {
    const { errors } = await save(own);
    expect(errors?.[0].extensions.code).toBe('BAD_USER_INPUT');
    expect(errors?.[0].message).toContain(message);
  });

  it('by a member who is no assessor', async () => {
    expect((await save({}, coordinator)).errors?.[0].extensions.code).toBe('FORBIDDEN');
  });

  it('for a candidate or a criterion of another organisation', async () => {
    const other = await aDemoOrganisation('T2');
    for (const own of [
      { candidateId: other.candidate('D01') },
      { criterionId: other.rows.criterion[0].id },
    ]) {
      expect((await save(own)).errors?.[0].extensions.code).toBe('NOT_FOUND');
    }
  });

  it.each([
    ['before scoring opens', 'GATHER', 'Scoring has not opened yet.'],
    ['after it has closed', 'SEARCH', 'Scoring has closed, so scores are frozen.'],
  ])('%s', async (_case, stage, message) => {
    await setStage(stage);
    const { errors } = await save();
    expect({ code: errors?.[0].extensions.code, message: errors?.[0].message }).toEqual({
      code: 'WRONG_STAGE',
      message,
    });
    await setStage('SCORE');
  });
});

describe('closing scoring', () => {
  const advance = async () => {
    const { version } = (await sheet(coordinator)).round;
    return (await coordinator.get(ADVANCE, { input: { roundId: organisation.roundId, version } }))
      .advanceRound;
  };

  it('waits for criteria that nobody has scored', async () => {
    const removed = await asOwner((client) =>
      inOrganisation(
        client,
        organisation.id,
        `delete from metewand.score where candidate_id = $1 and criterion_id = $2
         returning candidate_id, criterion_id, membership_id, points`,
        [organisation.candidate('C15'), criterionId(0)],
      ),
    );
    const refused = await advance();
    expect(refused).toMatchObject({ __typename: 'RoundNotReady', message: 'The round cannot go on yet.' });
    expect(refused.missing).toEqual([expect.stringMatching(/^Nobody has scored C-15 .+ on .+\.$/)]);
    await asOwner((client) =>
      inOrganisation(
        client,
        organisation.id,
        `insert into metewand.score (candidate_id, criterion_id, membership_id, points)
         select candidate_id, criterion_id, membership_id, points
         from jsonb_populate_recordset(null::metewand.score, $1)`,
        [JSON.stringify(removed)],
      ),
    );
  });

  it('shows what everybody gave, and the benefit with its spread', async () => {
    expect(await advance()).toMatchObject({ __typename: 'Round', stage: 'SEARCH' });
    const { own, others } = await sheet(assessor);
    expect([own.length, others.length]).toEqual([279, 840]);
    const { candidate } = await assessor.get(BENEFIT, { id: organisation.candidate('C01') });
    expect(candidate.benefit).toMatchObject({ points: '93.6321', missingScores: 0 });
    const [lowest, points, highest] = [candidate.benefit.lowest, '93.6321', candidate.benefit.highest].map(
      Number,
    );
    expect(lowest).toBeLessThan(points);
    expect(highest).toBeGreaterThan(points);
  });

  it('leaves a single missing score missing', async () => {
    const { candidate } = await coordinator.get(BENEFIT, { id: organisation.candidate('C38') });
    expect(candidate.benefit.missingScores).toBe(1);
  });
});
