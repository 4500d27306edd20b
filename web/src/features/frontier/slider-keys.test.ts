import { describe, expect, it } from 'vitest';
import { toPortfolios } from './portfolio';
import { portfolioAfterKey } from './slider-keys';

const EUR = (amount: string) => ({ amount, currency: 'EUR' });
const portfolios = toPortfolios(
  [100, 110, 120, 230, 500].map((cost, index) => ({
    cost: EUR(String(cost)),
    capital: EUR(String(cost)),
    benefit: String(index),
    picks: [],
  })),
  EUR('1000'),
);
const after = (key: string, at: number, knee?: number) =>
  portfolioAfterKey(key, { portfolios, at, step: 100, knee });

describe('portfolioAfterKey', () => {
  it('goes to the neighbours and stops at the ends', () => {
    expect([
      after('ArrowRight', 0),
      after('ArrowUp', 4),
      after('ArrowLeft', 3),
      after('ArrowDown', 0),
    ]).toEqual([1, 4, 2, 0]);
  });

  it('goes a step of cost, and at least to the neighbour', () => {
    expect(after('PageUp', 0)).toBe(2);
    expect(after('PageUp', 3)).toBe(4);
    expect(after('PageDown', 3)).toBe(2);
    expect(after('PageDown', 1)).toBe(0);
    expect(after('PageDown', 0)).toBe(0);
  });

  it('goes to the ends and to the knee', () => {
    expect([after('Home', 3), after('End', 0), after('k', 0, 2)]).toEqual([0, 4, 2]);
    expect(after('k', 0)).toBeUndefined();
  });

  it('knows no other key', () => expect(after('Enter', 0)).toBeUndefined());
});
