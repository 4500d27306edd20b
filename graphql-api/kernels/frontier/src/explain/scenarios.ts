import type { Problem } from '../problem/problem.js';

/** A problem as it might have been, under a name. */
export interface Scenario {
  readonly name: string;
  readonly problem: Problem;
}

/** The problem with other benefits: by item id, whole and 0 at least; an item that is not named keeps its own. */
export function withBenefits(
  name: string,
  problem: Problem,
  benefits: Readonly<Record<string, number>>,
): Scenario {
  const items = problem.items.map((item) => ({ ...item, benefit: benefits[item.id] ?? item.benefit }));
  return { name, problem: { ...problem, items } };
}

/**
 * The problem with every cost, or those of the named items, higher by a share: 0.1 for ten in a hundred, -0.2 for twenty
 * less. Rounded to whole units, halves up. Limits stay as they are.
 */
export function withCosts(name: string, problem: Problem, share: number, ids?: readonly string[]): Scenario {
  const changed = new Set(ids ?? problem.items.map(({ id }) => id));
  const items = problem.items.map((item) =>
    changed.has(item.id) ? { ...item, cost: Math.round(item.cost * (1 + share)) } : item,
  );
  return { name, problem: { ...problem, items } };
}

/** All costs ten and twenty in a hundred lower and higher. */
export function costScenarios(problem: Problem): Scenario[] {
  return [-0.2, -0.1, 0.1, 0.2].map((share) =>
    withCosts(`cost ${share < 0 ? '\u2212' : '+'}${Math.abs(share) * 100} %`, problem, share),
  );
}
