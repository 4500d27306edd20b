import { verifiedProblems } from '../bench/verified.mjs';
import { parseProblem } from '../src/problem/parse-problem.js';
import highsFronts from './highs-fronts.json' with { type: 'json' };
import { pointsOf, runToEnd } from './run-search.js';

/** The fronts come from HiGHS, cost step by cost step: bench/work-out-fronts.mjs. */
describe('60 problems of 20 to 60 alternatives', () => {
  const problems = verifiedProblems();

  it('have a front each, worked out by HiGHS', () => {
    expect(highsFronts.map(({ name }) => name)).toEqual(problems.map(({ name }) => name));
    expect(highsFronts.filter(({ points }) => points.length > 1).length).toBeGreaterThan(50);
  });

  it.each(highsFronts.map(({ name, points }, index) => [name, points, index] as const))(
    'come out the same and proven: %s',
    (_, points, index) => {
      const result = runToEnd(parseProblem(problems[index]));
      expect(result.status).toBe(points.length > 0 ? 'complete' : 'infeasible');
      expect(pointsOf(result)).toEqual(points);
    },
  );
});
