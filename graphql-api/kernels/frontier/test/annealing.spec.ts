import { SearchArchive } from '../src/archive/search-archive.js';
import { Annealing } from '../src/local-search/annealing.js';
import { Random } from '../src/local-search/random.js';
import { compileModel } from '../src/model/compile-model.js';
import { Links } from '../src/model/links.js';
import { picksOf, WorkingPortfolio } from '../src/model/working-portfolio.js';
import { violationsOf } from '../src/problem/feasible.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import demoProblems from './demo-problems.json' with { type: 'json' };

const problem = parseProblem(demoProblems.firstOrganisation);
const model = compileModel(problem)!;

function walkFromNothing(
  price: number,
  seed: number,
): { archive: SearchArchive; portfolio: WorkingPortfolio } {
  const archive = new SearchArchive(model, 0);
  const portfolio = new WorkingPortfolio(model);
  new Annealing(portfolio, new Links(model), archive, new Random(seed)).walk(price);
  return { archive, portfolio };
}

describe('annealing', () => {
  it('offers only portfolios that keep every rule, and goes where the price sends it', () => {
    const cheap = walkFromNothing(1e-3, 1);
    const dear = walkFromNothing(1, 1);
    for (const { archive } of [cheap, dear]) {
      const { front } = archive;
      expect(front.size).toBeGreaterThan(0);
      for (let place = 0; place < front.size; place++) {
        expect(violationsOf(problem, picksOf(model, front.choicesAt(place)))).toEqual([]);
      }
    }
    expect(cheap.portfolio.cost).toBeGreaterThan(2 * dear.portfolio.cost);
  });

  it('walks the same way with the same random numbers only', () => {
    const chosen = (seed: number): number[] => [...walkFromNothing(1e-2, seed).portfolio.chosen];
    expect(chosen(3)).toEqual(chosen(3));
    expect(chosen(3)).not.toEqual(chosen(4));
  });
});
