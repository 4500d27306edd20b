import { countName } from './feasible.js';
import { propagate, type Settled } from './propagate.js';
import type { Item, Problem } from './problem.js';

/**
 * Why no portfolio can keep every limit and link, one sentence per reason with the names of what collides and by how
 * much. An empty list proves nothing: the reasons looked for are those that follow from the mandatory items, the
 * links and one limit or count at a time.
 */
export function explainInfeasible(problem: Problem): string[] {
  const settled = propagate(problem);
  if (settled.collisions.length > 0) return settled.collisions;
  return [
    ...ceilingReasons(problem, settled),
    ...limitReasons(problem, settled),
    ...countReasons(problem, settled),
    ...benefitReasons(problem, settled),
  ];
}

function* ceilingReasons(problem: Problem, settled: Settled): Generator<string> {
  if (problem.ceiling === undefined) return;
  const cost = (item: Item): number => item.cost;
  yield* overBound(problem, settled, cost, 'cost', 'the ceiling', problem.ceiling);
}

function* limitReasons(problem: Problem, settled: Settled): Generator<string> {
  for (const [index, { name, most, least }] of (problem.limits ?? []).entries()) {
    const use = (item: Item): number => item.uses?.[index] ?? 0;
    yield* overBound(problem, settled, use, name, 'its limit', most);
    const highest = reach(settled, use).highest;
    if (least !== undefined && highest < least) {
      yield `${name} comes to ${highest} at most, ${least - highest} under its least of ${least}.`;
    }
  }
}

function* benefitReasons(problem: Problem, settled: Settled): Generator<string> {
  const least = problem.leastBenefit ?? 0;
  const highest = reach(settled, (item) => item.benefit).highest;
  if (highest < least)
    yield `All that may be taken brings a benefit of ${highest} at most, under the least of ${least}.`;
}

/** First what must be taken on its own, then together with the cheapest way to fill each count. */
function* overBound(
  problem: Problem,
  settled: Settled,
  figure: (item: Item) => number,
  name: string,
  boundName: string,
  bound: number,
): Generator<string> {
  const lowest = reach(settled, figure).lowest;
  if (lowest > bound) {
    const forced = problem.items.filter(({ id }) => settled.forced.has(id)).map(({ id }) => id);
    const who =
      forced.length > 0 ? `What must be taken (${forced.join(', ')})` : 'Even the least that may be taken';
    yield `${who} brings ${name} to ${lowest} at least, ${lowest - bound} over ${boundName} of ${bound}.`;
    return;
  }
  if (problem.items.some((item) => figure(item) < 0)) return;
  for (const count of problem.counts ?? []) {
    const extra = leastToFill(settled, figure, count.items, count.least ?? 0);
    if (lowest + extra <= bound) continue;
    const over = lowest + extra - bound;
    yield `What must be taken and ${count.least} pieces of ${countName(count)} bring ${name} to ${lowest + extra} at least, ${over} over ${boundName} of ${bound}.`;
  }
}

function* countReasons(problem: Problem, settled: Settled): Generator<string> {
  for (const count of problem.counts ?? []) {
    const members = new Set(count.items);
    const { lowest, highest } = reach(settled, (item) => (members.has(item.id) ? 1 : 0));
    const { least = 0, most = Infinity } = count;
    if (highest < least) {
      yield `At least ${least} pieces of ${countName(count)} are asked for, and only ${highest} can be taken.`;
    }
    if (lowest > most) {
      yield `At most ${most} pieces of ${countName(count)} are allowed, and ${lowest} must be taken.`;
    }
  }
}

/** The lowest and highest sum of a figure that the groups alone allow; every other rule is left aside. */
function reach(
  { groups, forced }: Settled,
  figure: (item: Item) => number,
): { lowest: number; highest: number } {
  let lowest = 0;
  let highest = 0;
  for (const group of groups) {
    const leastPieces = group.some((item) => forced.has(item.id)) ? 1 : 0;
    const sums = group.flatMap((item) => [figure(item) * leastPieces, figure(item) * (item.most ?? 1)]);
    lowest += Math.min(...sums);
    highest += Math.max(...sums);
  }
  return { lowest, highest };
}

/** The least further figure at which the count reaches `least`, beyond one piece of each forced item. */
function leastToFill(
  settled: Settled,
  figure: (item: Item) => number,
  ids: readonly string[],
  least: number,
): number {
  const members = new Set(ids);
  let missing = least;
  const furtherPieces: number[] = [];
  for (const group of settled.groups) {
    const counted = group.filter((item) => members.has(item.id));
    if (counted.length === 0) continue;
    const countedAnyway = counted.some((item) => settled.forced.has(item.id)) ? 1 : 0;
    missing -= countedAnyway;
    const cheapest = Math.min(...counted.map(figure));
    const pieces = Math.max(...counted.map((item) => item.most ?? 1)) - countedAnyway;
    for (let piece = 0; piece < pieces && piece < least; piece++) furtherPieces.push(cheapest);
  }
  furtherPieces.sort((one, other) => one - other);
  return furtherPieces.slice(0, Math.max(0, missing)).reduce((sum, each) => sum + each, 0);
}
