import { benefitToComeIn, priceToComeIn } from '../src/explain/entry-threshold.js';
import { explainInfeasible } from '../src/explain/explain-infeasible.js';
import { lossWithout } from '../src/explain/loss-without.js';
import { solveBySearch } from '../src/explain/solve-by-search.js';
import { solveByTrying } from './all-portfolios.js';
import { aProblem, TWO_NEEDS_AND_A_HOIST_FRONT, twoNeedsAndAHoist } from './examples.js';

describe('a search that explanations ask', () => {
  const problem = twoNeedsAndAHoist();

  it('gives the frontier of a problem', () => {
    const { status, points } = solveBySearch()(problem);
    expect(status).toBe('complete');
    expect(points.map(({ cost, benefit }) => [cost, benefit])).toEqual(TWO_NEEDS_AND_A_HOIST_FRONT);
  });

  it('proves that rules collide where nothing shows it plainly', () => {
    const wards = aProblem(['bed', 'lamp', 'desk', 'shelf'], {
      ceiling: 15,
      counts: [
        { name: 'ward 1', items: ['bed', 'lamp'], least: 1 },
        { name: 'ward 2', items: ['desk', 'shelf'], least: 1 },
      ],
    });
    const sentences = explainInfeasible(wards, String, solveBySearch({ evaluations: 5_000 }));
    expect(sentences).toEqual(explainInfeasible(wards, String, solveByTrying));
    expect(sentences.length).toBe(4);
  });

  it('is ended when the host says so', () => {
    const seen: number[] = [];
    const solve = solveBySearch({ reportEvery: 100 }, ({ evaluations }) => seen.push(evaluations) < 2);
    solve(problem);
    expect(seen.length).toBeLessThanOrEqual(2);
  });

  it('answers as trying every portfolio does', () => {
    const { points } = solveByTrying(problem);
    const solve = solveBySearch({ evaluations: 5_000 });
    for (const chosen of points.filter((_, place) => place % 2 === 0)) {
      for (const { id } of problem.items) {
        if (chosen.picks[id] > 0) {
          const loss = lossWithout(problem, chosen, id, solveByTrying).loss;
          expect(lossWithout(problem, chosen, id, solve)).toMatchObject({ loss, exact: true });
          continue;
        }
        const price = priceToComeIn(problem, chosen, id, solveByTrying).figure;
        const score = benefitToComeIn(problem, chosen, id, solveByTrying).figure;
        expect(priceToComeIn(problem, chosen, id, solve)).toMatchObject({ figure: price, exact: true });
        expect(benefitToComeIn(problem, chosen, id, solve)).toMatchObject({ figure: score, exact: true });
      }
    }
  });
});
