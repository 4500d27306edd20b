import { violationsOf, type Picks } from '../src/problem/feasible.js';
import type { Problem } from '../src/problem/problem.js';

export type Point = [cost: number, benefit: number];

/**
 * The whole front by trying every combination of pieces, in plain loops and with nothing of the search in it. The
 * costly check of all rules is left to those within the ceiling that no
 * feasible portfolio met before beats.
 */
export function bruteForceFront(problem: Problem): Point[] {
  let front: Point[] = [];
  for (const { cost, benefit, picks } of allPortfolios(problem)) {
    if (cost > (problem.ceiling ?? Infinity)) continue;
    if (front.some((point) => point[0] <= cost && point[1] >= benefit)) continue;
    if (violationsOf(problem, picks()).length > 0) continue;
    front = front.filter((point) => point[0] < cost || point[1] > benefit);
    front.push([cost, benefit]);
  }
  return front.sort(([one], [other]) => one - other);
}

interface Portfolio {
  readonly cost: number;
  readonly benefit: number;
  readonly picks: () => Picks;
}

function* allPortfolios({ items }: Problem): Generator<Portfolio> {
  const pieces = items.map(() => 0);
  const picks = (): Picks => Object.fromEntries(items.map(({ id }, index) => [id, pieces[index]]));
  let cost = 0;
  let benefit = 0;
  const change = (index: number, by: number): void => {
    pieces[index] += by;
    cost += by * items[index].cost;
    benefit += by * items[index].benefit;
  };
  for (;;) {
    yield { cost, benefit, picks };
    let index = 0;
    for (; index < items.length && pieces[index] === (items[index].most ?? 1); index++) {
      change(index, -pieces[index]);
    }
    if (index === items.length) return;
    change(index, 1);
  }
}
