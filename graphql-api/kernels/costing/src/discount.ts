import { checkRate, checkWhole } from './checks.js';

/** When the payments of a year are taken to fall due. Year 0 is now and is never discounted. */
export type Timing = 'END_OF_YEAR' | 'MIDDLE_OF_YEAR';

/** (1+d)^−t, or (1+d)^−(t−½) with payments in the middle of the year (US OMB Circular A-94). */
export function discountFactor(rate: number, year: number, timing: Timing = 'END_OF_YEAR'): number {
  checkRate('rate', rate);
  checkWhole('year', year, 0);
  const endFactor = 1 / (1 + rate) ** year;
  return timing === 'MIDDLE_OF_YEAR' && year > 0 ? endFactor * Math.sqrt(1 + rate) : endFactor;
}

/** UPV = [(1+d)^N − 1] / [d(1+d)^N], N if d = 0: worth of 1 at the end of each of N years (NIST Handbook 135). */
export function uniformPresentValue(rate: number, years: number): number {
  checkRate('rate', rate);
  checkWhole('years', years, 1);
  return rate === 0 ? years : -Math.expm1(-years * Math.log1p(rate)) / rate;
}

/** UPV* = (1+e)/(d−e) · [1 − ((1+e)/(1+d))^N], N if d = e: the same with prices rising by e (GSA P-100, ASTM E917). */
export function growingPresentValue(rate: number, growth: number, years: number): number {
  checkRate('rate', rate);
  checkRate('growth', growth);
  checkWhole('years', years, 1);
  if (rate === growth) return years;
  return ((1 + growth) / (rate - growth)) * -Math.expm1(years * (Math.log1p(growth) - Math.log1p(rate)));
}

/** A/P: the yearly payment at the end of each of N years that is worth 1 now (Newnan ch. 6). */
export function capitalRecovery(rate: number, years: number): number {
  return 1 / uniformPresentValue(rate, years);
}

/** A/F: the yearly payment at the end of each of N years that grows to 1 at the end of year N. */
export function sinkingFund(rate: number, years: number): number {
  return capitalRecovery(rate, years) * discountFactor(rate, years);
}
