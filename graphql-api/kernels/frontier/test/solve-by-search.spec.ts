import { benefitToComeIn, priceToComeIn } from '../src/explain/entry-threshold.js';
import { lossWithout } from '../src/explain/loss-without.js';
import { solveBySearch } from '../src/explain/solve-by-search.js';
import { solveByTrying } from './all-portfolios.js';
import { TWO_NEEDS_AND_A_HOIST_FRONT, twoNeedsAndAHoist } from './examples.js';

describe('a search that explanations ask', () => {
  const problem = twoNeedsAndAHoist();

  it('gives the frontier of a problem', () => {
    const { points } = solveBySearch()(problem);
    expect(points.map(({ cost, benefit }) => [cost, benefit])).toEqual(TWO_NEEDS_AND_A_HOIST_FRONT);
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
    for (const chosen of points) {
      for (const { id } of problem.items) {
        if (chosen.picks[id] > 0) {
          const loss = lossWithout(problem, chosen, id, solveByTrying).loss;
          expect(lossWithout(problem, chosen, id, solve)).toMatchObject({ loss });
          continue;
        }
        const price = priceToComeIn(problem, chosen, id, solveByTrying).figure;
        const score = benefitToComeIn(problem, chosen, id, solveByTrying).figure;
        expect(priceToComeIn(problem, chosen, id, solve)).toMatchObject({ figure: price });
        expect(benefitToComeIn(problem, chosen, id, solve)).toMatchObject({ figure: score });
      }
    }
  });
});
