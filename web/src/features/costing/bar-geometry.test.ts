import { describe, expect, it } from 'vitest';
import { axisOf, barOf, niceStep, shareAt } from './bar-geometry';

const OSLANDER = [
  { id: 'acquisition', value: 78_200 },
  { id: 'installation', value: 3_400 },
  { id: 'training', value: 4_100 },
  { id: 'service', value: 31_200 },
  { id: 'consumables', value: 14_800 },
  { id: 'energy', value: 2_900 },
  { id: 'residual', value: -6_400 },
] as const;

describe('the bar of a quote', () => {
  it('begins left of zero by the residual value and ends at the life-cycle cost', () => {
    const bar = barOf(OSLANDER);
    expect(bar.start).toBe(-6_400);
    expect(bar.end).toBe(128_200);
    expect(bar.pieces[0]).toEqual({ id: 'acquisition', from: -6_400, to: 71_800 });
  });

  it('lays its pieces end to end in the given order', () => {
    const { pieces } = barOf(OSLANDER);
    expect(pieces.map(({ id }) => id)).toEqual([
      'acquisition',
      'installation',
      'training',
      'service',
      'consumables',
      'energy',
    ]);
    pieces.slice(1).forEach((piece, i) => expect(piece.from).toBe(pieces[i]!.to));
  });

  it('leaves out what costs nothing', () => {
    const { pieces, end } = barOf([
      { id: 'acquisition', value: 500 },
      { id: 'service', value: 0 },
    ]);
    expect(pieces).toHaveLength(1);
    expect(end).toBe(500);
  });

  it('counts a discount above the price of the units as given back too', () => {
    const bar = barOf([
      { id: 'acquisition', value: -50 },
      { id: 'installation', value: 200 },
      { id: 'residual', value: -10 },
    ]);
    expect(bar).toEqual({ start: -60, end: 140, pieces: [{ id: 'installation', from: -60, to: 140 }] });
  });
});

describe('the axis below the bars', () => {
  it('ends on a number at or beyond the dearest quote and starts left of the residual values', () => {
    const axis = axisOf(
      [
        { start: -6_400, end: 128_200 },
        { start: -9_100, end: 132_000 },
        { start: -3_900, end: 141_100 },
      ],
      6,
    );
    expect(axis.step).toBe(25_000);
    expect(axis.numbers).toEqual([0, 25_000, 50_000, 75_000, 100_000, 125_000, 150_000]);
    expect(axis.from).toBe(-15_000);
    expect(axis.to).toBe(150_000);
  });

  it('starts at zero when nothing is given back', () => {
    expect(axisOf([{ start: 0, end: 90 }], 4).from).toBe(0);
  });

  it('stands even when every quote costs nothing', () => {
    const axis = axisOf([{ start: 0, end: 0 }], 4);
    expect(axis.to).toBeGreaterThan(0);
    expect(shareAt(axis, 0)).toBe(0);
  });

  it('places values by their share of its length', () => {
    const axis = { from: -50, to: 150, step: 50, numbers: [] };
    expect(shareAt(axis, 0)).toBe(0.25);
    expect(shareAt(axis, 150)).toBe(1);
  });

  it.each([
    [21_367, 25_000],
    [0.3, 0.5],
    [1_000, 1_000],
    [2_100, 2_500],
    [7, 10],
  ])('rounds a step of %s up to %s', (least, step) => expect(niceStep(least)).toBeCloseTo(step));
});
