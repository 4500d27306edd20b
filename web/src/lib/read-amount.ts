import { conventions } from './conventions';

type ReadAmount = { amount: string } | { problem: string };

/**
 * Reads what a person typed as money: "1 234,56", "1.234,56", "1,234.56", "1234". Gives plain decimal text.
 * A lone point or comma before exactly three digits parts thousands, unless it is the decimal sign of a currency with three places.
 */
export function readAmount(text: string, fractionDigits = 2): ReadAmount {
  const typed = text.replace(/[\s\u00a0\u202f'’_]/gu, '').replace(/\u2212/gu, '-');
  if (typed === '') return { problem: 'Write an amount.' };
  if (!/^-?[\d.,]+$/u.test(typed) || !/\d/u.test(typed)) return { problem: example(fractionDigits) };
  const decimalAt = decimalPlace(typed, fractionDigits);
  const whole = decimalAt < 0 ? typed : typed.slice(0, decimalAt);
  const fraction = decimalAt < 0 ? '' : typed.slice(decimalAt + 1);
  if (!groupsAreWhole(whole) || /[.,]/u.test(fraction)) return { problem: example(fractionDigits) };
  if (fraction.length > fractionDigits) return { problem: tooFine(fractionDigits) };
  const digits = whole.replace(/[.,]/gu, '').replace(/^(-?)0+(?=\d)/u, '$1');
  const amount = `${digits === '' || digits === '-' ? `${digits}0` : digits}${fraction === '' ? '' : `.${fraction}`}`;
  return { amount };
}

/** Where the decimal sign stands in `typed`, or −1 when every sign parts thousands. */
function decimalPlace(typed: string, fractionDigits: number): number {
  const last = Math.max(typed.lastIndexOf('.'), typed.lastIndexOf(','));
  if (last < 0) return -1;
  const sign = typed[last]!;
  const bothKinds = typed.includes('.') && typed.includes(',');
  const repeated = typed.indexOf(sign) !== last;
  if (repeated) return -1;
  if (bothKinds) return last;
  if (typed.length - last - 1 !== 3) return last;
  return fractionDigits === 3 && sign === decimalSign() ? last : -1;
}

function groupsAreWhole(whole: string): boolean {
  if (!/[.,]/u.test(whole)) return /^-?\d*$/u.test(whole);
  return /^-?[1-9]\d{0,2}(\.\d{3})+$/u.test(whole) || /^-?[1-9]\d{0,2}(,\d{3})+$/u.test(whole);
}

function decimalSign(): string {
  const parts = new Intl.NumberFormat(conventions().locale).formatToParts(1.5);
  return parts.find((part) => part.type === 'decimal')?.value ?? '.';
}

function example(fractionDigits: number): string {
  return `Write the amount in digits, such as 2\u00a0400${fractionDigits > 0 ? decimalSign() + '50'.padEnd(fractionDigits, '0') : ''}.`;
}

function tooFine(fractionDigits: number): string {
  if (fractionDigits === 0) return 'Write whole units: this currency has no smaller ones.';
  return `Write at most ${fractionDigits} places after the ${decimalSign() === ',' ? 'comma' : 'point'}.`;
}
