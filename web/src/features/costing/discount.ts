import type { CostTerms } from './compared-quote';

type Terms = Pick<CostTerms, 'discountRate' | 'paymentTiming'>;

/**
 * Sum of the discount factors (1+d)^−t of the years `first` to `last`, or (1+d)^−(t−½) with payments in the middle of
 * the year. Only to show beside a present value, which the API has worked out from the same factors.
 */
export function yearlyFactor(terms: Terms, first: number, last: number): number {
  const rate = Number(terms.discountRate);
  const shift = terms.paymentTiming === 'MIDDLE_OF_YEAR' ? 0.5 : 0;
  let sum = 0;
  for (let year = first; year <= last; year++) sum += (1 + rate) ** (shift - year);
  return sum;
}

/** A resale falls at the end of the last year whatever the timing of the running costs. */
export function endFactor({ discountRate }: Terms, year: number): number {
  return (1 + Number(discountRate)) ** -year;
}

/** A/P = d / (1 − (1+d)^−n), 1/n without interest: what turns a present cost into a level yearly one. */
export function annualFactor({ discountRate }: Terms, years: number): number {
  const rate = Number(discountRate);
  return rate === 0 ? 1 / years : rate / (1 - (1 + rate) ** -years);
}
