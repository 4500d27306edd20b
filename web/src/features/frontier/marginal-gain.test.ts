import { describe, expect, it } from 'vitest';
import { gainForMore, lossForLess } from './marginal-gain';
import { bestUnderCeiling, dearestWithin, nearestByCost, toPortfolios } from './portfolio';

const EUR = (amount: string) => ({ amount, currency: 'EUR' });
const point = (cost: string, benefit: string, picks: number[]) => ({
  cost: EUR(cost),
  capital: EUR(cost),
  benefit,
  picks,
});
const portfolios = toPortfolios(
  [
    point('100.00', '10.0000', [0]),
    point('150.00', '14.0000', [0, 1]),
    point('190.00', '15.5000', [0, 2]),
    point('260.00', '20.0000', [0, 2, 3]),
  ],
  EUR('200.00'),
);

describe('gainForMore', () => {
  it('takes the best portfolio within the step and names what enters and leaves', () => {
    expect(gainForMore(portfolios, 1, 50)).toEqual({ to: 2, gain: 1.5, enters: [2], leaves: [1] });
  });

  it('counts a portfolio that costs exactly one step more', () => {
    expect(gainForMore(portfolios, 0, 50)?.to).toBe(1);
    expect(gainForMore(portfolios, 0, 49.99)).toBeUndefined();
  });

  it('finds nothing beyond the last', () => expect(gainForMore(portfolios, 3, 1_000)).toBeUndefined());
});

describe('lossForLess', () => {
  it('goes back by at least a whole step', () => {
    expect(lossForLess(portfolios, 3, 80)).toEqual({ to: 1, gain: -6, enters: [1], leaves: [2, 3] });
  });

  it('finds nothing that costs so much less', () => expect(lossForLess(portfolios, 1, 60)).toBeUndefined());
});

describe('places on the line', () => {
  it('finds the dearest within a cost', () => {
    expect([99, 100, 189.99, 190, 1_000].map((cost) => dearestWithin(portfolios, cost))).toEqual([
      -1, 0, 1, 2, 3,
    ]);
  });

  it('finds the nearest by cost, the cheaper of two equally near', () => {
    expect([0, 125, 126, 400].map((cost) => nearestByCost(portfolios, cost))).toEqual([0, 0, 1, 3]);
    expect(nearestByCost([], 5)).toBe(-1);
  });

  it('starts at the best under the ceiling, which is on capital', () => {
    expect(portfolios.map(({ aboveCeiling }) => aboveCeiling)).toEqual([false, false, false, true]);
    expect(bestUnderCeiling(portfolios)).toBe(2);
    expect(bestUnderCeiling(portfolios.slice(3))).toBe(0);
    expect(bestUnderCeiling([])).toBe(-1);
  });
});
