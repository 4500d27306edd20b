import {
  costOfQuote,
  type CandidateFigures,
  type CostAssumptions,
  type QuoteFigures,
} from '@metewand/costing';
import { costOf } from './cost-memo.js';

const quote: QuoteFigures = {
  currency: 'CHF',
  pricesIncludeVat: false,
  unitPriceMinor: 10_750_000,
  quantity: 2,
  deliveryMinor: 10_000,
  installationMinor: 20_000,
  trainingMinor: 240_000,
  discountMinor: 220_000,
  warrantyYears: 2,
  serviceYearlyMinor: 800_000,
};
const candidate: CandidateFigures = {
  usefulLifeYears: 10,
  residualPercent: '4.00',
  worksNetMinor: 6_400_000,
  consumablesYearlyMinor: 520_000,
  energyYearlyMinor: 940_000,
  currentRunningYearlyMinor: 4_680_000,
};
const assumptions: CostAssumptions = {
  currency: 'EUR',
  discountRate: '0.035',
  vatRate: '0.2',
  timing: 'END_OF_YEAR',
  exchangeRates: { CHF: '1.05', GBP: '1.17' },
};

describe('costOf', () => {
  it('gives what the kernel gives, and the same again', () => {
    const first = costOf(quote, candidate, assumptions);
    expect(first).toEqual(costOfQuote(quote, candidate, assumptions));
    expect(costOf({ ...quote }, { ...candidate }, { ...assumptions })).toBe(first);
  });

  it('works the cost out anew when any one figure differs', () => {
    const other = (value: unknown) => {
      if (typeof value === 'number') return value + 1;
      if (typeof value === 'boolean') return !value;
      return { CHF: 'GBP', '4.00': '5.00' }[value as string];
    };
    costOf(quote, candidate, assumptions);
    for (const [name, value] of Object.entries(quote)) {
      const changed = { ...quote, [name]: other(value) };
      expect(costOf(changed, candidate, assumptions)).toEqual(costOfQuote(changed, candidate, assumptions));
    }
    for (const [name, value] of Object.entries(candidate)) {
      const changed = { ...candidate, [name]: other(value) };
      expect(costOf(quote, changed, assumptions)).toEqual(costOfQuote(quote, changed, assumptions));
    }
    for (const change of [
      { discountRate: '0.04' },
      { vatRate: '0.19' },
      { timing: 'MIDDLE_OF_YEAR' as const },
      { exchangeRates: { CHF: '1.06' } },
    ]) {
      const changed = { ...assumptions, ...change };
      expect(costOf(quote, candidate, changed)).toEqual(costOfQuote(quote, candidate, changed));
    }
  });
});
