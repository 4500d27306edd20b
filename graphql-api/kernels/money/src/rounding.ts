import { MoneyError } from './money-error.js';
import type { Rate } from './rate.js';
import { rateOfNumber } from './rate.js';

/** A named way from an exact value to a whole number of minor units. */
export type Rounding = (value: Rate | number) => number;

/** Halves away from zero, so that a credit note mirrors its invoice: 2.5 → 3, −2.5 → −3. */
export const roundHalfUp: Rounding = (value) => roundNearest(value, () => true);

/** Halves to the even neighbour: 2.5 → 2, 3.5 → 4. */
export const roundHalfEven: Rounding = (value) => roundNearest(value, (whole) => whole % 2n === 1n);

export function safeMinor(value: bigint): number {
  const minor = Number(value);
  if (!Number.isSafeInteger(minor)) {
    throw new MoneyError('TOO_LARGE', `${value} minor units are more than can be counted exactly.`);
  }
  return minor;
}

function roundNearest(value: Rate | number, halfGoesOut: (whole: bigint) => boolean): number {
  const { numerator, denominator } = typeof value === 'number' ? rateOfNumber(value) : value;
  const size = numerator < 0n ? -numerator : numerator;
  const whole = size / denominator;
  const twiceRest = (size - whole * denominator) * 2n;
  const goesOut = twiceRest > denominator || (twiceRest === denominator && halfGoesOut(whole));
  const rounded = goesOut ? whole + 1n : whole;
  return safeMinor(numerator < 0n ? -rounded : rounded);
}
