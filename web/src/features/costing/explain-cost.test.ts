import { beforeAll, describe, expect, it } from 'vitest';
import { setConventions } from '../../lib/conventions';
import { aCandidateWithQuotes, aQuote, someTerms } from '../../test/quote-factories';
import { annualFactor, endFactor, yearlyFactor } from './discount';
import { explanations } from './explain-cost';

beforeAll(() => setConventions({ locale: 'en-GB', timeZone: 'UTC' }));

const { candidate } = aCandidateWithQuotes([]);
const plain = (inputs: { name: string; value: string }[]) =>
  inputs.map(({ name, value }) => `${name}: ${value.replaceAll('\u00a0', ' ')}`);

describe('the factors shown beside a present value', () => {
  const terms = { discountRate: '0.03', paymentTiming: 'END_OF_YEAR' } as const;

  // NIST Handbook 135 supplements, DOE 3.0 % real: 8.53 for ten years, .744 for the tenth.
  it('agree with the published tables', () => {
    expect(yearlyFactor(terms, 1, 10)).toBeCloseTo(8.53, 2);
    expect(endFactor(terms, 10)).toBeCloseTo(0.744, 3);
  });

  it('start after the warranty', () => {
    expect(yearlyFactor(terms, 3, 4)).toBeCloseTo(1.03 ** -3 + 1.03 ** -4, 12);
    expect(yearlyFactor(terms, 5, 4)).toBe(0);
  });

  it('move payments of the middle of the year half a year nearer, but not a resale', () => {
    const middle = { ...terms, paymentTiming: 'MIDDLE_OF_YEAR' } as const;
    expect(yearlyFactor(middle, 1, 8)).toBeCloseTo(yearlyFactor(terms, 1, 8) * Math.sqrt(1.03), 12);
    expect(endFactor(middle, 8)).toBe(endFactor(terms, 8));
  });

  it('spread a cost evenly without interest too', () => {
    expect(annualFactor({ ...terms, discountRate: '0' }, 8)).toBe(0.125);
    expect(annualFactor(terms, 10) * yearlyFactor(terms, 1, 10)).toBeCloseTo(1, 12);
  });
});

describe('what goes into a figure', () => {
  const explained = explanations(someTerms(), candidate);

  it('names the vendor’s price, the VAT on top and, for another currency, the rate with its date', () => {
    const quote = aQuote({ unitPrice: { __typename: 'Money', amount: '62000.00', currency: 'CHF' } });
    expect(plain(explained.acquisition.inputs(quote))).toEqual([
      'Unit price: CHF 62 000.00',
      'Quantity: 1',
      'Discount: €0.00',
      'Exchange rate: 1.05 (1 Sep 2026)',
      'VAT: 20 % on top',
    ]);
  });

  it('counts service from the year after the warranty', () => {
    expect(plain(explained.service.inputs(aQuote()))).toEqual([
      'Yearly, with VAT: €5 200.00',
      'Years: 3 to 8, after 2 of warranty',
      'Factor: 4.9743',
    ]);
  });

  it('says when the warranty leaves no year to pay for', () => {
    expect(plain(explained.service.inputs(aQuote({ warrantyYears: 10 })))).toContain(
      'Years: none, the warranty covers all',
    );
  });

  it('says that a quote names no price for service', () => {
    expect(plain(explained.service.inputs(aQuote({ serviceYearly: null })))).toEqual([
      'Yearly price: the quote names none',
    ]);
  });
});
