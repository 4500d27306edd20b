import { benefitToComeIn, priceToComeIn } from '../src/explain/entry-threshold.js';
import { lossWithout } from '../src/explain/loss-without.js';
import type { Point, Solve } from '../src/explain/solve.js';
import { withItem } from '../src/explain/with-rules.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import type { Problem } from '../src/problem/problem.js';
import { allPortfolios, solveByTrying } from './all-portfolios.js';
import { aProblem, twoNeedsAndAHoist } from './examples.js';
import { aRandomProblem } from './seeded.js';

/** What a search gives that finds everything and proves nothing. */
const unproven: Solve = (problem) => ({ ...solveByTrying(problem), status: 'unproven' });

const pointAt = (problem: Problem, cost: number): Point => {
  const point = solveByTrying(problem).points.find((each) => each.cost === cost);
  if (point === undefined) throw new RangeError(`no point at ${cost}`);
  return point;
};

describe('the figures at which an item would come in', () => {
  // bed and desk are chosen, 18 at 19; lamp brings 3
  const problem = aProblem([], {
    items: [
      { id: 'bed', benefit: 10, cost: 10 },
      { id: 'desk', benefit: 8, cost: 9 },
      { id: 'lamp', benefit: 3, cost: 10 },
    ],
  });
  const chosen = pointAt(problem, 19);

  it('are those at which a portfolio with it is as good', () => {
    // with the lamp bed and desk stay, so it may cost nothing more; or it would have to bring what the desk does
    expect(priceToComeIn(problem, chosen, 'lamp', solveByTrying)).toEqual({
      figure: 0,
      exact: true,
      picks: { bed: 1, desk: 1, lamp: 1 },
    });
    expect(priceToComeIn(withItem(problem, 'lamp', { benefit: 8 }), chosen, 'lamp', solveByTrying)).toEqual({
      figure: 9,
      exact: true,
      picks: { bed: 1, lamp: 1 },
    });
    expect(benefitToComeIn(withItem(problem, 'lamp', { cost: 9 }), chosen, 'lamp', solveByTrying)).toEqual({
      figure: 8,
      exact: true,
      picks: { bed: 1, lamp: 1 },
    });
  });

  it('are said to be no more than bounds where the search proves nothing', () => {
    expect(priceToComeIn(problem, chosen, 'lamp', unproven)).toMatchObject({ figure: 0, exact: false });
    expect(benefitToComeIn(problem, chosen, 'lamp', unproven)).toMatchObject({ figure: 10, exact: false });
    expect(lossWithout(problem, chosen, 'bed', unproven)).toMatchObject({ loss: 7, exact: false });
  });

  it('do not exist where links keep the item out', () => {
    const barred = { ...problem, eitherOr: [['lamp', 'bed']], mustInclude: ['bed'] };
    const none = { figure: undefined, exact: true, picks: undefined };
    expect(priceToComeIn(barred, chosen, 'lamp', solveByTrying)).toEqual(none);
    expect(benefitToComeIn(barred, chosen, 'lamp', solveByTrying)).toEqual(none);
    expect(() => priceToComeIn({ ...problem, leaveOut: ['lamp'] }, chosen, 'lamp', solveByTrying)).toThrow(
      RangeError,
    );
  });

  it('take what is known as a start', () => {
    const lower = withItem(problem, 'lamp', { benefit: 8 });
    const known = [{ benefit: 18, cost: 20, picks: { bed: 1, lamp: 1 } }];
    const nothingMore: Solve = () => ({ status: 'infeasible', points: [] });
    expect(priceToComeIn(lower, chosen, 'lamp', nothingMore, known)).toMatchObject({
      figure: 9,
      exact: true,
    });
  });

  it.each([1, 2, 3, 4, 5, 6])('are exact on random problems of every kind (part %i)', (part) => {
    let compared = 0;
    for (let seed = part; seed <= 120; seed += 6) {
      const drawn = parseProblem(aRandomProblem(seed, 4 + (seed % 3)));
      const { points } = solveByTrying(drawn);
      if (points.length === 0) continue;
      const point = points[seed % points.length];
      for (const item of drawn.items.filter(({ id }) => !point.picks[id] && !drawn.leaveOut?.includes(id))) {
        const known = seed % 2 === 0 ? points : [];
        const price = priceToComeIn(drawn, point, item.id, solveByTrying, known);
        const score = benefitToComeIn(drawn, point, item.id, solveByTrying, known);
        const exact = (figure: number | undefined) => ({ seed, id: item.id, figure, exact: true });
        expect({ seed, id: item.id, ...price }).toMatchObject(exact(highestPrice(drawn, point, item.id)));
        expect({ seed, id: item.id, ...score }).toMatchObject(exact(leastScore(drawn, point, item.id)));
        compared++;
      }
    }
    expect(compared).toBeGreaterThan(10);
  });
});

/** The price by trying one after the other, from the dearest that could ever do. */
function highestPrice(problem: Problem, chosen: Point, item: string): number | undefined {
  // with the ceiling off, the portfolios are the same at every price; the chosen cost is the ceiling here
  const portfolios = allPortfolios({ ...withItem(problem, item, { cost: 0 }), ceiling: undefined });
  for (let price = chosen.cost; price >= 0; price--) {
    const isAsGood = ({ benefit, cost, picks }: Point): boolean =>
      picks[item] > 0 && benefit >= chosen.benefit && cost + price * picks[item] <= chosen.cost;
    if (portfolios.some(isAsGood)) return price;
  }
  return undefined;
}

function leastScore(problem: Problem, chosen: Point, item: string): number | undefined {
  const barren = { ...withItem(problem, item, { benefit: 0 }), leastBenefit: undefined };
  const portfolios = allPortfolios(barren);
  for (let score = 0; score <= chosen.benefit; score++) {
    const isAsGood = ({ benefit, cost, picks }: Point): boolean =>
      picks[item] > 0 && cost <= chosen.cost && benefit + score * picks[item] >= chosen.benefit;
    if (portfolios.some(isAsGood)) return score;
  }
  return undefined;
}

describe('what is lost without an item', () => {
  it('is what the best portfolio of the same cost falls short by', () => {
    const problem = twoNeedsAndAHoist();
    const chosen = pointAt(problem, 91);
    expect(lossWithout(problem, chosen, 'scanner-a', solveByTrying)).toEqual({
      item: 'scanner-a',
      benefit: 108,
      loss: 12,
      picks: { 'scanner-b': 1, hoist: 3 },
      exact: true,
    });
    expect(lossWithout(problem, chosen, 'hoist', solveByTrying)).toMatchObject({ benefit: 75, loss: 45 });
  });

  it('frees a mandatory item, which may be a gain', () => {
    const problem = aProblem([], {
      ceiling: 10,
      items: [
        { id: 'bed', benefit: 1, cost: 10 },
        { id: 'lamp', benefit: 4, cost: 10 },
      ],
      mustInclude: ['bed'],
    });
    const without = { item: 'bed', benefit: 4, loss: -3, picks: { lamp: 1 }, exact: true };
    expect(lossWithout(problem, pointAt(problem, 10), 'bed', solveByTrying)).toEqual(without);
  });

  it('has no figure where nothing is feasible without it', () => {
    const problem = aProblem(['bed', 'lamp'], { counts: [{ items: ['bed', 'lamp'], least: 2 }] });
    const nothing = { item: 'bed', benefit: undefined, loss: undefined, picks: undefined, exact: true };
    expect(lossWithout(problem, pointAt(problem, 20), 'bed', solveByTrying)).toEqual(nothing);
  });

  it('is no more than what is known, and exact where nothing is better', () => {
    for (let seed = 1; seed <= 60; seed++) {
      const problem = aRandomProblem(seed, 5);
      const { points } = solveByTrying(problem);
      const chosen = points.at(-1);
      for (const id of Object.keys(chosen?.picks ?? {})) {
        const without = allPortfolios({
          ...problem,
          mustInclude: problem.mustInclude?.filter((each) => each !== id),
        })
          .filter(({ picks, cost }) => !picks[id] && cost <= chosen!.cost)
          .map(({ benefit }) => benefit);
        const benefit = without.length > 0 ? Math.max(...without) : undefined;
        expect({ seed, ...lossWithout(problem, chosen!, id, solveByTrying, points) }).toMatchObject({
          seed,
          item: id,
          benefit,
          exact: true,
        });
      }
    }
  });
});
