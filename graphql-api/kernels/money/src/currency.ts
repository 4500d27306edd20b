import { MoneyError } from './money-error.js';

// ISO 4217 minor units, from memory; a currency not listed here is refused rather than guessed.
const CODES_BY_DIGITS: Readonly<Record<number, string>> = {
  0: 'CLP ISK JPY KRW PYG UGX VND XAF XOF',
  2: 'AED AUD BGN BRL CAD CHF CNY CZK DKK EGP EUR GBP HKD HUF IDR ILS INR MAD MXN MYR NOK NZD PEN PHP PLN QAR RON RSD SAR SEK SGD THB TRY TWD UAH USD ZAR',
  3: 'BHD JOD KWD OMR TND',
};

const digitsByCode = new Map(
  Object.entries(CODES_BY_DIGITS).flatMap(([digits, codes]) =>
    codes.split(' ').map((code) => [code, Number(digits)] as const),
  ),
);

export function isKnownCurrency(code: string): boolean {
  return digitsByCode.has(code);
}

/** How many decimals the currency has: 2 for EUR, 0 for JPY, 3 for KWD. */
export function minorDigits(currency: string): number {
  const digits = digitsByCode.get(currency);
  if (digits === undefined) {
    throw new MoneyError(
      'UNKNOWN_CURRENCY',
      `"${currency}" is not a currency code known here; expected one such as EUR.`,
    );
  }
  return digits;
}
