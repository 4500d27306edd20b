import { robustnessOf, type SolvedScenario } from '../src/explain/robustness.js';
import { costScenarios, withBenefits, withCosts, type Scenario } from '../src/explain/scenarios.js';
import { parseProblem } from '../src/problem/parse-problem.js';
import type { Problem } from '../src/problem/problem.js';
import { allPortfolios, solveByTrying } from './all-portfolios.js';
import { aProblem } from './examples.js';
import { aRandomProblem } from './seeded.js';

const solved = (scenario: Scenario): SolvedScenario => ({
  ...scenario,
  result: solveByTrying(scenario.problem),
});

const items = [
  { id: 'bed', benefit: 10, cost: 10 },
  { id: 'lamp', benefit: 4, cost: 5 },
  { id: 'desk', benefit: 3, cost: 5 },
  { id: 'plaque', benefit: 1, cost: 15 },
];
const problem: Problem = aProblem([], { items, ceiling: 16 });

describe('a portfolio under other weights and prices', () => {
  it('regrets what the best of the same cost would have brought more', () => {
    const scenarios = [
      { name: 'as it is', problem },
      withBenefits('desks first', problem, { desk: 9 }),
      withCosts('a dear bed', problem, 0.2, ['bed']),
    ];
    const { scenarios: regrets, ...rest } = robustnessOf({ bed: 1, lamp: 1 }, scenarios.map(solved));
    expect(rest).toEqual({
      mostRegret: 5,
      always: ['bed'],
      depends: ['lamp', 'desk'],
      never: ['plaque'],
    });
    expect(
      regrets.map(({ name, benefit, cost, regret, exact }) => [name, benefit, cost, regret, exact]),
    ).toEqual([
      ['as it is', 14, 15, 0, true],
      ['desks first', 14, 15, 5, true],
      ['a dear bed', 14, 17, -4, true],
    ]);
    // with the dear bed the portfolio passes the ceiling: it could not be chosen, and the best that can has less
    expect(regrets.map(({ broken }) => broken.map(({ kind }) => kind))).toEqual([[], [], ['ceiling']]);
  });

  it('has the four usual changes of all costs, in whole units', () => {
    const named = costScenarios(problem).map((each) => [
      each.name,
      ...each.problem.items.map(({ cost }) => cost),
    ]);
    expect(named).toEqual([
      ['cost \u221220 %', 8, 4, 4, 12],
      ['cost \u221210 %', 9, 5, 5, 14],
      ['cost +10 %', 11, 6, 6, 17],
      ['cost +20 %', 12, 6, 6, 18],
    ]);
  });

  it('is left aside by scenarios without a portfolio, and says what is not proven', () => {
    const impossible = { ...problem, mustInclude: ['plaque'], ceiling: 10 };
    const unproven: SolvedScenario = {
      name: 'as it is',
      problem,
      result: { status: 'unproven', points: [] },
    };
    const none = robustnessOf({ bed: 1 }, [solved({ name: 'no', problem: impossible }), unproven]);
    expect(none.scenarios.map(({ regret, exact }) => [regret, exact])).toEqual([
      [undefined, true],
      [undefined, false],
    ]);
    expect(none).toMatchObject({ mostRegret: 0, always: [], depends: [] });
  });

  it('regrets what trying every portfolio of its cost finds, on random problems', () => {
    let compared = 0;
    for (let seed = 1; seed <= 60; seed++) {
      const drawn = parseProblem(aRandomProblem(seed, 5));
      const chosen = solveByTrying(drawn).points.at(-1)?.picks;
      if (chosen === undefined) continue;
      for (const scenario of costScenarios(drawn)) {
        const { best, regret, benefit, cost } = robustnessOf(chosen, [solved(scenario)]).scenarios[0];
        const benefits = allPortfolios(scenario.problem)
          .filter((portfolio) => portfolio.cost <= cost)
          .map((portfolio) => portfolio.benefit);
        const most = benefits.length > 0 ? Math.max(...benefits) : undefined;
        expect({ seed, best: best?.benefit }).toEqual({ seed, best: most });
        expect(regret).toBe(most === undefined ? undefined : most - benefit);
        compared++;
      }
    }
    expect(compared).toBeGreaterThan(60);
  });
});
