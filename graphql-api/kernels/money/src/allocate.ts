import type { Money } from './money.js';
import { money } from './money.js';
import { MoneyError } from './money-error.js';
import type { Rate } from './rate.js';
import { addRates, rate } from './rate.js';
import { roundHalfUp, safeMinor } from './rounding.js';

export interface RoundedTogether {
  readonly total: number;
  readonly parts: readonly number[];
}

/**
 * Rounds the sum once, half up, and then its parts so that they add up to it: every part goes down to the whole
 * number below, and the units still missing go one each to the parts that lost most (largest remainder); of equals
 * the earlier is served first. No part moves by a whole unit or more, and an exact part does not move at all.
 */
export function roundTogether(parts: readonly Rate[]): RoundedTogether {
  const total = roundHalfUp(addRates(...parts));
  const floors = parts.map(({ numerator, denominator }) => floorDivide(numerator, denominator));
  const missing = total - safeMinor(floors.reduce((sum, floor) => sum + floor, 0n));
  const served = new Set(byLargestRemainder(parts, floors).slice(0, missing));
  return { total, parts: floors.map((floor, i) => safeMinor(floor) + (served.has(i) ? 1 : 0)) };
}

/** Shares an amount out by whole-number weights to the last minor unit, by largest remainder. */
export function allocate(amount: Money, shares: readonly number[]): Money[] {
  const whole = shares.reduce((sum, share) => sum + share, 0);
  if (shares.some((share) => !Number.isSafeInteger(share) || share < 0) || !(whole > 0)) {
    throw new MoneyError(
      'NOT_SHARES',
      'Shares must be whole numbers of zero or more, at least one above zero.',
    );
  }
  const sign = amount.minor < 0 ? -1 : 1;
  const parts = shares.map((share) => rate(BigInt(Math.abs(amount.minor)) * BigInt(share), BigInt(whole)));
  return roundTogether(parts).parts.map((minor) => money(sign * minor, amount.currency));
}

function byLargestRemainder(parts: readonly Rate[], floors: readonly bigint[]): number[] {
  const remainders = parts.map((part, i) => addRates(part, rate(-floors[i])));
  return parts.map((_, i) => i).sort((a, b) => compare(remainders[b], remainders[a]) || a - b);
}

function compare(left: Rate, right: Rate): number {
  const difference = left.numerator * right.denominator - right.numerator * left.denominator;
  return difference > 0n ? 1 : difference < 0n ? -1 : 0;
}

function floorDivide(numerator: bigint, denominator: bigint): bigint {
  const towardsZero = numerator / denominator;
  return numerator < 0n && towardsZero * denominator !== numerator ? towardsZero - 1n : towardsZero;
}
