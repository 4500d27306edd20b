import { describe, expect, it } from 'vitest';
import { boundAt, openStretches, toBound } from './bound';
import type { CertificateStatus } from '../../generated/graphql';
import { provenText } from './proven-note';
import { pointsMore } from './wording';

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

describe('openStretches', () => {
  it('leaves what lies between the proven stretches', () => {
    expect(openStretches(bound, [])).toEqual([[100, 300]]);
    expect(
      openStretches(bound, [
        [50, 150],
        [200, 250],
      ]),
    ).toEqual([
      [150, 200],
      [250, 300],
    ]);
    expect(openStretches(bound, [[0, 400]])).toEqual([]);
  });
});

describe('provenText', () => {
  const told = (status: CertificateStatus, proven: [number, number][], provenShare: number) =>
    provenText({ status, proven, provenShare });

  it('never claims what is not proven', () => {
    expect(told('UNPROVEN', [], 0)).toBe('Pale rod: nothing proven yet');
    expect(told('BOUNDED', [], 0)).toBe('Pale rod: a bound is proven, no stretch is complete yet');
    expect(told('COMPLETE', [[0, 5]], 1)).toBe(
      'Filled rod: proven complete, no better portfolio exists at any cost',
    );
  });

  it('names few stretches and the share of many, never rounded up to the whole', () => {
    expect(told('BOUNDED', [[492_000, 1_270_000]], 0.6219)).toMatch(
      /^Filled rod: 62\D1.% of the axis is proven complete, from 492.k to 1\D27.M$/u,
    );
    expect(told('BOUNDED', [[0, 504_000]], 0.1)).toMatch(/, up to 504.k$/u);
    const many: [number, number][] = [[0, 1], [2, 3], [4, 5]]; // prettier-ignore
    expect(told('BOUNDED', many, 0.99999)).toMatch(/^Filled rod: 99\D9.% of the axis is proven complete$/u);
  });
});

describe('pointsMore', () => {
  it('rounds up, since it is a promise', () => {
    expect([0.01, 0.1, 5.7501, 6].map(pointsMore)).toEqual(['0.1', '0.1', '5.8', '6.0']);
  });
});
