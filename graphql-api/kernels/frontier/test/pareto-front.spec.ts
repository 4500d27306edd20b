import { ParetoFront } from '../src/archive/pareto-front.js';
import { Random } from '../src/local-search/random.js';

/** Two classes of forty options each. */
const optionStart = Int32Array.of(0, 40, 80);
const choices = (option: number): Int32Array => Int32Array.of(option, 79 - option);

describe('a front of portfolios that do not beat each other', () => {
  it('takes in what no member beats and drops what it beats', () => {
    const beaten: number[][] = [];
    const front = new ParetoFront(optionStart, (benefit, cost) => beaten.push([cost, benefit]));
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
    expect([...front.choicesAt(1)]).toEqual([5, 74]);
  });

  it('keeps the first of equals', () => {
    const front = new ParetoFront(optionStart);
    front.offer(5, 5, choices(1));
    expect(front.offer(5, 5, choices(2))).toBe(-1);
    expect([...front.choicesAt(0)]).toEqual([1, 78]);
  });

  it('replaces a member of the same cost or the same benefit', () => {
    const front = new ParetoFront(optionStart);
    front.offer(5, 5, choices(1));
    front.offer(6, 5, choices(2));
    front.offer(6, 4, choices(3));
    expect(front.points()).toEqual([[4, 6]]);
    expect([...front.choicesAt(0)]).toEqual([3, 76]);
  });

  it('uses the slot of a beaten member again', () => {
    const front = new ParetoFront(optionStart);
    const slot = front.offer(1, 9, choices(1));
    expect(front.offer(2, 8, choices(2))).toBe(slot);
    expect([...front.choicesAt(0)]).toEqual([2, 77]);
  });

  it('knows the most benefit within a cost', () => {
    const front = new ParetoFront(optionStart);
    expect(front.bestBenefitWithin(Infinity)).toBe(-Infinity);
    front.offer(10, 10, choices(1));
    front.offer(20, 20, choices(2));
    expect([9, 10, 19, 20, Infinity].map((cost) => front.bestBenefitWithin(cost))).toEqual([
      -Infinity,
      10,
      10,
      20,
      20,
    ]);
  });

  it('is the unbeaten part of all it was ever offered, each member with its own choices', () => {
    const random = new Random(11);
    const front = new ParetoFront(Int32Array.of(0, 30_000, 70_000));
    const offered: [cost: number, benefit: number][] = [];
    for (let offer = 0; offer < 20_000; offer++) {
      const cost = random.below(30_000);
      // a rising band, so that the front grows past its first room
      const benefit = cost + random.below(40);
      offered.push([cost, benefit]);
      front.offer(benefit, cost, Int32Array.of(cost, 30_000 + benefit - cost));
    }
    const bestFirst = [...offered].sort(([c1, b1], [c2, b2]) => c1 - c2 || b2 - b1);
    let best = -1;
    const unbeaten = bestFirst.filter(([, benefit]) => benefit > best && (best = benefit) === benefit);
    expect(front.size).toBeGreaterThan(1_000);
    expect(front.points()).toEqual(unbeaten);
    for (let place = 0; place < front.size; place++) {
      const [cost, benefit] = [front.costAt(place), front.benefitAt(place)];
      expect([...front.choicesAt(place)]).toEqual([cost, 30_000 + benefit - cost]);
    }
    const slots = Array.from({ length: front.size }, (_, place) => front.slotAt(place));
    expect(new Set(slots).size).toBe(front.size);
  });

  it('drops the many members that a newcomer beats, and grows anew in their room', () => {
    const front = new ParetoFront(optionStart);
    for (let step = 1; step <= 5_000; step++) front.offer(step, step, choices(step % 40));
    expect(front.offer(4_000, 1_000, choices(7))).toBeGreaterThanOrEqual(0);
    expect(front.size).toBe(2_000);
    expect(front.sinceBeaten).toBe(3_001);
    expect([front.costAt(998), front.costAt(999), front.costAt(1_000)]).toEqual([999, 1_000, 4_001]);
    expect(front.bestBenefitWithin(4_000)).toBe(4_000);
    expect(front.offer(5_000, 1, choices(9))).toBeGreaterThanOrEqual(0);
    expect(front.points()).toEqual([[1, 5_000]]);
    for (let step = 5_000; step > 0; step--) front.offer(5_000 + 2 * step, 1 + step, choices(step % 40));
    expect(front.size).toBe(5_001);
    for (const place of [5_000, 1, 2_500, 0]) {
      expect([front.costAt(place), front.benefitAt(place)]).toEqual([1 + place, 5_000 + 2 * place]);
      expect([...front.choicesAt(place)]).toEqual([...choices(place === 0 ? 9 : place % 40)]);
    }
  });

  it('stores the options of small, large and very large classes alike', () => {
    for (const largest of [256, 257, 65_537]) {
      const starts = Int32Array.of(0, 1, 1 + largest, 4 + largest);
      const front = new ParetoFront(starts);
      const last = Int32Array.of(0, largest, 3 + largest);
      front.offer(1, 1, Int32Array.of(0, 1, 1 + largest));
      front.offer(2, 2, last);
      expect([...front.choicesAt(1)]).toEqual([...last]);
      expect([...front.choicesAt(0)]).toEqual([0, 1, 1 + largest]);
    }
  });
});
