import type { Picks } from '../problem/feasible.js';
import type { Item, Problem } from '../problem/problem.js';
import { portfolioOf } from './portfolio-of.js';
import { isLeastRule, rulesOf, withRules, type Rule } from './rules.js';
import { isProven, type Solve } from './solve.js';

/** How a rule would have to change, and no other, for a portfolio to keep every rule. */
export interface Loosening {
  readonly rule: Rule;
  /**
   * `by` how much its bound would have to give way, to `bound`; both undefined for a link, which can only be given up.
   * `not enough` where even giving it up leaves a collision, `unknown` where the search found and proved nothing.
   */
  readonly outcome: 'enough' | 'not enough' | 'unknown';
  readonly bound?: number;
  readonly by?: number;
  /** Where false, less might do. */
  readonly exact: boolean;
  readonly picks?: Picks;
}

/** The smallest change of one rule alone after which a portfolio keeps every rule: exact if the search is. */
export function loosen(problem: Problem, rule: Rule, solve: Solve): Loosening {
  const others = rulesOf(problem).filter((other) => !isSame(other, rule));
  const loose = withRules(problem, new Set(others));
  const figure = figureOf(problem, rule);
  if (figure === undefined || rule.bound === undefined) return giveUp(loose, rule, solve);
  const isLeast = isLeastRule(rule);
  const extreme = leastSum(loose, isLeast ? (item) => -figure(item) : figure, solve);
  if (extreme.sum === undefined) {
    return { rule, outcome: extreme.exact ? 'not enough' : 'unknown', exact: extreme.exact };
  }
  const bound = isLeast ? -extreme.sum : extreme.sum;
  const { exact, picks } = extreme;
  return { rule, outcome: 'enough', bound, by: Math.abs(bound - rule.bound), exact, picks };
}

function giveUp(loose: Problem, rule: Rule, solve: Solve): Loosening {
  const picks = portfolioOf(loose, solve);
  if (picks === 'infeasible') return { rule, outcome: 'not enough', exact: true };
  return picks ? { rule, outcome: 'enough', exact: true, picks } : { rule, outcome: 'unknown', exact: false };
}

/** What one piece of an item adds to the sum that the rule bounds. */
function figureOf({ counts = [] }: Problem, { kind, place }: Rule): ((item: Item) => number) | undefined {
  switch (kind) {
    case 'ceiling':
      return (item) => item.cost;
    case 'least benefit':
      return (item) => item.benefit;
    case 'limit most':
    case 'limit least':
      return (item) => item.uses?.[place] ?? 0;
    case 'count most':
    case 'count least': {
      const members = new Set(counts[place].items);
      return (item) => (members.has(item.id) ? 1 : 0);
    }
    default:
      return undefined;
  }
}

/**
 * The least that a sum over the pieces of a feasible portfolio can come to: what it adds stands as cost, what it takes
 * away as benefit, and the least difference of the two lies on the frontier. Ceiling and least benefit become limits.
 */
function leastSum(
  problem: Problem,
  figure: (item: Item) => number,
  solve: Solve,
): { sum: number | undefined; exact: boolean; picks?: Picks } {
  const { items, limits = [], ceiling, leastBenefit } = problem;
  const moneyAndMerit = [
    { name: 'cost', most: ceiling ?? Number.MAX_SAFE_INTEGER },
    { name: 'benefit', most: Number.MAX_SAFE_INTEGER, least: leastBenefit },
  ];
  const solved = solve({
    ...problem,
    ceiling: undefined,
    leastBenefit: undefined,
    limits: [...limits, ...moneyAndMerit],
    items: items.map(({ secondCost: _, ...item }) => ({
      ...item,
      cost: Math.max(0, figure(item)),
      benefit: Math.max(0, -figure(item)),
      uses: [...(item.uses ?? limits.map(() => 0)), item.cost, item.benefit],
    })),
  });
  let least: { sum: number; picks: Picks } | undefined;
  for (const { cost, benefit, picks } of solved.points) {
    if (least === undefined || cost - benefit < least.sum) least = { sum: cost - benefit, picks };
  }
  return { sum: least?.sum, exact: isProven(solved), picks: least?.picks };
}

function isSame(one: Rule, other: Rule): boolean {
  return one.kind === other.kind && one.place === other.place && one.needPlace === other.needPlace;
}
