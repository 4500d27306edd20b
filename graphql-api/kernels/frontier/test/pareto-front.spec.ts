import { ParetoFront } from '../src/archive/pareto-front.js';
import { Random } from '../src/local-search/random.js';

const choices = (figure: number): Int32Array => Int32Array.of(figure, -figure);

describe('a front of portfolios that do not beat each other', () => {
  it('takes in what no member beats and drops what it beats', () => {
    const beaten: number[][] = [];
    const front = new ParetoFront(2, (benefit, cost) => beaten.push([cost, benefit]));
    expect(front.offer(10, 10, choices(1))).toBeGreaterThanOrEqual(0);
    expect(front.offer(30, 30, choices(2))).toBeGreaterThanOrEqual(0);
    expect(front.offer(20, 20, choices(3))).toBeGreaterThanOrEqual(0);
    expect(front.offer(20, 25, choices(4))).toBe(-1);
    expect(front.offer(30, 15, choices(5))).toBeGreaterThanOrEqual(0);
    expect(front.points()).toEqual([
      [10, 10],
      [15, 30],
    ]);
    expect(beaten).toEqual([
      [20, 20],
      [30, 30],
    ]);
    expect(front.sinceBeaten).toBe(2);
    expect([...front.choicesAt(1)]).toEqual([5, -5]);
  });

  it('keeps the first of equals', () => {
    const front = new ParetoFront(2);
    front.offer(5, 5, choices(1));
    expect(front.offer(5, 5, choices(2))).toBe(-1);
    expect([...front.choicesAt(0)]).toEqual([1, -1]);
  });

  it('replaces a member of the same cost or the same benefit', () => {
    const front = new ParetoFront(2);
    front.offer(5, 5, choices(1));
    front.offer(6, 5, choices(2));
    front.offer(6, 4, choices(3));
    expect(front.points()).toEqual([[4, 6]]);
    expect([...front.choicesAt(0)]).toEqual([3, -3]);
  });

  it('uses the slot of a beaten member again', () => {
    const front = new ParetoFront(2);
    const slot = front.offer(1, 9, choices(1));
    expect(front.offer(2, 8, choices(2))).toBe(slot);
    expect([...front.choicesAt(0)]).toEqual([2, -2]);
  });

  it('knows the most benefit within a cost', () => {
    const front = new ParetoFront(2);
    expect(front.bestBenefitWithin(100)).toBe(-Infinity);
    front.offer(10, 10, choices(1));
    front.offer(20, 20, choices(2));
    expect([9, 10, 19, 20, 99].map((cost) => front.bestBenefitWithin(cost))).toEqual([
      -Infinity,
      10,
      10,
      20,
      20,
    ]);
  });

  it('is the unbeaten part of all it was ever offered, each member with its own choices', () => {
    const random = new Random(11);
    const front = new ParetoFront(2);
    const offered: [cost: number, benefit: number][] = [];
    for (let offer = 0; offer < 20_000; offer++) {
      const cost = random.below(30_000);
      // a rising band, so that the front grows past its first room
      const benefit = cost + random.below(40);
      offered.push([cost, benefit]);
      front.offer(benefit, cost, Int32Array.of(cost, benefit));
    }
    const bestFirst = [...offered].sort(([c1, b1], [c2, b2]) => c1 - c2 || b2 - b1);
    let best = -1;
    const unbeaten = bestFirst.filter(([, benefit]) => benefit > best && (best = benefit) === benefit);
    expect(front.size).toBeGreaterThan(1_000);
    expect(front.points()).toEqual(unbeaten);
    for (let place = 0; place < front.size; place++) {
      expect([...front.choicesAt(place)]).toEqual([front.costAt(place), front.benefitAt(place)]);
    }
    const slots = Array.from({ length: front.size }, (_, place) => front.slotAt(place));
    expect(new Set(slots).size).toBe(front.size);
  });
});
