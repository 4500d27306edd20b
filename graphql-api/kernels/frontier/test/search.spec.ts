import { ProblemError } from '../src/problem/problem-error.js';
import { beginSearch, searchFrontier } from '../src/search.js';
import { violationsOf } from '../src/problem/feasible.js';
import demoProblems from './demo-problems.json' with { type: 'json' };
import { parseProblem } from '../src/problem/parse-problem.js';
import { aProblem, TWO_NEEDS_AND_A_HOIST_FRONT, twoNeedsAndAHoist } from './examples.js';
import { pointsOf, runToEnd } from './run-search.js';
import { aRandomProblem } from './seeded.js';

const demo = parseProblem(demoProblems.firstOrganisation);

describe('a search', () => {
  it("finds the whole front of the format's example", () => {
    const result = runToEnd(twoNeedsAndAHoist());
    expect(pointsOf(result)).toEqual(TWO_NEEDS_AND_A_HOIST_FRONT);
    expect(result.points.at(-1)?.picks).toEqual({ 'scanner-a': 1, hoist: 3 });
    expect(result).toMatchObject({ status: 'complete', stopped: false, notes: [] });
  });

  it('counts the empty portfolio where it is feasible', () => {
    expect(runToEnd(aProblem([])).points).toEqual([{ benefit: 0, cost: 0, picks: {} }]);
    expect(runToEnd(aProblem(['bed'])).points[0]).toEqual({ benefit: 0, cost: 0, picks: {} });
    const mandatory = runToEnd(aProblem(['bed', 'lamp'], { mustInclude: ['bed'] }));
    expect(mandatory.points[0]).toEqual({ benefit: 10, cost: 10, picks: { bed: 1 } });
  });

  it('takes the pieces of one item apart', () => {
    const problem = aProblem([], { items: [{ id: 'pump', benefit: 3, cost: 2, most: 4 }], ceiling: 7 });
    expect(pointsOf(runToEnd(problem))).toEqual([
      [0, 0],
      [2, 3],
      [4, 6],
      [6, 9],
    ]);
  });

  it('gives the same result for the same seed and another way there for another', () => {
    const settings = { evaluations: 300_000, effort: 20_000 };
    const result = runToEnd(demo, { ...settings, seed: 5 });
    expect(runToEnd(demo, { ...settings, seed: 5 })).toEqual(result);
    expect(runToEnd(demo, { ...settings, seed: 5, reportEvery: 100_000 }).points).toEqual(result.points);
    const other = runToEnd(demo, { ...settings, seed: 6 });
    expect([other.evaluations, other.counts]).not.toEqual([result.evaluations, result.counts]);
  });

  it('ends soon after its budget, with what the relaxation proves', () => {
    const result = runToEnd(demo, { evaluations: 200_000, effort: 0 });
    expect(result.evaluations).toBeGreaterThanOrEqual(200_000);
    expect(result.evaluations).toBeLessThan(250_000);
    expect(result.status).toBe('bounded');
    expect(result.bound.length).toBeGreaterThan(100);
  });

  it('does not look many times over at the few portfolios of a small problem', () => {
    expect(runToEnd(twoNeedsAndAHoist()).evaluations).toBeLessThan(60_000);
  });

  it('reports a front that only gets better', () => {
    let reports = 0;
    let bestBefore = 0;
    let doneBefore = 0;
    runToEnd(demo, { evaluations: 500_000, effort: 0, reportEvery: 50_000 }, (progress) => {
      reports++;
      expect(progress.evaluations).toBeGreaterThan(doneBefore);
      expect(progress.bestBenefit).toBeGreaterThanOrEqual(bestBefore);
      expect(progress.points()).toHaveLength(progress.kept);
      expect(progress.portfolios().map(({ cost, benefit }) => [cost, benefit])).toEqual(progress.points());
      bestBefore = progress.bestBenefit ?? 0;
      doneBefore = progress.evaluations;
    });
    expect(reports).toBeGreaterThanOrEqual(9);
  });

  it('can be stopped at any report and still gives what it has', () => {
    for (const reports of [1, 2, 5]) {
      const search = searchFrontier(demo, { reportEvery: 20_000 });
      for (let report = 0; report < reports; report++) search.next();
      const step = search.next({ stop: true });
      if (!step.done) throw new Error('It went on.');
      expect(step.value.stopped).toBe(true);
      expect(step.value.points.length).toBeGreaterThan(10);
      for (const { picks } of step.value.points) expect(violationsOf(demo, picks)).toEqual([]);
    }
  });

  it('shows samples of feasible portfolios, all of them beaten or matched by the front', () => {
    const result = runToEnd(demo, { evaluations: 1_000_000, effort: 0, lookedAtSample: 1_000 });
    expect(result.lookedAt.length).toBeGreaterThan(250);
    expect(result.lookedAt.length).toBeLessThanOrEqual(1_000);
    expect(result.onceKept.length).toBeGreaterThan(500);
    expect(result.counts).toEqual({
      lookedAt: result.evaluations,
      kept: result.points.length,
      sinceBeaten: result.onceKept.length,
    });
    for (const [cost, benefit] of [...result.lookedAt, ...result.onceKept]) {
      expect(result.points.some((point) => point.cost <= cost && point.benefit >= benefit)).toBe(true);
    }
  });

  it('keeps no sample where none is wanted', () => {
    expect(runToEnd(demo, { evaluations: 100_000, effort: 0, lookedAtSample: 0 }).lookedAt).toEqual([]);
  });

  it('gives plain data that a thread can send', () => {
    const result = runToEnd(aRandomProblem(3, 12), { evaluations: 20_000 });
    expect(structuredClone(result)).toEqual(result);
    expect(JSON.parse(JSON.stringify(result))).toEqual(result);
  });

  it('has three objectives where an item has a second cost', () => {
    const items = [
      { id: 'bought', benefit: 8, cost: 10, secondCost: 1, oneOf: 'scanner' },
      { id: 'leased', benefit: 8, cost: 2, secondCost: 5, oneOf: 'scanner' },
      { id: 'lent', benefit: 8, cost: 2, secondCost: 6, oneOf: 'scanner' },
    ];
    const result = runToEnd(aProblem([], { items }));
    expect(result).toMatchObject({
      status: 'complete',
      points: [
        { benefit: 0, cost: 0, secondCost: 0, picks: {} },
        { benefit: 8, cost: 2, secondCost: 5, picks: { leased: 1 } },
        { benefit: 8, cost: 10, secondCost: 1, picks: { bought: 1 } },
      ],
      surfaceBound: [
        [0, 0, 0],
        [2, 8, 5],
        [10, 8, 1],
      ],
      provenSecondCosts: [[0, 6]],
    });
  });

  it('hands out no tasks where an item has a second cost', () => {
    const problem = aProblem([], { items: [{ id: 'bed', benefit: 1, cost: 1, secondCost: 4 }] });
    expect(() => beginSearch(problem, {})).toThrow(ProblemError);
    expect(() => beginSearch(problem, {})).toThrow(/items\[0\]\.secondCost.*two objectives/);
  });

  it('says what stays broken where it finds nothing and cannot prove that there is nothing', () => {
    const problem = aProblem([], {
      limits: [{ name: 'weight', most: 7, least: 7 }],
      items: [3, 4, 5].map((use) => ({ id: `load ${use}`, benefit: 1, cost: 1, uses: [use] })),
      eitherOr: [['load 3', 'load 4']],
    });
    const search = searchFrontier(problem, { reportEvery: 500 });
    search.next();
    const step = search.next({ stop: true });
    if (!step.done) throw new Error('It went on.');
    expect(step.value).toMatchObject({ status: 'unproven', stopped: true, points: [] });
    expect(step.value.notes[0]).toMatch(/not proven/);
    expect(step.value.notes[1]).toMatch(/weight is \d+, (over its limit|under its least) of 7/);
    expect(runToEnd(problem)).toMatchObject({
      status: 'infeasible',
      notes: ['No portfolio keeps all limits and links together.'],
    });
  });
});
