import { countName, type Violation } from './feasible.js';
import type { Item, Problem } from './problem.js';

/** A rule that bounds a sum over the pieces taken. A "least" rule stands with its figures and its bound negated. */
export interface BoundedSum {
  readonly kind: Violation['kind'];
  readonly name: string;
  /** 1, or -1 where figures and bound are negated. */
  readonly sign: 1 | -1;
  /** What one piece of an item adds to the sum, negated with it. */
  readonly figure: (item: Item) => number;
  /** The sum may be at most this. */
  readonly most: number;
}

/** Ceiling, limits, counts and the least benefit, each as a sum of pieces that may be at most a bound. */
export function* boundedSumsOf(problem: Problem): Generator<BoundedSum> {
  const { ceiling, limits = [], counts = [], leastBenefit } = problem;
  if (ceiling !== undefined) {
    yield { kind: 'ceiling', name: 'cost', sign: 1, figure: (item) => item.cost, most: ceiling };
  }
  for (const [index, { name, most, least }] of limits.entries()) {
    const use = (item: Item): number => item.uses?.[index] ?? 0;
    yield { kind: 'limit most', name, sign: 1, figure: use, most };
    if (least !== undefined) yield negated({ kind: 'limit least', name, sign: 1, figure: use, most: least });
  }
  for (const count of counts) {
    const members = new Set(count.items);
    const piece = (item: Item): number => (members.has(item.id) ? 1 : 0);
    const { most, least } = count;
    const name = countName(count);
    if (most !== undefined) yield { kind: 'count most', name, sign: 1, figure: piece, most };
    if (least !== undefined)
      yield negated({ kind: 'count least', name, sign: 1, figure: piece, most: least });
  }
  if (leastBenefit !== undefined) {
    const benefit = (item: Item): number => item.benefit;
    yield negated({ kind: 'least benefit', name: 'benefit', sign: 1, figure: benefit, most: leastBenefit });
  }
}

function negated(sum: BoundedSum): BoundedSum {
  return { ...sum, sign: -1, figure: (item) => -sum.figure(item), most: -sum.most };
}
