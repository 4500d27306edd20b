import {
  addRates,
  invertRate,
  multiplyRates,
  parseRate,
  rate,
  rateOfNumber,
  rateToNumber,
  roundHalfEven,
  roundHalfUp,
} from '../src/index.js';

describe('rounding', () => {
  it.each([
    [2.5, 3, 2],
    [3.5, 4, 4],
    [-2.5, -3, -2],
    [0.49999999999999994, 0, 0],
    [1.4, 1, 1],
    [-1.6, -2, -2],
  ])('%d goes to %d half up and to %d half even', (value, up, even) => {
    expect(roundHalfUp(value)).toBe(up);
    expect(roundHalfEven(value)).toBe(even);
  });

  it('sees the exact half of a decimal that floating point would miss', () => {
    const exact = multiplyRates(parseRate('1.005'), rate(100n));
    expect(roundHalfUp(exact)).toBe(101);
    expect(roundHalfUp(1.005 * 100)).toBe(100);
    expect(roundHalfEven(exact)).toBe(100);
  });

  it('refuses a result beyond the safe whole numbers', () => {
    expect(() => roundHalfUp(rate(10n ** 16n))).toThrow('more than can be counted exactly');
    expect(() => roundHalfUp(Number.POSITIVE_INFINITY)).toThrow('not a finite number');
  });
});

describe('rates', () => {
  it('reads decimals exactly and keeps them in lowest terms', () => {
    expect(parseRate('0.035')).toEqual({ numerator: 7n, denominator: 200n });
    expect(parseRate('-1.50')).toEqual({ numerator: -3n, denominator: 2n });
    expect(addRates(parseRate('0.1'), parseRate('0.2'))).toEqual(parseRate('0.3'));
    expect(invertRate(parseRate('-0.5'))).toEqual(rate(-2n));
  });

  it.each(['', '3.5 %', '0,035', '1e-2', '.5', '5.', 'abc'])('refuses %p as a rate', (text) => {
    expect(() => parseRate(text)).toThrow('is not a rate; expected a decimal such as 0.035.');
  });

  it('goes to floating point and back without loss', () => {
    for (const value of [0.1, -0.035, 1 / 3, 12345.678, 0]) {
      expect(rateToNumber(rateOfNumber(value))).toBeCloseTo(value, 15);
    }
    expect(rateToNumber(parseRate('0.035'))).toBe(0.035);
    expect(() => rate(1n, 0n)).toThrow('zero below its line');
  });
});
