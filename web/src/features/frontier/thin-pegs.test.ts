import { describe, expect, it } from 'vitest';
import { thinPegs } from './thin-pegs';

const crowd = Array.from({ length: 101 }, (_, i) => [i, 0] as const);

describe('thinPegs', () => {
  it('keeps neighbours apart, and the two ends', () => {
    const drawn = thinPegs(crowd, 9);
    expect(drawn[0]).toBe(0);
    expect(drawn.at(-1)).toBe(100);
    expect(drawn.slice(1, -1)).toEqual([9, 18, 27, 36, 45, 54, 63, 72, 81, 90, 99]);
  });

  it('draws what is asked for whatever stands beside it', () => {
    expect(thinPegs(crowd, 9, new Set([10]))).toContain(10);
  });

  it('keeps pegs that are apart in benefit only', () => {
    expect(thinPegs([[0, 0], [1, 20], [2, 40]], 9)).toEqual([0, 1, 2]); // prettier-ignore
  });

  it('has nothing to draw for nothing', () => expect(thinPegs([], 9)).toEqual([]));
});
