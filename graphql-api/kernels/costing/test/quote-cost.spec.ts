import type {
  CandidateFigures,
  CostAssumptions,
  CostPartKind,
  QuoteCost,
  QuoteFigures,
} from '../src/index.js';
import { chooseQuote, CostingError, costOfQuote, lifeCycleCost, quoteFaults } from '../src/index.js';

const aQuote = (changes: Partial<QuoteFigures> = {}): QuoteFigures => ({
  currency: 'EUR',
  pricesIncludeVat: false,
  unitPriceMinor: 1_000_000,
  quantity: 2,
  deliveryMinor: 10_000,
  installationMinor: 20_000,
  trainingMinor: 5_000,
  discountMinor: 100_000,
  warrantyYears: 2,
  serviceYearlyMinor: 80_000,
  ...changes,
});

const aCandidate = (changes: Partial<CandidateFigures> = {}): CandidateFigures => ({
  usefulLifeYears: 8,
  residualPercent: '2.5',
  worksNetMinor: 50_000,
  consumablesYearlyMinor: 30_001,
  energyYearlyMinor: 12_345,
  currentRunningYearlyMinor: 150_000,
  ...changes,
});

const assumptions = (changes: Partial<CostAssumptions> = {}): CostAssumptions => ({
  currency: 'EUR',
  discountRate: '0.035',
  vatRate: '0.2',
  timing: 'END_OF_YEAR',
  exchangeRates: { CHF: '1.0533', JPY: '0.0061', KWD: '3.01' },
  ...changes,
});

const partOf = (cost: QuoteCost, kind: CostPartKind) => cost.parts.find((part) => part.kind === kind)!;
const sumPresent = (parts: readonly { presentMinor: number }[]) =>
  parts.reduce((sum, part) => sum + part.presentMinor, 0);

function fieldRefused(quote: QuoteFigures, candidate = aCandidate(), round = assumptions()) {
  try {
    costOfQuote(quote, candidate, round);
  } catch (error) {
    if (error instanceof CostingError) return error.field;
    throw error;
  }
  return 'none';
}

describe('the cost of a quote', () => {
  it('opens the capital into its parts, discount off the units, works with VAT', () => {
    const cost = costOfQuote(aQuote(), aCandidate(), assumptions());
    expect(partOf(cost, 'ACQUISITION').amountMinor).toBe(2_280_000);
    expect(partOf(cost, 'DELIVERY').amountMinor).toBe(12_000);
    expect(partOf(cost, 'INSTALLATION').amountMinor).toBe(24_000);
    expect(partOf(cost, 'TRAINING').amountMinor).toBe(6_000);
    expect(partOf(cost, 'WORKS').amountMinor).toBe(60_000);
    expect(cost.capitalGrossMinor).toBe(2_382_000);
  });

  it.each(['END_OF_YEAR', 'MIDDLE_OF_YEAR'] as const)(
    'agrees with the general life-cycle cost, paid %s',
    (timing) => {
      const cost = costOfQuote(aQuote(), aCandidate(), assumptions({ timing }));
      const yearly = [{ amount: 80_000, firstYear: 3 }, { amount: 30_001 }, { amount: 12_345 }];
      const general = lifeCycleCost({
        rate: 0.035,
        years: 8,
        initial: 2_382_000,
        yearly,
        residual: 50_000,
        timing,
      });
      expect(Math.abs(cost.lifeCycleCostMinor - general.total)).toBeLessThanOrEqual(0.5 + 1e-6);
      expect(sumPresent(cost.parts)).toBe(cost.lifeCycleCostMinor);
      expect(sumPresent(cost.years)).toBe(cost.lifeCycleCostMinor);
    },
  );

  it('shows each later part as amount × factor over its years', () => {
    const cost = costOfQuote(aQuote(), aCandidate(), assumptions());
    expect(partOf(cost, 'SERVICE')).toMatchObject({ amountMinor: 80_000, firstYear: 3, lastYear: 8 });
    expect(partOf(cost, 'RESIDUAL')).toMatchObject({ amountMinor: -50_000, firstYear: 8, lastYear: 8 });
    for (const part of cost.parts) {
      expect(Math.abs(part.amountMinor * part.factor - part.presentMinor)).toBeLessThan(1);
    }
    expect(cost.equivalentAnnualCostMinor).toBe(
      Math.round(cost.lifeCycleCostMinor * cost.capitalRecoveryFactor),
    );
  });

  it('lists what is paid in each year', () => {
    const { years } = costOfQuote(aQuote(), aCandidate(), assumptions());
    expect(years.map(({ year }) => year)).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8]);
    expect(years.map(({ serviceMinor }) => serviceMinor)).toEqual([
      0,
      0,
      0,
      ...Array<number>(6).fill(80_000),
    ]);
    expect(years[0]).toMatchObject({
      capitalMinor: 2_382_000,
      totalMinor: 2_382_000,
      presentMinor: 2_382_000,
    });
    expect(years[8].totalMinor).toBe(80_000 + 30_001 + 12_345 - 50_000);
  });

  it('counts a replaced unit that cost more to run as a saving', () => {
    const cost = costOfQuote(aQuote(), aCandidate(), assumptions());
    expect(cost.runningYearlyGrossMinor).toBe(122_346);
    expect(cost.incrementalRunningYearlyMinor).toBe(-27_654);
  });

  it('counts energy saved elsewhere as a cost below zero', () => {
    const cost = costOfQuote(aQuote(), aCandidate({ energyYearlyMinor: -250_000 }), assumptions());
    expect(partOf(cost, 'ENERGY').presentMinor).toBeLessThan(-250_000);
    expect(cost.runningYearlyGrossMinor).toBe(-139_999);
    expect(sumPresent(cost.parts)).toBe(cost.lifeCycleCostMinor);
  });

  it('gives the same for prices quoted with VAT as for the net prices behind them', () => {
    const gross = aQuote({
      pricesIncludeVat: true,
      unitPriceMinor: 1_200_000,
      deliveryMinor: 12_000,
      installationMinor: 24_000,
      trainingMinor: 6_000,
      discountMinor: 120_000,
    });
    expect(costOfQuote(gross, aCandidate(), assumptions())).toEqual(
      costOfQuote(aQuote(), aCandidate(), assumptions()),
    );
  });

  it('converts before it rounds, and its capital parts still add up', () => {
    const quote = aQuote({
      currency: 'CHF',
      deliveryMinor: 10_001,
      installationMinor: 20_003,
      trainingMinor: 5_007,
    });
    const cost = costOfQuote(quote, aCandidate({ worksNetMinor: 50_001 }), assumptions());
    // (1 900 000 + 10 001 + 20 003 + 5 007) × 1.0533 × 1.2 + 50 001 × 1.2 = 2 505 777.70356
    expect(cost.capitalGrossMinor).toBe(2_505_778);
    expect(sumPresent(cost.parts.slice(0, 5))).toBe(2_505_778);
    expect(partOf(cost, 'SERVICE').amountMinor).toBe(84_264);
  });

  it('converts from currencies with no or with three decimals', () => {
    const quote = (currency: string, unitPriceMinor: number) =>
      aQuote({
        currency,
        unitPriceMinor,
        quantity: 1,
        deliveryMinor: 0,
        installationMinor: 0,
        trainingMinor: 0,
        discountMinor: 0,
      });
    const acquisition = (currency: string, unitPriceMinor: number) =>
      partOf(costOfQuote(quote(currency, unitPriceMinor), aCandidate(), assumptions()), 'ACQUISITION')
        .amountMinor;
    expect(acquisition('JPY', 1_000_000)).toBe(732_000);
    expect(acquisition('KWD', 1_000_000)).toBe(361_200);
  });

  it('never pays for service when the warranty covers the whole life', () => {
    const cost = costOfQuote(aQuote({ warrantyYears: 8 }), aCandidate(), assumptions());
    expect(partOf(cost, 'SERVICE')).toMatchObject({ factor: 0, presentMinor: 0 });
  });

  it('says when service was counted as nothing for want of a price', () => {
    const cost = costOfQuote(aQuote({ serviceYearlyMinor: null }), aCandidate(), assumptions());
    expect(cost.servicePriceMissing).toBe(true);
    expect(cost.runningYearlyGrossMinor).toBe(42_346);
    expect(
      costOfQuote(aQuote({ serviceYearlyMinor: 0 }), aCandidate(), assumptions()).servicePriceMissing,
    ).toBe(false);
  });

  it('divides evenly over the life without interest', () => {
    const bare = aCandidate({ usefulLifeYears: 4, residualPercent: '0', worksNetMinor: 0 });
    const cost = costOfQuote(aQuote(), bare, assumptions({ discountRate: '0' }));
    expect(cost.lifeCycleCostMinor).toBe(cost.capitalGrossMinor + 2 * 80_000 + 4 * 42_346);
    expect(cost.equivalentAnnualCostMinor).toBe(cost.lifeCycleCostMinor / 4);
  });
});

describe('what cannot be costed', () => {
  it.each([
    ['unitPriceMinor', { unitPriceMinor: -1 }],
    ['unitPriceMinor', { unitPriceMinor: 0.5 }],
    ['unitPriceMinor × quantity', { unitPriceMinor: Number.MAX_SAFE_INTEGER }],
    ['quantity', { quantity: 0 }],
    ['warrantyYears', { warrantyYears: -1 }],
    ['serviceYearlyMinor', { serviceYearlyMinor: -1 }],
    ['discountMinor', { discountMinor: 9_000_000 }],
    ['currency', { currency: 'XYZ' }],
    ['exchangeRates.GBP', { currency: 'GBP' }],
  ])('refuses a quote by its %s', (field, changes) => {
    expect(fieldRefused(aQuote(changes))).toBe(field);
  });

  it.each([
    ['usefulLifeYears', { usefulLifeYears: 0 }],
    ['residualPercent', { residualPercent: '101' }],
    ['residualPercent', { residualPercent: 'some' }],
    ['worksNetMinor', { worksNetMinor: -1 }],
    ['energyYearlyMinor', { energyYearlyMinor: 0.5 }],
  ])('refuses a candidate by its %s', (field, changes) => {
    expect(fieldRefused(aQuote(), aCandidate(changes))).toBe(field);
  });

  it.each([
    ['discountRate', { discountRate: '-1' }],
    ['discountRate', { discountRate: '3.5 %' }],
    ['vatRate', { vatRate: '-0.2' }],
    ['exchangeRates.CHF', { exchangeRates: { CHF: '0' } }],
    ['timing', { timing: 'SOMETIMES' as 'END_OF_YEAR' }],
  ])('refuses assumptions by their %s', (field, changes) => {
    expect(fieldRefused(aQuote({ currency: 'CHF' }), aCandidate(), assumptions(changes))).toBe(field);
  });
});

describe('which quote to keep', () => {
  const rules = { decisionDate: '2027-02-15', longestLeadWeeks: 48 };
  const sound = { validUntil: '2027-02-15', serviceYearlyMinor: 0, leadWeeks: 48 };

  it('holds a quote good to its last day, free service and the longest lead time', () => {
    expect(quoteFaults(sound, rules)).toEqual([]);
  });

  it('names every fault', () => {
    const faulty = { validUntil: '2027-02-14', serviceYearlyMinor: null, leadWeeks: 49 };
    expect(quoteFaults(faulty, rules)).toEqual(['RUN_OUT', 'SERVICE_PRICE_MISSING', 'LEAD_TIME_TOO_LONG']);
  });

  it.each(['2027-02-30', '15.02.2027', '', '2027-2-5'])('refuses %p as a day', (validUntil) => {
    expect(() => quoteFaults({ ...sound, validUntil }, rules)).toThrow(
      'validUntil must be a day such as 2027-02-15',
    );
  });

  it('takes the lowest annual cost, then the lower capital, then the first id, and nothing if all have faults', () => {
    const costed = (
      id: string,
      equivalentAnnualCostMinor: number,
      capitalGrossMinor: number,
      faults: 'RUN_OUT'[] = [],
    ) => ({
      id,
      faults,
      cost: { equivalentAnnualCostMinor, capitalGrossMinor },
    });
    const quotes = [
      costed('d', 10, 90),
      costed('c', 10, 80),
      costed('b', 10, 80),
      costed('a', 5, 70, ['RUN_OUT']),
    ];
    expect(chooseQuote(quotes)?.id).toBe('b');
    expect(chooseQuote(quotes.slice(3))).toBeUndefined();
  });
});
