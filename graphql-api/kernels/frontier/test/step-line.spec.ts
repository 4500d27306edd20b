import { Random } from '../src/local-search/random.js';
import { StepLine } from '../src/proof/step-line.js';

const MOST = 60;

/** The most benefit within each cost, from a plain list of points. */
function bestWithin(points: readonly (readonly [number, number])[], cost: number): number {
  return points.reduce((best, point) => (point[0] <= cost ? Math.max(best, point[1]) : best), -Infinity);
}

function somePoints(random: Random): [number, number][] {
  return Array.from({ length: random.below(12) }, () => [random.below(MOST), 2 * random.below(40)]);
}

describe('a step line', () => {
  it('knows the most benefit within every cost', () => {
    const random = new Random(1);
    for (let round = 0; round < 100; round++) {
      const points = somePoints(random);
      const line = new StepLine(points);
      for (let cost = 0; cost <= MOST; cost++) expect(line.at(cost)).toBe(bestWithin(points, cost));
      for (const [cost, benefit] of line.points()) expect(line.has(cost, benefit)).toBe(true);
      expect(new StepLine(line.points()).points()).toEqual(line.points());
    }
  });

  it('is raised by what lies above it alone', () => {
    const line = new StepLine([[10, 5]]);
    expect([line.raise(10, 5), line.raise(12, 5), line.raise(9, 4), line.raise(10, 6)]).toEqual([
      false,
      false,
      true,
      true,
    ]);
    expect(line.points()).toEqual([
      [9, 4],
      [10, 6],
    ]);
  });

  it('keeps its order beyond the room it begins with', () => {
    const line = new StepLine([]);
    for (let cost = 200; cost > 0; cost--) line.raise(cost, cost);
    expect(line.points()).toEqual(Array.from({ length: 200 }, (_, place) => [place + 1, place + 1]));
  });

  it('has the widest gap that a walk over every cost finds', () => {
    const random = new Random(2);
    const precision = { step: 2, slack: 1e-6 };
    let gaps = 0;
    for (let round = 0; round < 2_000; round++) {
      const points = somePoints(random);
      const tangent = { height: 60 * random.fraction() - 20, slope: random.below(3) * random.fraction() };
      const from = random.below(MOST);
      const stretch = { from, to: from + random.below(MOST - from + 1) };
      const wanted: { cost: number; above: number }[] = [];
      for (let cost = stretch.from; cost <= stretch.to; cost++) {
        const asked = Math.max(0, bestWithin(points, cost) + precision.step);
        const above = tangent.height + tangent.slope * cost - asked;
        if (above >= 0) wanted.push({ cost, above });
      }
      const gap = new StepLine(points).widestGap(tangent, stretch, precision);
      if (wanted.length === 0) {
        expect(gap?.gap ?? 0).toBeLessThan(1e-5);
        continue;
      }
      gaps++;
      expect(gap!.gap).toBeCloseTo(Math.max(...wanted.map(({ above }) => above)), 4);
      expect(gap!.from).toBeGreaterThanOrEqual(stretch.from);
      expect(gap!.from).toBeLessThanOrEqual(wanted[0].cost);
      expect(gap!.from).toBeGreaterThanOrEqual(wanted[0].cost - 1);
      expect(gap!.to).toBeGreaterThanOrEqual(wanted.at(-1)!.cost);
      expect(gap!.to).toBeLessThanOrEqual(stretch.to);
    }
    expect(gaps).toBeGreaterThan(500);
  });
});
