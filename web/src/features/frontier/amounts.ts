import { minorDigits } from '../../lib/money';
import type { Amount } from '../../lib/money';

/** `from` less `what`, exact to the minor unit. Both are in the same currency. */
export function difference(from: Amount, what: Amount): Amount {
  const digits = minorDigits(from.currency);
  const minor = minorOf(from.amount, digits) - minorOf(what.amount, digits);
  return { amount: decimalOf(minor, digits), currency: from.currency };
}

function minorOf(amount: string, digits: number): bigint {
  const [whole = '0', fraction = ''] = amount.split('.');
  return BigInt(whole + fraction.padEnd(digits, '0').slice(0, digits));
}

function decimalOf(minor: bigint, digits: number): string {
  const sign = minor < 0n ? '-' : '';
  const text = String(minor < 0n ? -minor : minor).padStart(digits + 1, '0');
  if (digits === 0) return sign + text;
  return `${sign}${text.slice(0, -digits)}.${text.slice(-digits)}`;
}
