import type { Item } from '../problem/problem.js';
import type { EntryThreshold } from './entry-threshold.js';
import type { LossWithout } from './loss-without.js';
import type { WriteFigure } from './write-figure.js';

/** The price and the benefit at which an item that is left out would come in, one sentence each. */
export function describeEntry(
  { id, cost, benefit, most = 1 }: Item,
  price: EntryThreshold,
  score: EntryThreshold,
  write: WriteFigure = String,
): string[] {
  const each = most > 1 ? ' a piece' : '';
  const money = (figure: number): string => write(figure, 'cost');
  const merit = (figure: number): string => write(figure, 'benefit');
  return [
    price.figure === undefined
      ? neverIn(id, 'price', price)
      : `${id} would come in at a cost of ${money(price.figure)}${each}${price.exact ? '' : ', perhaps at a higher one'}; it costs ${money(cost)}.`,
    score.figure === undefined
      ? neverIn(id, 'benefit', score)
      : `${id} would come in with a benefit of ${merit(score.figure)}${each}${score.exact ? '' : ', perhaps with less'}; it has ${merit(benefit)}.`,
  ];
}

/** What is lost without an item that is in, as a sentence. */
export function describeLoss({ item, loss, exact }: LossWithout, write: WriteFigure = String): string {
  if (loss === undefined) {
    return exact
      ? `Without ${item} no portfolio keeps every rule at this cost.`
      : `Without ${item} no portfolio was found that keeps every rule at this cost.`;
  }
  const merit = write(Math.abs(loss), 'benefit');
  if (loss === 0) return `Without ${item} another portfolio brings the same benefit at no more cost.`;
  if (loss < 0) return `Without ${item} ${merit} more benefit could be had for this cost.`;
  return `Without ${item} ${exact ? '' : 'at most '}${merit} of benefit is lost at this cost.`;
}

function neverIn(id: string, what: 'price' | 'benefit', { exact }: EntryThreshold): string {
  return exact
    ? `${id} would not come in at any ${what}.`
    : `No ${what} was found at which ${id} would come in.`;
}
