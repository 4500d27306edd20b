import { countName } from '../problem/feasible.js';
import { propagate, type Settled } from '../model/propagate.js';
import type { Item, Problem } from '../problem/problem.js';
import type { WriteFigure } from './write-figure.js';

/**
 * The reasons why no portfolio can keep every rule that need no search, one sentence each with the names of what
 * collides and by how much: those that follow from the mandatory items, the links and one limit or count at a time. An
 * empty list proves nothing.
 */
export function plainReasons(problem: Problem, write: WriteFigure = String): string[] {
  const settled = propagate(problem);
  if (settled.collisions.length > 0) return settled.collisions;
  return [
    ...ceilingReasons(problem, settled, write),
    ...limitReasons(problem, settled, write),
    ...countReasons(problem, settled),
    ...benefitReasons(problem, settled, write),
  ];
}

function* ceilingReasons(problem: Problem, settled: Settled, write: WriteFigure): Generator<string> {
  if (problem.ceiling === undefined) return;
  const figure = (item: Item): number => item.cost;
  const asText = (cost: number): string => write(cost, 'cost');
  const bound = { name: 'cost', boundName: 'the ceiling', most: problem.ceiling, figure, asText };
  yield* overBound(problem, settled, bound);
}

function* limitReasons(problem: Problem, settled: Settled, write: WriteFigure): Generator<string> {
  for (const [index, { name, most, least }] of (problem.limits ?? []).entries()) {
    const figure = (item: Item): number => item.uses?.[index] ?? 0;
    const asText = (use: number): string => write(use, { limit: name });
    yield* overBound(problem, settled, { name, boundName: 'its limit', most, figure, asText });
    const highest = reach(settled, figure).highest;
    if (least !== undefined && highest < least) {
      yield `${name} comes to ${asText(highest)} at most, ${asText(least - highest)} under its least of ${asText(least)}.`;
    }
  }
}

function* benefitReasons(problem: Problem, settled: Settled, write: WriteFigure): Generator<string> {
  const least = problem.leastBenefit ?? 0;
  const highest = reach(settled, (item) => item.benefit).highest;
  if (highest >= least) return;
  const [most, asked] = [write(highest, 'benefit'), write(least, 'benefit')];
  yield `All that may be taken brings a benefit of ${most} at most, under the least of ${asked}.`;
}

/** A bound from above on the sum of a figure, and how to speak of it. */
interface UpperBound {
  readonly name: string;
  readonly boundName: string;
  readonly most: number;
  readonly figure: (item: Item) => number;
  readonly asText: (figure: number) => string;
}

/** First what must be taken on its own, then together with the cheapest way to fill each count. */
function* overBound(
  problem: Problem,
  settled: Settled,
  { name, boundName, most, figure, asText }: UpperBound,
): Generator<string> {
  const lowest = reach(settled, figure).lowest;
  if (lowest > most) {
    const forced = problem.items.filter(({ id }) => settled.forced.has(id)).map(({ id }) => id);
    const who =
      forced.length > 0 ? `What must be taken (${forced.join(', ')})` : 'Even the least that may be taken';
    yield `${who} brings ${name} to ${asText(lowest)} at least, ${asText(lowest - most)} over ${boundName} of ${asText(most)}.`;
    return;
  }
  if (problem.items.some((item) => figure(item) < 0)) return;
  for (const count of problem.counts ?? []) {
    const extra = leastToFill(settled, figure, count.items, count.least ?? 0);
    const together = lowest + extra;
    if (together <= most) continue;
    const who = `What must be taken and ${count.least} pieces of ${countName(count)}`;
    yield `${who} bring ${name} to ${asText(together)} at least, ${asText(together - most)} over ${boundName} of ${asText(most)}.`;
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
