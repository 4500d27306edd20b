import { describe, expect, it } from 'vitest';
import { overlap, placeLabel } from './place-labels';

const within = { x: 0, y: 0, width: 400, height: 300 };
const box = (x: number, y: number) => ({ x, y, width: 100, height: 20 });

describe('placeLabel', () => {
  it('takes the first place that is free', () => {
    const taken = [box(0, 0)];
    expect(placeLabel([box(50, 0), box(120, 0), box(200, 0)], { taken, avoid: [], within })).toEqual(
      box(120, 0),
    );
  });

  it('keeps twelve px away from another label', () => {
    const taken = [box(0, 0)];
    expect(placeLabel([box(105, 0), box(115, 0)], { taken, avoid: [], within })).toEqual(box(115, 0));
  });

  it('would rather cover the line than leave the plot or another label', () => {
    const avoid = Array.from({ length: 50 }, (_, i) => [i * 2, 110] as const);
    const choices = [box(350, 100), box(0, 100)];
    expect(placeLabel(choices, { taken: [], avoid, within })).toEqual(box(0, 100));
  });

  it('would rather not cover the line', () => {
    const avoid = [[50, 110]] as const;
    expect(placeLabel([box(0, 100), box(0, 150)], { taken: [], avoid, within })).toEqual(box(0, 150));
  });
});

describe('overlap', () => {
  it('is the shared area', () => expect(overlap(box(0, 0), box(90, 10))).toBe(100));
  it('is nothing for boxes apart', () => expect(overlap(box(0, 0), box(101, 0))).toBe(0));
});
