import { minorDigits } from './currency.js';
import { MoneyError } from './money-error.js';
import type { Rate } from './rate.js';
import { addRates, invertRate, multiplyRates, rate } from './rate.js';
import type { Rounding } from './rounding.js';
import { roundHalfUp, safeMinor } from './rounding.js';

/** An amount in whole minor units (cents) of one currency. Made by `money` or `parseMoney`, never by hand. */
export interface Money {
  readonly minor: number;
  readonly currency: string;
}

export function money(minor: number, currency: string): Money {
  minorDigits(currency);
  if (!Number.isSafeInteger(minor)) {
    throw new MoneyError('NOT_AN_AMOUNT', `${minor} is not a whole number of ${currency} minor units.`);
  }
  return Object.freeze({ minor: minor === 0 ? 0 : minor, currency });
}

/** Reads "1234.5" exactly. Grouping marks, exponents and more decimals than the currency has are refused. */
export function parseMoney(text: string, currency: string): Money {
  const digits = minorDigits(currency);
  const parts = /^(-?)(\d{1,30})(?:\.(\d{1,30}))?$/.exec(text);
  if (!parts) {
    throw new MoneyError(
      'NOT_AN_AMOUNT',
      `"${text}" is not an amount; expected digits with a point, such as ${example(digits)}.`,
    );
  }
  const [, sign, whole, decimals = ''] = parts;
  if (decimals.length > digits) {
    throw new MoneyError(
      'TOO_MANY_DECIMALS',
      `"${text}" has ${decimals.length} decimals; expected at most ${digits} for ${currency}.`,
    );
  }
  return money(safeMinor(BigInt(`${sign}${whole}${decimals.padEnd(digits, '0')}`)), currency);
}

/** "2300556.00": a point, no grouping, always all decimals of the currency. */
export function formatDecimal({ minor, currency }: Money): string {
  const digits = minorDigits(currency);
  const sign = minor < 0 ? '-' : '';
  const text = String(Math.abs(minor)).padStart(digits + 1, '0');
  return digits === 0 ? sign + text : `${sign}${text.slice(0, -digits)}.${text.slice(-digits)}`;
}

export function add(left: Money, right: Money): Money {
  return sum([left, right], left.currency);
}

export function subtract(left: Money, right: Money): Money {
  return add(left, negate(right));
}

export function negate({ minor, currency }: Money): Money {
  return money(-minor, currency);
}

/** The currency is asked for because a list may be empty. */
export function sum(amounts: readonly Money[], currency: string): Money {
  const stranger = amounts.find((amount) => amount.currency !== currency);
  if (stranger) {
    throw new MoneyError(
      'MIXED_CURRENCIES',
      `${stranger.currency} cannot be added to ${currency}; convert it first.`,
    );
  }
  return money(safeMinor(amounts.reduce((total, amount) => total + BigInt(amount.minor), 0n)), currency);
}

export function multiply(amount: Money, by: Rate, rounding: Rounding = roundHalfUp): Money {
  return money(rounding(multiplyRates(rate(BigInt(amount.minor)), by)), amount.currency);
}

/** One major unit of the amount's currency costs `exchangeRate` major units of the other. Rounded once, half up. */
export function convert(amount: Money, exchangeRate: Rate, toCurrency: string): Money {
  const minorRate = minorExchangeRate(exchangeRate, amount.currency, toCurrency);
  return money(multiply(amount, minorRate).minor, toCurrency);
}

/** The exchange rate between minor units, for sums that are rounded only after more steps. */
export function minorExchangeRate(exchangeRate: Rate, fromCurrency: string, toCurrency: string): Rate {
  if (exchangeRate.numerator <= 0n) {
    throw new MoneyError(
      'NOT_A_RATE',
      `The exchange rate from ${fromCurrency} to ${toCurrency} must be above zero.`,
    );
  }
  const scale = rate(10n ** BigInt(minorDigits(toCurrency)), 10n ** BigInt(minorDigits(fromCurrency)));
  return multiplyRates(exchangeRate, scale);
}

/** Adds VAT, rounded once half up. `vatRate` is 0.2 for 20 %. */
export function grossOf(net: Money, vatRate: Rate): Money {
  return multiply(net, vatFactor(vatRate));
}

/** Takes VAT out of a price that holds it, rounded once half up. */
export function netOf(gross: Money, vatRate: Rate): Money {
  return multiply(gross, invertRate(vatFactor(vatRate)));
}

function vatFactor(vatRate: Rate): Rate {
  if (vatRate.numerator < 0n) throw new MoneyError('NOT_A_RATE', 'A VAT rate cannot be below zero.');
  return addRates(rate(1n), vatRate);
}

function example(digits: number): string {
  return digits === 0 ? '1250' : `1250.${'0'.repeat(digits)}`;
}
