import { describeViolation, violationsOf } from '../problem/feasible.js';
import type { Item, Problem } from '../problem/problem.js';
import type { ClaimedPoint } from './parse-frontier.js';
import { Staircase } from './staircase.js';
import type { Finding } from './verify-frontier.js';

/** Whether every portfolio is feasible, its sums are right, and no point beats another. O(n log n) in the points. */
export function* pointFindings(
  problem: Problem,
  points: readonly ClaimedPoint[],
  hasSecondCost: boolean,
): Generator<Finding> {
  const items = new Map(problem.items.map((item) => [item.id, item]));
  for (const [index, point] of points.entries()) {
    const path = `points[${index}]`;
    for (const violation of violationsOf(problem, point.picks)) {
      const sentence = `The portfolio is not feasible: ${describeViolation(violation)}.`;
      yield { path: `${path}.picks`, sentence };
    }
    yield* wrongSums(items, point, path, hasSecondCost);
  }
  yield* hasSecondCost ? disorderOfThree(points) : disorderOfTwo(points);
}

function* wrongSums(
  items: ReadonlyMap<string, Item>,
  point: ClaimedPoint,
  path: string,
  hasSecondCost: boolean,
): Generator<Finding> {
  // big integers: picks that a file claims may be of any size
  const sum = (ofPiece: (item: Item) => number): bigint => {
    let total = 0n;
    for (const [id, pieces] of Object.entries(point.picks)) {
      const item = items.get(id);
      if (item) total += BigInt(ofPiece(item)) * BigInt(pieces);
    }
    return total;
  };
  const benefit = sum((item) => item.benefit);
  const cost = sum((item) => item.cost);
  if (BigInt(point.benefit) !== benefit) yield wrongSum(path, 'benefit', point.benefit, benefit);
  if (BigInt(point.cost) !== cost) yield wrongSum(path, 'cost', point.cost, cost);
  const at = `${path}.secondCost`;
  if (!hasSecondCost) {
    if (point.secondCost !== undefined) yield { path: at, sentence: 'The problem knows no second cost.' };
    return;
  }
  const secondCost = sum((item) => item.secondCost ?? 0);
  if (point.secondCost === undefined)
    yield { path: at, sentence: `It is missing; the picks have ${secondCost}.` };
  else if (BigInt(point.secondCost) !== secondCost) {
    yield wrongSum(path, 'secondCost', point.secondCost, secondCost);
  }
}

function wrongSum(path: string, key: string, claimed: number, sum: bigint): Finding {
  return { path: `${path}.${key}`, sentence: `It says ${claimed}, but the picks add up to ${sum}.` };
}

function* disorderOfTwo(points: readonly ClaimedPoint[]): Generator<Finding> {
  for (const [before, point] of points.slice(1).entries()) {
    const path = `points[${before + 1}]`;
    const previous = points[before];
    if (point.cost < previous.cost) {
      const sentence = `Points are in order of cost, but the one before costs ${previous.cost}.`;
      yield { path: `${path}.cost`, sentence };
    } else if (point.benefit <= previous.benefit) {
      yield {
        path,
        sentence: `It is beaten or equalled by points[${before}], which costs ${previous.cost} and has benefit ${previous.benefit}.`,
      };
    } else if (point.cost === previous.cost) {
      yield {
        path: `points[${before}]`,
        sentence: `It is beaten by ${path}, which has more benefit for its cost.`,
      };
    }
  }
}

function* disorderOfThree(points: readonly ClaimedPoint[]): Generator<Finding> {
  const sorted = points.map((point, index) => ({ ...point, secondCost: point.secondCost ?? 0, index }));
  for (const [before, point] of sorted.slice(1).entries()) {
    const previous = sorted[before];
    if (point.cost > previous.cost) continue;
    if (point.cost === previous.cost && point.secondCost >= previous.secondCost) continue;
    const sentence =
      'Points are in order of cost, and of second cost where the cost is equal; this one is not.';
    yield { path: `points[${point.index}]`, sentence };
  }
  sorted.sort(
    (one, other) => one.cost - other.cost || one.secondCost - other.secondCost || other.benefit - one.benefit,
  );
  // of all that cost no more: the most benefit at no more than a second cost
  const cheaper = new Staircase();
  for (const { secondCost, benefit, index } of sorted) {
    if (cheaper.at(secondCost) >= benefit) {
      yield {
        path: `points[${index}]`,
        sentence: 'Another point is as good or better in benefit, cost and second cost.',
      };
    }
    cheaper.raise(secondCost, benefit);
  }
}
