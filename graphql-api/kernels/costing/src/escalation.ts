import { checkRate } from './checks.js';

/** 1+E = (1+e)(1+I): a real rate or price rise with general inflation put back in (GSA P-100 Table 1-1). */
export function nominalRate(real: number, inflation: number): number {
  checkRate('real', real);
  checkRate('inflation', inflation);
  return real + inflation + real * inflation;
}

/** e = (E−I)/(1+I): a nominal rate or price rise with general inflation taken out (GSA P-100 Table 1-1). */
export function realRate(nominal: number, inflation: number): number {
  checkRate('nominal', nominal);
  checkRate('inflation', inflation);
  return (nominal - inflation) / (1 + inflation);
}

/** A price of today after `years` yearly rises. */
export function escalate(amount: number, rise: number, years: number): number {
  checkRate('rise', rise);
  return amount * (1 + rise) ** years;
}
