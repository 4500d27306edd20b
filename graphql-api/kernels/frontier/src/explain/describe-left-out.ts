import { needName } from '../problem/feasible.js';
import type { Limit } from '../problem/problem.js';
import type { Exchange } from './cheapest-exchange.js';
import type { LeftOut, Obstacle } from './why-left-out.js';
import { writeForRule, type WriteFigure } from './write-figure.js';

/** Why an item is left out and what would bring it in, one sentence each. `limits` are the problem's. */
export function describeLeftOut(
  leftOut: LeftOut,
  limits: readonly Limit[] = [],
  write: WriteFigure = String,
): string[] {
  const { item, obstacles, exchange, mostCost } = leftOut;
  const reasons = obstacles.map((obstacle) => describeObstacle(item, obstacle, write));
  const none = `No exchange with up to two other candidates brings ${item} in at a cost of at most ${write(mostCost, 'cost')}.`;
  return [
    ...reasons,
    ...describeFit(leftOut, write),
    exchange ? describeExchange(item, exchange, limits, write) : none,
  ];
}

function describeObstacle(item: string, obstacle: Obstacle, write: WriteFigure): string {
  const { kind, name, used, allowed, items } = obstacle;
  const text = (figure: number): string => writeForRule(figure, obstacle, write);
  const [reached, by, bound] = [used, Math.abs(used - allowed), allowed].map(text);
  switch (kind) {
    case 'ceiling':
      return `With ${item} the cost would be ${reached}, ${by} over the ceiling of ${bound}.`;
    case 'limit most':
      return `With ${item} ${name} would be ${reached}, ${by} over its limit of ${bound}.`;
    case 'limit least':
      return `With ${item} ${name} would be ${reached}, ${by} under its least of ${bound}.`;
    case 'one of':
      return `Only one of the group ${name} may be taken, and ${items.join(', ')} is in.`;
    case 'either or':
      return `${item} and ${items.join(', ')} exclude each other, and ${items.join(', ')} is in.`;
    case 'needs':
      return `${needName(item, items)}, and none of them is in.`;
    case 'count most':
      return `With ${item} there would be ${reached} pieces of ${name}, where at most ${bound} may be taken; in are ${items.join(', ')}.`;
    default:
      return `${item} is to be left out.`;
  }
}

function describeFit({ item, fits }: LeftOut, write: WriteFigure): string[] {
  if (fits === undefined) return [];
  const { benefit, cost, beatenBy } = fits;
  const inAll = `a benefit of ${write(benefit, 'benefit')} at a cost of ${write(cost, 'cost')}`;
  if (beatenBy === undefined)
    return [`${item} fits in; with it the portfolio is another one, of ${inAll}, that none beats.`];
  const better = `a benefit of ${write(beatenBy.benefit, 'benefit')} at a cost of ${write(beatenBy.cost, 'cost')}`;
  return [
    `${item} fits in but is dearer than its worth: with it there is ${inAll}, and another portfolio has ${better}.`,
  ];
}

function describeExchange(
  item: string,
  { changes, benefit, cost, uses }: Exchange,
  limits: readonly Limit[],
  write: WriteFigure,
): string {
  const pieces = changes.map(({ item: id, before, after }) => {
    if (after === 0) return `${id} goes`;
    return before === 0 && after === 1 ? `${id} comes` : `${id} goes from ${before} to ${after} pieces`;
  });
  const differences = [
    `${signed(benefit, (figure) => write(figure, 'benefit'))} benefit`,
    `${signed(cost, (figure) => write(figure, 'cost'))} cost`,
    ...limits
      .map(({ name }, index) => ({ name, use: uses[index] }))
      .filter(({ use }) => use !== 0)
      .map(({ name, use }) => `${signed(use, (figure) => write(figure, { limit: name }))} ${name}`),
  ];
  return `The cheapest exchange for ${item}: ${pieces.join(', ')}; ${differences.join(', ')}.`;
}

function signed(figure: number, write: (figure: number) => string): string {
  if (figure === 0) return 'no change in';
  return figure > 0 ? `+${write(figure)}` : `−${write(-figure)}`;
}
