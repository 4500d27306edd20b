import { violationsOf } from '../src/problem/feasible.js';
import type { Problem } from '../src/problem/problem.js';

export type Point = [cost: number, benefit: number];

/**
 * The whole front by trying every combination of pieces, in plain loops and with nothing of the search in it. Cut
 * short is only what no further item can mend: cost over the ceiling, two of a group. The costly check of all rules
 * is left to those within the limits that no feasible portfolio met before beats.
 */
export function bruteForceFront(problem: Problem): Point[] {
  const { items, limits = [], ceiling = Infinity } = problem;
  const pieces = items.map(() => 0);
  const uses = limits.map(() => 0);
  const groups = new Set<string>();
  let front: Point[] = [];

  const judge = (cost: number, benefit: number): void => {
    if (limits.some(({ most, least = -Infinity }, k) => uses[k] > most || uses[k] < least)) return;
    if (front.some((point) => point[0] <= cost && point[1] >= benefit)) return;
    const picks: Record<string, number> = {};
    for (const [index, { id }] of items.entries()) if (pieces[index] > 0) picks[id] = pieces[index];
    if (violationsOf(problem, picks).length > 0) return;
    front = front.filter((point) => point[0] < cost || point[1] > benefit);
    front.push([cost, benefit]);
  };

  const tryFrom = (index: number, cost: number, benefit: number): void => {
    if (cost > ceiling) return;
    if (index === items.length) {
      judge(cost, benefit);
      return;
    }
    tryFrom(index + 1, cost, benefit);
    const item = items[index];
    if (item.oneOf !== undefined && groups.has(item.oneOf)) return;
    if (item.oneOf !== undefined) groups.add(item.oneOf);
    const most = item.most ?? 1;
    for (let count = 1; count <= most; count++) {
      take(index, 1);
      tryFrom(index + 1, cost + count * item.cost, benefit + count * item.benefit);
    }
    take(index, -most);
    if (item.oneOf !== undefined) groups.delete(item.oneOf);
  };

  const take = (index: number, by: number): void => {
    pieces[index] += by;
    for (let k = 0; k < uses.length; k++) uses[k] += by * (items[index].uses?.[k] ?? 0);
  };

  tryFrom(0, 0, 0);
  return front.sort(([one], [other]) => one - other);
}
