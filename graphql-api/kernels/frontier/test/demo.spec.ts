import { violationsOf } from '../src/problem/feasible.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { bruteForceFront } from './brute-force.js';
import exactFront from './demo-exact-front.json' with { type: 'json' };
import demoProblems from './demo-problems.json' with { type: 'json' };
import { pointsOf, runToEnd } from './run-search.js';

/**
 * The two invented organisations of the demo round: money in minor units, benefit in ten-thousandths of a point.
 * The best portfolios and the 853 points of the first front were worked out by an independent solver (HiGHS, cost
 * step by cost step).
 */
describe('the demo round, with the default settings', () => {
  it('has the whole front of the first organisation, proven', () => {
    const problem = parseProblem(demoProblems.firstOrganisation);
    const result = runToEnd(problem);
    expect(exactFront).toHaveLength(853);
    expect(pointsOf(result)).toEqual(exactFront);
    expect(result.points.at(-1)).toMatchObject({ benefit: 8_187_213, cost: 230_055_600 });
    expect(result).toMatchObject({ status: 'complete', stopped: false, bound: exactFront });
    for (const { picks } of result.points) expect(violationsOf(problem, picks)).toEqual([]);
  });

  it('does not owe that to its seed', () => {
    const result = runToEnd(parseProblem(demoProblems.firstOrganisation), { seed: 20_270_215 });
    expect(result.status).toBe('complete');
    expect(pointsOf(result)).toEqual(exactFront);
  });

  it('has the whole front of the second organisation with its quotes as they stand, proven', () => {
    const problem = parseProblem(demoProblems.secondOrganisationAsQuoted);
    const result = runToEnd(problem);
    expect(result.status).toBe('complete');
    expect(result.points.at(-1)).toMatchObject({ benefit: 3_089_540, cost: 36_080_040 });
    expect(result.points).toHaveLength(48);
    expect(pointsOf(result)).toEqual(bruteForceFront(problem));
  });

  it('has the best portfolio of the second organisation with both run-out quotes extended, proven', () => {
    const result = runToEnd(parseProblem(demoProblems.secondOrganisationExtended));
    expect(result.status).toBe('complete');
    expect(result.points.at(-1)).toMatchObject({ benefit: 3_114_885, cost: 35_846_040 });
  });
});
