import { allocate, money, parseRate, rate, roundTogether } from '../src/index.js';

const minors = (total: number, shares: number[]) =>
  allocate(money(total, 'EUR'), shares).map(({ minor }) => minor);

describe('allocate', () => {
  it('hands the last cents to the largest remainders, of equals to the earlier', () => {
    expect(minors(100, [1, 1, 1])).toEqual([34, 33, 33]);
    expect(minors(100, [1, 2, 3])).toEqual([17, 33, 50]);
    expect(minors(5, [0, 3, 1])).toEqual([0, 4, 1]);
    expect(minors(-100, [1, 1, 1])).toEqual([-34, -33, -33]);
  });

  it.each([[[]], [[0, 0]], [[-1, 2]], [[0.5, 1]]])('refuses the shares %p', (shares) => {
    expect(() => minors(100, shares)).toThrow('Shares must be whole numbers');
  });
});

describe('roundTogether', () => {
  it('rounds parts of either sign so that they add up to the rounded sum', () => {
    const parts = ['10.5', '-3.25', '0.5', '2', '-0.25'].map(parseRate);
    expect(roundTogether(parts)).toEqual({ total: 10, parts: [11, -3, 0, 2, 0] });
  });

  it('keeps sum and closeness for many pseudo-random parts', () => {
    let state = 12345n;
    const next = (size: bigint) =>
      (state = (state * 6364136223846793005n + 1442695040888963407n) % 2n ** 64n) % size;
    for (let trial = 0; trial < 500; trial += 1) {
      const parts = Array.from({ length: Number(next(7n)) + 1 }, () =>
        rate(next(2001n) - 1000n, next(12n) + 1n),
      );
      const rounded = roundTogether(parts);
      expect(rounded.parts.reduce((sum, part) => sum + part, 0)).toBe(rounded.total);
      rounded.parts.forEach((part, i) => {
        const exact = Number(parts[i].numerator) / Number(parts[i].denominator);
        expect(Math.abs(part - exact)).toBeLessThan(1);
        if (parts[i].denominator === 1n) expect(part).toBe(exact);
      });
    }
  });
});
