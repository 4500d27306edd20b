import { TestApp } from './app.js';
import { aDemoOrganisation } from './demo-organisation.js';

const OVERVIEW = `query ($id: ID!) {
  roundOverview(roundId: $id) {
    toSettle { kind title detail by { name } candidateIds }
    settled asked { amount currency } askedByDepartment { department { name } asked { amount } candidates }
    scoresGiven scoresWanted quotesUsable quotes candidates
  }
}`;

interface Item {
  kind: string;
  title: string;
  detail: string;
  by: { name: string } | null;
  candidateIds: string[];
}

let app: TestApp;

beforeAll(async () => (app = await TestApp.start()));
afterAll(() => app.stop());

async function overviewOf(key: 'T1' | 'T2', stage: string) {
  const organisation = await aDemoOrganisation(key, { stage });
  const coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  const { roundOverview } = await coordinator.get(OVERVIEW, { id: organisation.roundId });
  const kinds = (kind: string) => (roundOverview.toSettle as Item[]).filter((item) => item.kind === kind);
  return { organisation, overview: roundOverview, kinds };
}

describe('the overview of a round', () => {
  it('adds up what is asked for, in all and by department', async () => {
    const { overview } = await overviewOf('T1', 'SCORE');
    expect(overview).toMatchObject({
      asked: { amount: '6450912.00', currency: 'EUR' },
      candidates: 56,
      quotes: 134,
      quotesUsable: 105,
      scoresGiven: 1119,
      scoresWanted: 1120,
    });
    const departments = overview.askedByDepartment as { asked: { amount: string }; candidates: number }[];
    const cents = departments.map(({ asked }) => Math.round(Number(asked.amount) * 100));
    expect(cents.reduce((sum, each) => sum + each, 0)).toBe(645_091_200);
    expect(cents).toEqual([...cents].sort((one, other) => other - one));
    expect(departments.reduce((sum, { candidates }) => sum + candidates, 0)).toBe(56);
  });

  it('names who has scores to give, and says nothing of how they were given', async () => {
    const { kinds } = await overviewOf('T1', 'SCORE');
    expect(kinds('SCORE_MISSING')).toEqual([
      {
        kind: 'SCORE_MISSING',
        title: '1 score is missing',
        detail: 'Jonas Prell has given 279 of 280',
        by: { name: 'Jonas Prell' },
        candidateIds: [],
      },
    ]);
    expect(kinds('SCORES_FAR_APART')).toEqual([]);
  });

  it('points out scores far apart once scoring has closed', async () => {
    const { organisation, kinds } = await overviewOf('T1', 'SEARCH');
    const [item] = kinds('SCORES_FAR_APART');
    expect(item.candidateIds).toContain(organisation.candidate('C31'));
    expect(item.detail).toMatch(/^The widest: \d+ points on C-31 /);
    expect(item.by).toEqual({ name: 'Ilse Marchand' });
    expect(kinds('SCORE_MISSING')[0].candidateIds).toEqual([organisation.candidate('C38')]);
  });

  it('reminds of a need that two departments ask for', async () => {
    const { organisation, kinds } = await overviewOf('T1', 'SEARCH');
    const pairs = kinds('EITHER_OR_PAIR').map(({ candidateIds }) => candidateIds);
    expect(pairs).toEqual([[organisation.candidate('C09'), organisation.candidate('C56')]]);
  });

  it('puts a mandatory candidate without an open quote first', async () => {
    const { organisation, kinds } = await overviewOf('T2', 'SEARCH');
    const open = kinds('NO_OPEN_QUOTE');
    expect(open.map(({ candidateIds }) => candidateIds)).toEqual([
      [organisation.candidate('D05')],
      [organisation.candidate('D17')],
    ]);
    expect(open[0].title).toMatch(/^D-05 .+ has no quote open on 15 Feb 2027$/);
    expect(open[0].detail).toMatch(
      /^It is mandatory and would be left out\. D05-Q1: it runs out on 12 Feb 2027/,
    );
    expect(open[0].by).toEqual({ name: 'Callum Reed' });
  });
});
