import type { Problem } from '../src/problem/problem.js';
import { bruteForceFront } from './brute-force.js';
import { PUBLISHED_BUDGETS } from './published-budgets.js';
import { LIMITED_SELECTIONS, LORIE_SAVAGE, type PublishedCase } from './published-data.js';
import { pointsOf, runToEnd } from './run-search.js';

/** Values in tenths, because Petersen's second problem has them; the cost is the use of the first limit. */
function problemOf({ values, uses, limits }: PublishedCase): Problem {
  return {
    format: 'metewand-problem/1',
    limits: limits.map((most, index) => ({ name: `limit ${index + 1}`, most })),
    items: values.map((value, index) => ({
      id: `${index + 1}`,
      benefit: Math.round(10 * value),
      cost: uses[0][index],
      uses: uses.map((row) => row[index]),
    })),
  };
}

describe('published selections under several limits', () => {
  it.each(LIMITED_SELECTIONS.map((each) => [each.name, each] as const))(
    'end at the published optimum, proven: %s',
    (_, published) => {
      const result = runToEnd(problemOf(published));
      expect(result.status).toBe('complete');
      expect(result.points.at(-1)?.benefit).toBe(Math.round(10 * published.optimum));
    },
  );

  it('end at the projects that alone reach the optimum of Lorie and Savage', () => {
    const result = runToEnd(problemOf(LORIE_SAVAGE));
    expect(result.points.at(-1)).toEqual({
      benefit: 700,
      cost: 48,
      picks: { 1: 1, 3: 1, 4: 1, 6: 1, 9: 1 },
    });
  });

  it.each(
    LIMITED_SELECTIONS.filter(({ values }) => values.length <= 15).map((each) => [each.name, each] as const),
  )('have the front that brute force finds: %s', (_, published) => {
    const problem = problemOf(published);
    expect(pointsOf(runToEnd(problem))).toEqual(bruteForceFront(problem));
  });
});

describe('published selections within a budget', () => {
  it.each(PUBLISHED_BUDGETS.map((each) => [each.name, each] as const))(
    'end at the published optimum, proven: %s',
    (_, { problem, optimum, chosen }) => {
      const result = runToEnd(problem);
      expect(result.status).toBe('complete');
      const best = result.points.at(-1);
      expect(best?.benefit).toBe(optimum);
      if (chosen) expect(Object.keys(best?.picks ?? {}).sort()).toEqual([...chosen].sort());
    },
  );

  it.each(
    PUBLISHED_BUDGETS.filter(({ problem }) => problem.items.length <= 15).map(
      (each) => [each.name, each] as const,
    ),
  )('have the front that brute force finds: %s', (_, { problem }) => {
    expect(pointsOf(runToEnd(problem))).toEqual(bruteForceFront(problem));
  });
});

/**
 * Goodwin and Wright, Decision Analysis for Management Judgment (3rd ed., 2004), chapter 13: one strategy for each
 * of four sales regions, 54 packages. Benefit is the weighted sum of three criteria, rescaled so that the least
 * package is 0 and the greatest 100.
 */
describe('four sales regions with one strategy each', () => {
  const strategies = {
    North: [
      { cost: 12, profit: 27.27, share: 0, risk: 10 },
      { cost: 28, profit: 0, share: 70, risk: 0 },
    ],
    West: [
      { cost: -14, profit: 39.39, share: 0, risk: 20 },
      { cost: 7, profit: 21.27, share: 15, risk: 12 },
      { cost: 16, profit: 0, share: 50, risk: 0 },
    ],
    East: [
      { cost: 2, profit: 100, share: 0, risk: 100 },
      { cost: 25, profit: 91, share: 25, risk: 70 },
      { cost: 40, profit: 0, share: 100, risk: 0 },
    ],
    South: [
      { cost: 20, profit: 90.91, share: 0, risk: 30 },
      { cost: 25, profit: 45.46, share: 48, risk: 12 },
      { cost: 45, profit: 0, share: 60, risk: 0 },
    ],
  };
  const weights = { profit: 30, share: 100, risk: 50 };
  const expected = [
    [20, 0],
    [25, 19.5],
    [36, 43.6],
    [41, 63],
    [62, 67.3],
    [64, 68.6],
    [71, 84.7],
    [94, 90.3],
    [109, 100],
  ];
  /** Closing West brings money in: a constant on each of its strategies keeps costs from being negative. */
  const westShift = 14;

  const problem: Problem = {
    format: 'metewand-problem/1',
    items: Object.entries(strategies).flatMap(([region, alternatives]) =>
      alternatives.map(({ cost, profit, share, risk }, index) => ({
        id: `${region} ${index + 1}`,
        benefit: Math.round(100 * (weights.profit * profit + weights.share * share + weights.risk * risk)),
        cost: cost + (region === 'West' ? westShift : 0),
        oneOf: region,
      })),
    ),
    counts: Object.entries(strategies).map(([region, alternatives]) => ({
      name: region,
      items: alternatives.map((_, index) => `${region} ${index + 1}`),
      least: 1,
    })),
  };
  const benefitsByRegion = Object.keys(strategies).map((region) =>
    problem.items.filter(({ oneOf }) => oneOf === region).map(({ benefit }) => benefit),
  );
  const least = benefitsByRegion.reduce((sum, benefits) => sum + Math.min(...benefits), 0);
  const greatest = benefitsByRegion.reduce((sum, benefits) => sum + Math.max(...benefits), 0);

  it('is searched to the end', () => {
    expect(runToEnd(problem).status).toBe('complete');
  });

  it.each([
    ['search', () => pointsOf(runToEnd(problem))],
    ['brute force', () => bruteForceFront(problem)],
  ])('has the published packages as its front, by %s', (_, front) => {
    const rescaled = front().map(([cost, benefit]) => [
      cost - westShift,
      Math.round((1000 * (benefit - least)) / (greatest - least)) / 10,
    ]);
    expect(rescaled).toEqual(expected);
  });
});
