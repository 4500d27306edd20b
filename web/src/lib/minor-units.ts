import { minorDigits } from './money';
import type { Amount } from './money';

/** Whole minor units, so that sums and differences stay exact: "128.20" EUR → 12820. */
export function toMinor({ amount, currency }: Amount): number {
  return Math.round(Number(amount) * 10 ** minorDigits(currency));
}

export function fromMinor(minor: number, currency: string): Amount {
  const digits = minorDigits(currency);
  return { amount: (minor / 10 ** digits).toFixed(digits), currency };
}

/** `from` less `what`; both are in the same currency. */
export function difference(from: Amount, what: Amount): Amount {
  return fromMinor(toMinor(from) - toMinor(what), from.currency);
}

/** All of one currency. */
export function sumOf(currency: string, amounts: readonly Amount[]): Amount {
  return fromMinor(
    amounts.reduce((sum, amount) => sum + toMinor(amount), 0),
    currency,
  );
}
