import { describe, expect, it } from 'vitest';
import { compositionOf } from './composition';
import { toPortfolios } from './portfolio';

const EUR = (amount: string) => ({ amount, currency: 'EUR' });
const holding = (capital: string, picks: number[]) => ({
  cost: EUR(capital),
  capital: EUR(capital),
  benefit: '1',
  picks,
});

describe('compositionOf', () => {
  it('counts the portfolios up to the ceiling only, and sorts those in some by share', () => {
    const portfolios = toPortfolios(
      [holding('1', [0]), holding('2', [0, 2]), holding('3', [0, 1, 2]), holding('4', [3])],
      EUR('3'),
    );
    expect(compositionOf(portfolios, 4)).toEqual({
      of: 3,
      inAll: [{ item: 0, share: 1 }],
      inSome: [
        { item: 2, share: 2 / 3 },
        { item: 1, share: 1 / 3 },
      ],
      inNone: [{ item: 3, share: 0 }],
    });
  });

  it('counts all where every one lies above the ceiling', () => {
    expect(compositionOf(toPortfolios([holding('9', [1])], EUR('3')), 2).inAll).toEqual([
      { item: 1, share: 1 },
    ]);
  });
});
