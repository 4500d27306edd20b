import { alternativesAt } from '../src/proof/alternatives.js';
import { allPortfolios, solveByTrying } from './all-portfolios.js';
import { aProblem } from './examples.js';
import { aRandomProblem } from './seeded.js';

describe('the other portfolios at a point', () => {
  it('counts the equals of a portfolio', () => {
    const problem = aProblem(['bed', 'lamp', 'scope'], { ceiling: 20 });
    const found = alternativesAt(problem, { bed: 1, lamp: 1 });
    expect(found).toMatchObject({ count: 3, nextBest: undefined, isExact: true });
  });

  it('names the best portfolio of the same cost that has less benefit', () => {
    const items = [
      { id: 'bed', benefit: 10, cost: 10 },
      { id: 'lamp', benefit: 8, cost: 10 },
      { id: 'scope', benefit: 9, cost: 10 },
    ];
    const problem = aProblem([], { items, ceiling: 10 });
    expect(alternativesAt(problem, { bed: 1 }).nextBest).toEqual({
      benefit: 9,
      cost: 10,
      picks: { scope: 1 },
    });
    expect(alternativesAt(problem, { bed: 1 }, { above: 9 }).nextBest).toBeUndefined();
  });

  it('says so when it had to end before all was looked through', () => {
    const problem = aProblem(['bed', 'lamp', 'scope'], { ceiling: 20 });
    expect(alternativesAt(problem, { bed: 1, lamp: 1 }, { effort: 0 }).isExact).toBe(false);
  });

  it('finds what trying every portfolio finds, at every point', () => {
    let points = 0;
    for (let seed = 1; seed <= 60; seed++) {
      const problem = aRandomProblem(seed, 4 + (seed % 7));
      const all = allPortfolios(problem);
      const front = solveByTrying(problem).points;
      for (const [place, { benefit, cost, picks }] of front.entries()) {
        const above = front[place - 1]?.benefit ?? 0;
        const found = alternativesAt(problem, picks, { above });
        const ofCost = all.filter((other) => other.cost === cost).map((other) => other.benefit);
        const next = Math.max(...ofCost.filter((other) => other < benefit && other > above));
        expect(found.count).toBe(ofCost.filter((other) => other === benefit).length);
        expect(found.nextBest?.benefit ?? -Infinity).toBe(next);
        expect(found.isExact).toBe(true);
        points++;
      }
    }
    expect(points).toBeGreaterThan(250);
  });
});
