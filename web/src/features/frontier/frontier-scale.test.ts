import { describe, expect, it } from 'vitest';
import { numberedGraduations, rodScale, roundStep, roundValues } from './frontier-scale';

describe('rodScale', () => {
  it('graduates two million in steps of 100 000 and begins on a graduation', () => {
    expect(rodScale(492_216, 2_304_000)).toEqual({
      start: 400_000,
      end: 2_360_000,
      long: 100_000,
      short: 20_000,
    });
  });

  it('takes finer steps for a small clinic group', () => {
    expect(rodScale(114_180, 361_000).long).toBe(10_000);
    expect(rodScale(20_000, 361_000).long).toBe(20_000);
  });

  it.each([
    [0, 7],
    [3, 91],
    [1_000, 4_512],
    [885_622, 4_055_751],
    [12, 98_765_432],
  ])('gives thirteen to thirty-one long graduations from %d to %d and holds both ends', (from, to) => {
    const { start, end, long } = rodScale(from, to);
    expect(start).toBeLessThanOrEqual(from);
    expect(end).toBeGreaterThanOrEqual(to);
    if (to - from >= 30) expect((to - from) / long).toBeGreaterThanOrEqual(12);
    expect((to - from) / long).toBeLessThanOrEqual(30);
  });

  it('still has a length where there is a single cost', () => {
    const { start, end } = rodScale(5_000, 5_000);
    expect(start).toBeLessThanOrEqual(5_000);
    expect(end).toBeGreaterThan(start);
  });
});

describe('roundStep', () => {
  it.each([
    [1, 1],
    [1.1, 2],
    [20, 20],
    [21, 50],
    [51, 100],
    [66_667, 100_000],
    [0, 1],
  ])('rounds %d up to %d', (least, step) => expect(roundStep(least)).toBe(step));
});

describe('numberedGraduations', () => {
  const scale = { start: 400_000, end: 2_360_000, long: 100_000, short: 20_000 };

  it('numbers only as many as keep their distance', () => {
    expect(numberedGraduations(scale, 730 / 1_960_000, 84)).toEqual([
      500_000, 1_000_000, 1_500_000, 2_000_000,
    ]);
  });

  it('numbers each where there is room', () => {
    expect(numberedGraduations(scale, 1, 84)).toHaveLength(20);
  });
});

describe('roundValues', () => {
  it('stays inside', () => expect(roundValues(153.4, 838.2, 6)).toEqual([200, 400, 600, 800]));
});
