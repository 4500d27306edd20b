import type { ClaimedFrontier } from '../src/result/parse-frontier.js';
import { verifyFrontier } from '../src/result/verify-frontier.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import type { Problem } from '../src/problem/problem.js';
import {
  searchThreeObjectives,
  type ThreeObjectivesResult,
} from '../src/three-objectives/search-three-objectives.js';
import { surfaceCertificate } from '../src/three-objectives/surface-certificate.js';
import { aRandomProblem } from './seeded.js';

const FINGERPRINT = `sha256:${'0'.repeat(64)}`;

describe('the certificate of a surface', () => {
  it('measures boxes by hand', () => {
    const items = [
      { id: 'bought', benefit: 8, cost: 10, secondCost: 1, oneOf: 'scanner' },
      { id: 'leased', benefit: 8, cost: 2, secondCost: 5, oneOf: 'scanner' },
    ];
    const problem: Problem = { format: 'metewand-problem/1', ceiling: 20, items };
    const certificate = surfaceCertificate(problem, search(problem));
    expect(certificate.reference).toEqual({ benefit: 0, cost: 20, secondCost: 5 });
    expect(certificate).toMatchObject({ hypervolume: 8 * 10 * 4, hypervolumeBound: 8 * 10 * 4 });
    expect(certificate.surfaceBound).toHaveLength(3);
    expect(certificate.provenSecondCosts).toEqual([[0, 5]]);
  });

  it('stands up to a check from the file alone, whatever was proven', () => {
    const statuses = new Set<string>();
    for (let seed = 1; seed <= 24; seed++) {
      const problem = aProblemOfThree(seed);
      for (const effort of [0, 20_000, undefined]) {
        const result = search(problem, effort);
        statuses.add(result.status);
        expect({
          seed,
          effort,
          findings: verifyFrontier(problem, claimOf(problem, result), FINGERPRINT),
        }).toEqual({
          seed,
          effort,
          findings: [],
        });
        const { hypervolume, hypervolumeBound = Infinity } = surfaceCertificate(problem, result);
        expect(hypervolumeBound).toBeGreaterThanOrEqual(hypervolume);
      }
    }
    expect([...statuses].sort()).toEqual(['bounded', 'complete', 'infeasible', 'unproven']);
  });
});

function search(problem: Problem, effort?: number): ThreeObjectivesResult {
  const running = searchThreeObjectives(problem, {
    evaluations: 4_000,
    ...(effort === undefined ? {} : { effort }),
  });
  let step = running.next();
  while (!step.done) step = running.next();
  return step.value;
}

function claimOf(problem: Problem, result: ThreeObjectivesResult): ClaimedFrontier {
  const { status, bound, provenStretches, points, counts } = result;
  return {
    format: 'metewand-frontier/1',
    fingerprint: FINGERPRINT,
    points,
    certificate: { status, bound, provenStretches, ...surfaceCertificate(problem, result) },
    counts,
    notes: result.notes,
  };
}

function aProblemOfThree(seed: number): Problem {
  const problem = aRandomProblem(seed, 8 + (seed % 8));
  const items = problem.items.map((item, index) => ({ ...item, secondCost: (index * 7 + seed * 3) % 23 }));
  return parseProblem({ ...problem, items });
}
