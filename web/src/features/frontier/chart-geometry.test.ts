import { describe, expect, it } from 'vitest';
import { benefitDomain, geometryOf, nearestPlace, stepPath, upperStepPath } from './chart-geometry';

const geometry = geometryOf(
  { width: 800, height: 500 },
  { left: 50, right: 50, top: 20, bottom: 0 },
  { cost: [100, 200], benefit: [0, 48] },
);

describe('geometryOf', () => {
  it('lays cost from left to right and benefit from the foot up', () => {
    expect([geometry.x(100), geometry.x(200)]).toEqual([50, 750]);
    expect([geometry.y(0), geometry.y(48)]).toEqual([500, 20]);
  });

  it('reads a cost back from its place', () => expect(geometry.costAt(geometry.x(137))).toBeCloseTo(137, 9));
});

describe('paths', () => {
  const points = [
    [0, 10],
    [5, 4],
    [9, 1],
  ] as const;
  it('runs level to the next cost and then rises', () => expect(stepPath(points)).toBe('M0 10H5V4H9V1'));
  it('rises first for a bound', () => expect(upperStepPath(points)).toBe('M0 10V4H5V1H9'));
  it('is empty for no point', () => expect(stepPath([])).toBe(''));
});

describe('nearestPlace', () => {
  const places = [
    [0, 0],
    [30, 0],
  ] as const;
  it('takes the nearer one', () => expect(nearestPlace(places, [20, 5], 40)).toBe(1));
  it('takes none beyond the reach', () => expect(nearestPlace(places, [100, 0], 40)).toBeUndefined());
});

describe('benefitDomain', () => {
  it('leaves room on both sides, and has a length for a single benefit', () => {
    expect(benefitDomain([100, 200])).toEqual([94, 213]);
    const [least, most] = benefitDomain([5]);
    expect(most).toBeGreaterThan(least);
  });
});
