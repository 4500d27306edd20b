import { totalsOf, violationsOf, type Picks, type Violation } from '../problem/feasible.js';
import { isProven, type Point, type Solved } from './solve.js';
import type { Scenario } from './scenarios.js';

export interface SolvedScenario extends Scenario {
  readonly result: Solved;
}

/** How a portfolio fares in one scenario. */
export interface ScenarioRegret {
  readonly name: string;
  /** What the portfolio comes to there. */
  readonly benefit: number;
  readonly cost: number;
  /** Rules it breaks there; where it does, it could not be chosen, and its regret is not to be compared. */
  readonly broken: readonly Violation[];
  /** The best portfolio there of at most that cost. */
  readonly best: Point | undefined;
  /** The best benefit less the portfolio's own; 0 where it is still the best, undefined where there is none at all. */
  readonly regret: number | undefined;
  /** Where false, the search proved less, and the true regret may be higher. */
  readonly exact: boolean;
}

export interface Robustness {
  readonly scenarios: readonly ScenarioRegret[];
  /** The highest regret among the scenarios in which the portfolio is feasible. */
  readonly mostRegret: number;
  /** Items in the best portfolio of every scenario, of some, and of none, in the order of the problem's items. */
  readonly always: readonly string[];
  readonly depends: readonly string[];
  readonly never: readonly string[];
}

/**
 * How a chosen portfolio stands up to other weights and prices. In each scenario it is compared with the best portfolio
 * of at most its own cost there: the difference is its regret (Savage 1951, "The theory of statistical decision"; from memory). Items in all of those best portfolios
 * do not depend on what is uncertain; scenarios without any portfolio of that cost are left aside.
 */
export function robustnessOf(picks: Picks, scenarios: readonly SolvedScenario[]): Robustness {
  const regrets = scenarios.map((scenario) => regretIn(scenario, picks));
  const best = regrets.flatMap((regret) => (regret.best ? [regret.best.picks] : []));
  const ids = scenarios[0]?.problem.items.map(({ id }) => id) ?? [];
  const times = (id: string): number => best.filter((each) => each[id] > 0).length;
  const feasible = regrets.filter(({ broken }) => broken.length === 0);
  return {
    scenarios: regrets,
    mostRegret: feasible.reduce((most, { regret = 0 }) => Math.max(most, regret), 0),
    always: ids.filter((id) => times(id) === best.length && best.length > 0),
    depends: ids.filter((id) => times(id) > 0 && times(id) < best.length),
    never: ids.filter((id) => times(id) === 0),
  };
}

function regretIn({ name, problem, result }: SolvedScenario, picks: Picks): ScenarioRegret {
  const { benefit, cost } = totalsOf(problem, picks);
  const best = result.points.findLast((point) => point.cost <= cost);
  return {
    name,
    benefit,
    cost,
    broken: violationsOf(problem, picks),
    best,
    regret: best && best.benefit - benefit,
    exact: isProven(result),
  };
}
