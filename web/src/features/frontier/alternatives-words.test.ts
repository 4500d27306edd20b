import { describe, expect, it } from 'vitest';
import { alternativesText, nextBestText } from './alternatives-words';

describe('alternativesText', () => {
  it('counts the others, and claims no more than was looked at', () => {
    expect(alternativesText({ count: 1, isExact: true })).toBe(
      'No other portfolio has the same benefit and cost.',
    );
    expect(alternativesText({ count: 2, isExact: true })).toBe(
      '1 other portfolio has the same benefit and cost.',
    );
    expect(alternativesText({ count: 4, isExact: true })).toBe(
      '3 other portfolios have the same benefit and cost.',
    );
    expect(alternativesText({ count: 4, isExact: false })).toBe(
      'At least 3 other portfolios have the same benefit and cost; there may be more.',
    );
    expect(alternativesText({ count: 1, isExact: false })).toContain('there may be some');
  });
});

describe('nextBestText', () => {
  it('never shows a difference as none', () => {
    expect(nextBestText(3.25, true)).toMatch(/: 3\D[23] points less\.$/u);
    expect(nextBestText(0.0012, true)).toMatch(/: 0\D0012 points less\.$/u);
    expect(nextBestText(undefined, true)).toMatch(/^No other at the same cost/u);
    expect(nextBestText(undefined, false)).toMatch(/found in time/u);
  });
});
