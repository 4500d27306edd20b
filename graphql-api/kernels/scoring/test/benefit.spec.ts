import type { WeightedCriterion } from '../src/index.js';
import { candidateBenefit, combineAssessors } from '../src/index.js';
import demo from './demo-scores.json' with { type: 'json' };

interface Organisation {
  organisation: string;
  criteria: WeightedCriterion[];
  assessors: string[];
  candidates: { id: string; ratings: Record<string, Record<string, number>> }[];
  results: { id: string; benefit: number }[];
}

const organisations = demo.organisations as unknown as Organisation[];

function demoBenefit({ criteria, assessors, candidates }: Organisation, candidateId: string) {
  const { ratings } = candidates.find(({ id }) => id === candidateId)!;
  const scores = Object.entries(ratings).flatMap(([assessorId, given]) =>
    Object.entries(given).map(([criterionId, points]) => ({ criterionId, assessorId, points })),
  );
  return candidateBenefit(criteria, assessors, scores);
}

describe.each(organisations)(
  'demo round of $organisation [invented, results computed independently]',
  (round) => {
    it.each(round.results)('scores $id at $benefit', ({ id, benefit }) => {
      const result = demoBenefit(round, id);
      expect(result.benefit).toBe(benefit);
      expect(result.missing).toBe(id === 'C38' ? 1 : 0);
      expect(result.lowest!).toBeLessThanOrEqual(benefit + 5e-5);
      expect(result.highest!).toBeGreaterThanOrEqual(benefit - 5e-5);
    });
  },
);

it('flags the assessor of the demo who is far above the others: C31', () => {
  const { criteria } = demoBenefit(organisations[0], 'C31');
  expect(criteria.some(({ wide, highest }) => wide && highest === 95)).toBe(true);
});

describe('the benefit of a candidate', () => {
  const criteria = [
    { id: 'safety', swingWeight: 100 },
    { id: 'access', swingWeight: 50 },
  ];
  const score = (assessorId: string, criterionId: string, points: number | null) => ({
    assessorId,
    criterionId,
    points,
  });

  it('leaves a missing score out of that mean only, and says so', () => {
    const scores = [
      score('a', 'safety', 60),
      score('b', 'safety', 30),
      score('a', 'access', 90),
      score('b', 'access', null),
    ];
    const result = candidateBenefit(criteria, ['a', 'b', 'c'], scores);
    expect(result.benefitTenThousandths).toBe(600_000);
    expect(result.missing).toBe(3);
    expect(result.byAssessor).toEqual([
      { assessorId: 'a', benefit: 70 },
      { assessorId: 'b', benefit: 50 },
    ]);
    expect([result.lowest, result.highest]).toEqual([50, 70]);
    expect(result.criteria[0]).toMatchObject({
      mean: 45,
      lowest: 30,
      highest: 60,
      spread: 30,
      wide: true,
      missing: 1,
    });
    expect(result.criteria[1]).toMatchObject({ mean: 90, spread: 0, wide: false, missing: 2 });
  });

  it('counts a criterion nobody scored as nothing and names it', () => {
    const result = candidateBenefit(criteria, ['a'], [score('a', 'safety', 30)]);
    expect(result.unscoredCriteria).toEqual(['access']);
    expect(result.benefit).toBe(20);
  });

  it('is nothing, with no range, before anybody has scored', () => {
    const result = candidateBenefit(criteria, ['a', 'b'], []);
    expect(result).toMatchObject({ benefit: 0, missing: 4, lowest: null, highest: null, byAssessor: [] });
  });

  it('counts a score by somebody who was not asked', () => {
    const result = candidateBenefit(criteria, [], [score('x', 'safety', 30), score('x', 'access', 30)]);
    expect(result).toMatchObject({ benefit: 30, missing: 0 });
  });

  it('rounds the exact half up: 1/32 of a point is 0.0313', () => {
    const weights = [
      { id: 'one', swingWeight: 1 },
      { id: 'rest', swingWeight: 31 },
    ];
    const result = candidateBenefit(weights, ['a'], [score('a', 'one', 1), score('a', 'rest', 0)]);
    expect(result.benefitTenThousandths).toBe(313);
  });

  it.each([
    ['a whole number from 0 to 100', [score('a', 'safety', 101)]],
    ['a whole number from 0 to 100', [score('a', 'safety', 0.5)]],
    ['no criterion here', [score('a', 'beauty', 1)]],
    ['two scores on safety', [score('a', 'safety', 1), score('a', 'safety', 2)]],
  ])('refuses scores: %s', (message, scores) => {
    expect(() => candidateBenefit(criteria, ['a'], scores)).toThrow(message);
  });

  it('refuses criteria without weight, with half weights or listed twice', () => {
    expect(() => candidateBenefit([], [], [])).toThrow('at least one above zero');
    expect(() => candidateBenefit([{ id: 'a', swingWeight: 0.5 }], [], [])).toThrow('must be a whole number');
    expect(() => candidateBenefit([criteria[0], criteria[0]], [], [])).toThrow('listed twice');
  });
});

describe('combining assessors', () => {
  it('reports a criterion nobody scored', () => {
    const combined = combineAssessors([null, null], 'mean');
    expect(combined).toMatchObject({
      mean: null,
      counted: 0,
      missing: 2,
      lowest: null,
      highest: null,
      wide: false,
    });
  });

  it('knows the mean and no other rule', () => {
    expect(() => combineAssessors([1], 'median' as 'mean')).toThrow('only be combined by their mean');
  });
});
