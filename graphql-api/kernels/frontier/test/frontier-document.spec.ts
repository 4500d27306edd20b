import { toFrontierDocument } from '../src/result/frontier-document.js';
import { hypervolume } from '../src/archive/hypervolume.js';
import { kneeOf } from '../src/archive/knee.js';
import { searchFrontier } from '../src/search.js';
import { aProblem, TWO_NEEDS_AND_A_HOIST_FRONT, twoNeedsAndAHoist } from './examples.js';
import { runToEnd } from './run-search.js';

const front = TWO_NEEDS_AND_A_HOIST_FRONT.map(([cost, benefit]) => [cost, benefit] as const);
const facts = { fingerprint: `sha256:${'0'.repeat(64)}`, threads: 2, seconds: 0.41 };

describe('the hypervolume', () => {
  it("is the one of the format's example", () => {
    expect(hypervolume(front, { benefit: 0, cost: 100 })).toBe(6261);
  });

  it('counts nothing beyond the reference', () => {
    expect(hypervolume(front, { benefit: 0, cost: 24 })).toBe(240);
    expect(hypervolume(front, { benefit: 120, cost: 100 })).toBe(0);
    expect(hypervolume([], { benefit: 0, cost: 100 })).toBe(0);
  });
});

describe('the knee', () => {
  it('is the point farthest above the line between the ends, both axes alike', () => {
    expect(
      kneeOf([
        [0, 0],
        [10, 400],
        [20, 900],
        [60, 950],
        [100, 1000],
      ]),
    ).toBe(2);
  });

  it('is the cheapest of equally far points', () => {
    expect(
      kneeOf([
        [0, 0],
        [1, 2],
        [2, 3],
        [4, 4],
      ]),
    ).toBe(1);
  });

  it('is not there in a straight or hollow front, or one of two points', () => {
    const straight = [0, 1, 2].map((figure) => [figure, figure] as const);
    expect(kneeOf(straight)).toBeUndefined();
    expect(
      kneeOf([
        [0, 0],
        [5, 1],
        [10, 10],
      ]),
    ).toBeUndefined();
    expect(kneeOf(straight.slice(0, 2))).toBeUndefined();
    expect(kneeOf([])).toBeUndefined();
  });
});

describe('the frontier document', () => {
  it('carries the points and what is proven of them', () => {
    const problem = twoNeedsAndAHoist();
    const result = runToEnd(problem, { seed: 4 });
    expect(toFrontierDocument(problem, result, facts)).toEqual({
      format: 'metewand-frontier/1',
      problem: 'two needs and a hoist',
      ...facts,
      seed: 4,
      points: result.points,
      certificate: {
        status: 'complete',
        rules: {
          dominance: expect.stringMatching(/at least as good in benefit and cost and better in one/),
          ties: expect.stringMatching(/the same benefit and cost .* in the order of the problem's items/),
        },
        provenStretches: [[0, 100]],
        bound: TWO_NEEDS_AND_A_HOIST_FRONT,
        hypervolume: 6261,
        hypervolumeBound: 6261,
        reference: { benefit: 0, cost: 100 },
      },
      counts: result.counts,
      notes: [],
    });
  });

  it('has volumes, a surface bound and the rules of three objectives where there is a second cost', () => {
    const items = [
      { id: 'bought', benefit: 8, cost: 10, secondCost: 1, oneOf: 'scanner' },
      { id: 'leased', benefit: 8, cost: 2, secondCost: 5, oneOf: 'scanner' },
    ];
    const problem = aProblem([], { ceiling: 20, items });
    const { points, certificate } = toFrontierDocument(problem, runToEnd(problem), facts);
    expect(points).toContainEqual({ benefit: 8, cost: 10, secondCost: 1, picks: { bought: 1 } });
    expect(certificate).toMatchObject({
      status: 'complete',
      rules: { dominance: expect.stringMatching(/benefit, cost and second cost/) },
      bound: [
        [0, 0],
        [2, 8],
      ],
      surfaceBound: [
        [0, 0, 0],
        [2, 8, 5],
        [10, 8, 1],
      ],
      provenSecondCosts: [[0, 5]],
      hypervolume: 8 * 10 * 4,
      hypervolumeBound: 8 * 10 * 4,
      reference: { benefit: 0, cost: 20, secondCost: 5 },
    });
  });

  it('says that a run was stopped', () => {
    const problem = twoNeedsAndAHoist();
    const search = searchFrontier(problem, { reportEvery: 1 });
    search.next();
    const step = search.next({ stop: true });
    if (!step.done) throw new Error('It went on.');
    expect(toFrontierDocument(problem, step.value, facts).certificate.stopped).toBe(true);
  });

  it('has no point and the reasons where the problem is infeasible', () => {
    const problem = aProblem(['bed'], { ceiling: 5, mustInclude: ['bed'] });
    const document = toFrontierDocument(problem, runToEnd(problem), facts);
    expect(document.points).toEqual([]);
    expect(document.certificate).toMatchObject({ status: 'infeasible', hypervolume: 0 });
    expect(document.notes).toHaveLength(1);
  });
});
