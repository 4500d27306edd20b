import { Random } from '../src/local-search/random.js';
import { compileModel } from '../src/model/compile-model.js';
import { WorkingPortfolio } from '../src/model/working-portfolio.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { aRandomProblem } from './seeded.js';

describe('a portfolio in the making', () => {
  it('foretells what an option would do to rows and excess, and is the same as one loaded anew', () => {
    const random = new Random(9);
    let broken = 0;
    let kept = 0;
    for (let seed = 1; seed <= 30; seed++) {
      const model = compileModel(parseProblem(aRandomProblem(seed, 14)));
      if (model === undefined) continue;
      const portfolio = new WorkingPortfolio(model);
      for (let change = 0; change < 60; change++) {
        const option = random.below(model.optionClass.length);
        const keepsRows = portfolio.keepsRowsWith(option);
        const excess = portfolio.excessWith(option);
        portfolio.choose(option);
        expect([portfolio.keepsRows(), portfolio.excess()]).toEqual([keepsRows, excess]);
        if (keepsRows) kept++;
        else broken++;

        const anew = new WorkingPortfolio(model);
        anew.load(portfolio.chosen);
        expect([anew.benefit, anew.cost]).toEqual([portfolio.benefit, portfolio.cost]);
        expect([anew.isFeasible(), anew.excess()]).toEqual([portfolio.isFeasible(), portfolio.excess()]);
      }
    }
    expect(kept).toBeGreaterThan(100);
    expect(broken).toBeGreaterThan(100);
  });
});
