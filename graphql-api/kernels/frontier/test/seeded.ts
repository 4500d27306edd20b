import type { Problem, Item } from '../src/problem/problem.js';
import { Random } from '../src/local-search/random.js';

/** A problem with every kind of limit and link in it, drawn from a seed; some have no feasible portfolio. */
export function aRandomProblem(seed: number, itemCount: number): Problem {
  const random = new Random(seed);
  const from = (least: number, most: number): number => least + random.below(most - least + 1);
  const chance = (share: number): boolean => random.fraction() < share;
  const anyId = (): string => `item-${random.below(itemCount)}`;
  const someIds = (count: number): string[] => [...new Set(Array.from({ length: count }, anyId))];

  const limits = Array.from({ length: from(0, 3) }, (_, index) => {
    const most = from(itemCount, 4 * itemCount);
    return { name: `limit ${index}`, most, ...(chance(0.2) ? { least: from(1, itemCount) } : {}) };
  });
  const items = Array.from({ length: itemCount }, (_, index): Item => {
    const needs = chance(0.25) ? [someIds(from(1, 3))] : undefined;
    return {
      id: `item-${index}`,
      benefit: from(0, 60),
      cost: from(0, 40),
      uses: limits.map(() => (chance(0.1) ? -from(1, 4) : from(0, 9))),
      ...(chance(0.4) ? { oneOf: `group ${random.below(Math.ceil(itemCount / 3))}` } : {}),
      ...(chance(0.2) ? { most: from(2, 3) } : {}),
      ...(needs ? { needs } : {}),
    };
  });
  if (itemCount > 3) linkBothWays(items, 0, itemCount - 1);
  const mustInclude = chance(0.4) ? [anyId()] : [];
  return {
    format: 'metewand-problem/1',
    name: `seed ${seed}`,
    ...(chance(0.7) ? { ceiling: from(8 * itemCount, 16 * itemCount) } : {}),
    limits,
    items,
    mustInclude,
    leaveOut: someIds(from(0, 1)).filter((id) => !mustInclude.includes(id)),
    eitherOr: [someIds(3), someIds(2)].filter((ids) => ids.length > 1 && chance(0.6)),
    counts: [
      {
        name: 'ward 1',
        items: someIds(Math.ceil(itemCount / 2)),
        least: from(0, 2),
        most: from(2, itemCount),
      },
      { name: 'ward 2', items: someIds(Math.ceil(itemCount / 3)), least: from(0, 1) },
    ],
    ...(chance(0.2) ? { leastBenefit: from(1, 60) } : {}),
  };
}

function linkBothWays(items: Item[], one: number, other: number): void {
  items[one] = { ...items[one], needs: [[items[other].id]] };
  items[other] = { ...items[other], needs: [[items[one].id]] };
}
