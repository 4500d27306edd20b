import { hypervolume } from '../src/archive/hypervolume.js';
import { LocalSearch } from '../src/local-search/local-search.js';
import { compileModel } from '../src/model/compile-model.js';
import { picksOf } from '../src/model/working-portfolio.js';
import { totalsOf, violationsOf } from '../src/problem/feasible.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import exactFront from './demo-exact-front.json' with { type: 'json' };
import demoProblems from './demo-problems.json' with { type: 'json' };

const problem = parseProblem(demoProblems.firstOrganisation);
const corner = { benefit: 0, cost: problem.ceiling! };

function aSearch(seed = 1): LocalSearch {
  return new LocalSearch(compileModel(problem)!, seed, 100);
}

function expectTrueMembers({ archive: { front } }: LocalSearch): void {
  const model = compileModel(problem)!;
  for (let place = 0; place < front.size; place++) {
    const picks = picksOf(model, front.choicesAt(place));
    expect(violationsOf(problem, picks)).toEqual([]);
    expect(totalsOf(problem, picks)).toMatchObject({
      benefit: front.benefitAt(place),
      cost: front.costAt(place),
    });
  }
}

describe('a local search', () => {
  it('has a useful front after hardly more evaluations than there are options', () => {
    const search = aSearch();
    while (search.archive.evaluations < 300) search.step(100);
    expect(search.archive.evaluations).toBeLessThan(5_000);
    const area = hypervolume(search.archive.front.points(), corner);
    expect(area).toBeGreaterThan(0.9 * hypervolume(exactFront as [number, number][], corner));
    expectTrueMembers(search);
  });

  it('settles a start that it is given, also in the middle of a scan', () => {
    const model = compileModel(problem)!;
    const everyLast = Int32Array.from({ length: model.classCount }, (_, k) => model.optionStart[k + 1] - 1);
    const search = aSearch();
    for (let steps = 0; steps < 400; steps++) {
      search.step(1_000);
      if (steps % 7 > 0) continue;
      const before = search.archive.evaluations;
      search.offerStart(everyLast, steps % 2 === 0 ? 0 : 0.02);
      expect(search.archive.evaluations).toBeGreaterThan(before);
    }
    expect(search.archive.evaluations).toBeGreaterThan(100_000);
    expectTrueMembers(search);
  });
});
