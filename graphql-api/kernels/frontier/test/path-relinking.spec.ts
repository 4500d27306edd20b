import { SearchArchive } from '../src/archive/search-archive.js';
import { PathRelinking } from '../src/local-search/path-relinking.js';
import { Random } from '../src/local-search/random.js';
import { compileModel } from '../src/model/compile-model.js';
import { WorkingPortfolio } from '../src/model/working-portfolio.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import { bruteForceFront } from './brute-force.js';
import { aProblem } from './examples.js';

/** The first item makes room for the others: nothing and everything are in the front, and not all in between. */
function freeItems(count: number): ReturnType<typeof parseProblem> {
  const random = new Random(4);
  const items = Array.from({ length: count }, (_, index) => {
    return {
      id: `item ${index}`,
      benefit: 20 + random.below(60),
      cost: 20 + random.below(60),
      uses: [index === 0 ? -3 : index % 3],
    };
  });
  return parseProblem(aProblem([], { items, limits: [{ name: 'beds', most: count - 2 }] }));
}

function linkNothingAndEverything(problem: ReturnType<typeof parseProblem>): SearchArchive {
  const model = compileModel(problem)!;
  const archive = new SearchArchive(model, 0);
  const portfolio = new WorkingPortfolio(model);
  archive.offer(portfolio);
  for (let option = 1; option < model.optionClass.length; option += 2) portfolio.choose(option);
  expect(portfolio.isFeasible()).toBe(true);
  archive.offer(portfolio);
  expect(new PathRelinking(portfolio, archive).linkNext()).toBe(true);
  return archive;
}

describe('path relinking', () => {
  it('finds all that lies between two members that differ in few classes', () => {
    const problem = freeItems(9);
    const { front, evaluations } = linkNothingAndEverything(problem);
    expect(front.points()).toEqual(bruteForceFront(problem));
    expect(evaluations).toBe(2 ** 9 - 1);
  });

  it('goes nearer first where they differ in many', () => {
    const { front, evaluations } = linkNothingAndEverything(freeItems(30));
    expect(evaluations).toBe(30 - 12 + 2 ** 12 - 1);
    expect(front.size).toBeGreaterThan(30);
  });

  it('has nothing to do with a single member', () => {
    const model = compileModel(freeItems(4))!;
    const portfolio = new WorkingPortfolio(model);
    const archive = new SearchArchive(model, 0);
    archive.offer(portfolio);
    expect(new PathRelinking(portfolio, archive).linkNext()).toBe(false);
  });
});
