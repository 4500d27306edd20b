import { MoneyError } from './money-error.js';

/** An exact fraction: an exchange rate, a VAT rate, a share. Always in lowest terms, denominator above zero. */
export interface Rate {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

export function rate(numerator: bigint, denominator: bigint = 1n): Rate {
  if (denominator === 0n) throw new MoneyError('NOT_A_RATE', 'A rate cannot have zero below its line.');
  const divisor = greatestCommonDivisor(numerator, denominator) * (denominator < 0n ? -1n : 1n);
  return Object.freeze({ numerator: numerator / divisor, denominator: denominator / divisor });
}

/** Reads a decimal such as "0.035" or "-1.5" without losing a digit. Percent signs and exponents are refused. */
export function parseRate(text: string): Rate {
  const parts = /^(-?)(\d{1,30})(?:\.(\d{1,30}))?$/.exec(text);
  if (!parts)
    throw new MoneyError('NOT_A_RATE', `"${text}" is not a rate; expected a decimal such as 0.035.`);
  const [, sign, whole, decimals = ''] = parts;
  return rate(BigInt(`${sign}${whole}${decimals}`), 10n ** BigInt(decimals.length));
}

/** The exact value of a floating-point number, so that sums of such numbers no longer depend on their order. */
export function rateOfNumber(value: number): Rate {
  if (!Number.isFinite(value)) throw new MoneyError('NOT_A_RATE', `${value} is not a finite number.`);
  let scaled = value;
  let denominator = 1n;
  while (!Number.isInteger(scaled)) {
    scaled *= 2;
    denominator *= 2n;
  }
  return rate(BigInt(scaled), denominator);
}

/** The nearest floating-point number; where the fraction's own numbers are beyond 2^53, to 20 decimals. */
export function rateToNumber({ numerator, denominator }: Rate): number {
  const [top, bottom] = [Number(numerator), Number(denominator)];
  if (Number.isSafeInteger(top) && Number.isSafeInteger(bottom)) return top / bottom;
  const whole = numerator / denominator;
  return Number(whole) + Number(((numerator - whole * denominator) * 10n ** 20n) / denominator) / 1e20;
}

export function addRates(...rates: readonly Rate[]): Rate {
  return rates.reduce(
    (sum, next) =>
      rate(
        sum.numerator * next.denominator + next.numerator * sum.denominator,
        sum.denominator * next.denominator,
      ),
    rate(0n),
  );
}

export function multiplyRates(...rates: readonly Rate[]): Rate {
  return rates.reduce(
    (product, next) => rate(product.numerator * next.numerator, product.denominator * next.denominator),
    rate(1n),
  );
}

export function invertRate({ numerator, denominator }: Rate): Rate {
  return rate(denominator, numerator);
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [left, right] = [a < 0n ? -a : a, b < 0n ? -b : b];
  while (right > 0n) [left, right] = [right, left % right];
  return left;
}
