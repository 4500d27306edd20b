import { describe, expect, it } from 'vitest';
import { boundAt, toBound } from './bound';
import { provenText } from './proven-note';

const bound = toBound({ costs: [100, 200, 300], benefits: [10, 15, 18] });

describe('boundAt', () => {
  it('never promises less than the bound given at the next cost', () => {
    expect([100, 101, 200, 250, 300].map((cost) => boundAt(bound, cost))).toEqual([10, 15, 15, 18, 18]);
  });

  it('says nothing outside', () => {
    expect([boundAt(bound, 99), boundAt(bound, 301), boundAt([], 5)]).toEqual([
      undefined,
      undefined,
      undefined,
    ]);
  });
});

describe('provenText', () => {
  it('never claims what is not proven', () => {
    expect(provenText('UNPROVEN', [])).toBe('Pale rod: nothing proven yet');
    expect(provenText('BOUNDED', [[492_000, 1_270_000]])).toMatch(/from 492.k to 1\.27.M$/u);
    expect(provenText('COMPLETE', [[0, 5]])).toBe('Filled rod: proven complete over the whole length');
  });
});
