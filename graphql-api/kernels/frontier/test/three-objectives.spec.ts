import { totalsOf, violationsOf } from '../src/problem/feasible.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import type { Problem } from '../src/problem/problem.js';
import { Random } from '../src/local-search/random.js';
import type { SearchProgress, SearchSettings } from '../src/search.js';
import { risingPart } from '../src/three-objectives/bound-line.js';
import { dominatedVolume } from '../src/three-objectives/dominated-volume.js';
import {
  searchThreeObjectives,
  type ThreeObjectivesResult,
} from '../src/three-objectives/search-three-objectives.js';
import type { SliceOutcome, SliceSearch, SliceWindow } from '../src/three-objectives/slice-search.js';
import { aRandomProblem } from './seeded.js';
import { everyPortfolio, figuresOf, isAsGood, searchByTrying, unbeaten } from './try-every-portfolio.js';

const seeds = (count: number): number[] => Array.from({ length: count }, (_, index) => index + 1);

describe('a search over benefit, cost and second cost', () => {
  it('finds what can be worked out by hand, the cheaper of equal running costs too', () => {
    const problem = parseProblem({
      format: 'metewand-problem/1',
      ceiling: 20,
      items: [
        { id: 'bought', benefit: 8, cost: 10, secondCost: 1, oneOf: 'scanner' },
        { id: 'leased', benefit: 8, cost: 2, secondCost: 5, oneOf: 'scanner' },
        { id: 'lent', benefit: 8, cost: 2, secondCost: 6, oneOf: 'scanner' },
        { id: 'lamp', benefit: 3, cost: 10 },
      ],
    });
    const result = runToEnd(problem);
    expect(result.status).toBe('complete');
    expect(result.points).toEqual(
      [
        { benefit: 0, cost: 0, secondCost: 0, picks: {} },
        { benefit: 8, cost: 2, secondCost: 5, picks: { leased: 1 } },
        { benefit: 8, cost: 10, secondCost: 1, picks: { bought: 1 } },
        { benefit: 3, cost: 10, secondCost: 0, picks: { lamp: 1 } },
        { benefit: 11, cost: 12, secondCost: 5, picks: { leased: 1, lamp: 1 } },
        { benefit: 11, cost: 20, secondCost: 1, picks: { bought: 1, lamp: 1 } },
      ].sort((one, other) => one.cost - other.cost || one.secondCost - other.secondCost),
    );
  });

  it('has the exact surface of 300 problems drawn at random, every kind of limit and link at once', () => {
    let feasible = 0;
    let points = 0;
    for (const seed of seeds(300)) {
      const problem = aRandomProblemOfThree(seed, 4 + (seed % 9));
      const all = everyPortfolio(problem);
      const result = runToEnd(problem, { seed, evaluations: 400 });
      const exact = unbeaten(all.map(figuresOf));
      expect({ seed, points: result.points.map(figuresOf) }).toEqual({ seed, points: exact });
      expect(result.status).toBe(exact.length > 0 ? 'complete' : 'infeasible');
      expect(result.surfaceBound).toEqual(exact);
      expect(result.bound).toEqual(risingPart(exact.map(([cost, benefit]) => [cost, benefit])));
      for (const { picks, benefit, cost, secondCost } of result.points) {
        expect(violationsOf(problem, picks)).toEqual([]);
        expect(totalsOf(problem, picks)).toMatchObject({ benefit, cost });
        expect(secondCostOf(problem, picks)).toBe(secondCost);
      }
      if (exact.length > 0) feasible++;
      points += exact.length;
    }
    expect(feasible).toBeGreaterThan(120);
    expect(points).toBeGreaterThan(3_000);
  });

  it('bounds every portfolio and says truly where nothing is missing when slices stay open', () => {
    let bounded = 0;
    let missing = 0;
    for (const seed of seeds(120)) {
      const problem = aRandomProblemOfThree(seed, 8 + (seed % 4));
      const all = everyPortfolio(problem);
      const search = searchByTrying(problem, all, { alter: givingUpNowAndThen(new Random(seed)) });
      const result = runToEnd(problem, { seed, evaluations: 400 }, search);
      const exact = unbeaten(all.map(figuresOf));
      if (result.status === 'bounded') bounded++;
      if (result.status === 'unproven' || result.status === 'infeasible') continue;
      for (const point of exact) {
        expect(result.surfaceBound.some((corner) => isAsGood(corner, point))).toBe(true);
        expect(result.bound.some(([cost, benefit]) => cost <= point[0] && benefit >= point[1])).toBe(true);
        const stretch = result.provenSecondCosts.find(([from, to]) => from <= point[2] && point[2] <= to);
        const isFound = result.points.some((found) => isAsGood(figuresOf(found), point));
        if (stretch) expect(isFound).toBe(true);
        else if (!isFound) missing++;
      }
      const reference = { benefit: 0, cost: 1_000, secondCost: 1_000 };
      expect(dominatedVolume(result.surfaceBound, reference)).toBeGreaterThanOrEqual(
        dominatedVolume(exact, reference),
      );
    }
    expect(bounded).toBeGreaterThan(20);
    expect(missing).toBeGreaterThan(10);
  });

  it('finds the whole surface of small problems without any proof, and says that nothing is proven', () => {
    for (const seed of seeds(30)) {
      const problem = aRandomProblemOfThree(seed, 4 + (seed % 5));
      const exact = unbeaten(everyPortfolio(problem).map(figuresOf));
      const result = runToEnd(problem, { seed, evaluations: 10_000, effort: 0 });
      expect({ seed, points: result.points.map(figuresOf) }).toEqual({ seed, points: exact });
      if (result.status !== 'infeasible') {
        expect(result).toMatchObject({
          status: 'unproven',
          bound: [],
          surfaceBound: [],
          provenSecondCosts: [],
        });
      }
      if (exact.length === 0) expect(result.notes.length).toBeGreaterThan(0);
    }
  });

  it('gives the same result for the same seed, whatever is reported, and another way there for another', () => {
    const problem = aRandomProblemOfThree(4, 40);
    const settings = { evaluations: 40_000, effort: 0 };
    const result = runToEnd(problem, { ...settings, seed: 5 });
    expect(result.points.length).toBeGreaterThan(100);
    expect(runToEnd(problem, { ...settings, seed: 5 })).toEqual(result);
    const seldom = { ...settings, seed: 5, reportEvery: 15_000 };
    expect(runToEnd(problem, seldom).points).toEqual(result.points);
    expect(runToEnd(problem, { ...settings, seed: 6 }).counts).not.toEqual(result.counts);
  });

  it('can be stopped at any report, keeps what is proven by then, and gives plain data', () => {
    const problem = aRandomProblemOfThree(7, 11);
    const all = everyPortfolio(problem);
    const exact = unbeaten(all.map(figuresOf));
    for (const reports of [1, 2, 5, 10, 40]) {
      let seen = 0;
      const settings = { evaluations: 4_000, reportEvery: 500 };
      const result = runToEnd(
        problem,
        settings,
        searchByTrying(problem, all, { reports: 2 }),
        () => ++seen === reports,
      );
      expect(result).toMatchObject({ stopped: true });
      expect(result.points.length).toBeGreaterThan(0);
      for (const { picks } of result.points) expect(violationsOf(problem, picks)).toEqual([]);
      if (reports === 1) expect(result.status).toBe('unproven');
      if (reports === 40) expect(result.status).toBe('bounded');
      for (const point of result.status === 'bounded' ? exact : []) {
        expect(result.surfaceBound.some((corner) => isAsGood(corner, point))).toBe(true);
      }
      expect(JSON.parse(JSON.stringify(structuredClone(result)))).toEqual(result);
    }
  });

  it('keeps within the effort it is allowed, and has the same points whatever the effort', () => {
    const problem = aRandomProblemOfThree(7, 11);
    const whole = runToEnd(problem, { evaluations: 60_000 });
    expect(whole.status).toBe('complete');
    let pieces = 0;
    const counting = searchByTrying(problem, everyPortfolio(problem), {
      alter: (exact) => {
        pieces++;
        return exact;
      },
    });
    const some = runToEnd(problem, { evaluations: 60_000, effort: 10 }, counting);
    expect(some.status).toBe('bounded');
    expect(pieces).toBe(10);
    expect(some.points.map(figuresOf)).toEqual(whole.points.map(figuresOf));
  });
});

/** Leaves some windows open, with a line above what may be left, and not all that is there found. */
function givingUpNowAndThen(random: Random): (exact: SliceOutcome, window: SliceWindow) => SliceOutcome {
  return (exact, { from, to }) => {
    if (random.fraction() < 0.8) return exact;
    const found = exact.found.filter((_, index) => index % 2 === 0);
    const left = exact.found.filter((_, index) => index % 2 === 1);
    const height = left.reduce((most, { benefit }) => Math.max(most, benefit), 0);
    return { found, open: [{ from, to, tangent: { height, slope: 0 } }], effort: 1 };
  };
}

function aRandomProblemOfThree(seed: number, itemCount: number): Problem {
  const random = new Random(seed + 77_000);
  const most = 1 + random.below(40);
  const problem = aRandomProblem(seed, itemCount);
  const items = problem.items.map((item) => {
    return random.fraction() < 0.15 ? item : { ...item, secondCost: random.below(most) };
  });
  return parseProblem({ ...problem, items });
}

function runToEnd(
  problem: Problem,
  settings?: SearchSettings,
  sliceSearch?: SliceSearch,
  onProgress: (progress: SearchProgress) => boolean = () => false,
): ThreeObjectivesResult {
  const search = searchThreeObjectives(problem, settings, sliceSearch && (() => sliceSearch));
  let step = search.next();
  while (!step.done) step = search.next({ stop: onProgress(step.value) });
  return step.value;
}

function secondCostOf(problem: Problem, picks: Readonly<Record<string, number>>): number {
  return problem.items.reduce((sum, { id, secondCost = 0 }) => sum + secondCost * (picks[id] ?? 0), 0);
}
