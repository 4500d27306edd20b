import { MoneyError, parseMoney } from '@metewand/money';
import { InvalidInputError, type FieldProblem } from './domain-error.js';

/** One thousand million in a currency with cents: sums over a whole round then stay exact. */
const LARGEST_MINOR = 100_000_000_000;

type Minor<T> = { [K in keyof T]: T[K] extends string ? number : number | null };

/**
 * Amounts as typed to minor units of the currency, under the same names. All that do not fit it are refused at once,
 * each with its name behind `prefix`, as the validators name fields: "fields.unitPrice".
 */
export function readAmounts<T extends Record<string, string | null | undefined>>(
  currency: string,
  prefix: string,
  amounts: T,
): Minor<T> {
  const problems: FieldProblem[] = [];
  const entries = Object.entries(amounts).map(([name, text]) => {
    try {
      return [name, text == null ? null : readAmount(text, currency)];
    } catch (error) {
      if (!(error instanceof MoneyError)) throw error;
      problems.push({ field: `${prefix}${name}`, message: `${name}: ${error.message}` });
      return [name, null];
    }
  });
  if (problems.length) throw new InvalidInputError(problems);
  return Object.fromEntries(entries) as Minor<T>;
}

function readAmount(text: string, currency: string): number {
  const { minor } = parseMoney(text, currency);
  if (Math.abs(minor) > LARGEST_MINOR)
    throw new MoneyError('TOO_LARGE', `${text} is more than can be planned with here.`);
  return minor;
}
