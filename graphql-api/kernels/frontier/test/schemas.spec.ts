import { Ajv2020 } from 'ajv/dist/2020.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { toFrontierDocument } from '../src/result/frontier-document.js';
import { parseFrontier } from '../src/result/parse-frontier.js';
import frontierSchema from '../frontier.schema.json' with { type: 'json' };
import problemSchema from '../problem.schema.json' with { type: 'json' };
import { SOME_FINGERPRINT, twoNeedsAndAHoistFrontier } from './claimed-frontier.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';
import { runToEnd } from './run-search.js';
import { aRandomProblem } from './seeded.js';

const ajv = new Ajv2020({ allErrors: true });
const fitsProblem = ajv.compile(problemSchema);
const fitsFrontier = ajv.compile(frontierSchema);
const facts = { fingerprint: SOME_FINGERPRINT, threads: 1, seconds: 0.25 };
const written = (document: object): unknown => JSON.parse(JSON.stringify(document));

describe('the schemas', () => {
  it('fit the problems that are read', () => {
    for (const problem of [twoNeedsAndAHoist(), ...[1, 2, 3, 4].map((seed) => aRandomProblem(seed, 9))]) {
      expect(parseProblem(problem)).toEqual(problem);
      expect([fitsProblem(written(problem)), fitsProblem.errors]).toEqual([true, null]);
    }
  });

  it('refuse what is refused', () => {
    for (const wrong of [
      { ...aProblem([]), budget: 4 },
      { ...aProblem(['bed']), ceiling: 0.5 },
      { items: [] },
    ]) {
      expect(() => parseProblem(wrong)).toThrow();
      expect(fitsProblem(wrong)).toBe(false);
    }
    const { certificate, ...rest } = twoNeedsAndAHoistFrontier();
    for (const wrong of [
      rest,
      { ...rest, certificate: { ...certificate, status: 'done' } },
      { ...rest, certificate: { ...certificate, rules: { dominance: 'more' } } },
    ]) {
      expect(() => parseFrontier(wrong)).toThrow();
      expect(fitsFrontier(written(wrong))).toBe(false);
    }
  });

  it('fit the frontiers that are written', () => {
    const infeasible = aProblem(['bed'], { ceiling: 5, mustInclude: ['bed'] });
    const items = [{ id: 'bed', benefit: 1, cost: 1, secondCost: 4 }];
    const surface = aProblem([], { items });
    for (const problem of [twoNeedsAndAHoist(), infeasible, aRandomProblem(3, 9), surface]) {
      const document = toFrontierDocument(problem, runToEnd(problem, { evaluations: 20_000 }), facts);
      expect([fitsFrontier(written(document)), fitsFrontier.errors]).toEqual([true, null]);
    }
    expect([fitsFrontier(written(twoNeedsAndAHoistFrontier())), fitsFrontier.errors]).toEqual([true, null]);
  });
});
