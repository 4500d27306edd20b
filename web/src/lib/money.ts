import { conventions } from './conventions';

/** Exact amount as the API sends it: decimal text in major units and an ISO 4217 code. */
export interface Amount {
  amount: string;
  currency: string;
}

const NO_BREAK_SPACE = '\u00a0';
const MINUS = '\u2212';

/** Exact to the minor unit, such as "2 300 556,00 €"; whole units when `whole` is asked for and nothing is lost. */
export function formatMoney(money: Amount): string {
  return write(money.amount, { style: 'currency', currency: money.currency });
}

/** Rounded to whole units, for overview tables and text: "2 265 800 €". Never in a memo. */
export function formatMoneyWhole(money: Amount): string {
  return write(money.amount, { style: 'currency', currency: money.currency, maximumFractionDigits: 0 });
}

/** Whole units without the sign, for columns whose header names the currency: "2 265 800". */
export function formatAmountWhole(money: Amount): string {
  return write(money.amount, { maximumFractionDigits: 0 });
}

/** Exact figure without the sign: "2 300 556,00". */
export function formatAmount(money: Amount): string {
  const digits = minorDigits(money.currency);
  return write(money.amount, { minimumFractionDigits: digits, maximumFractionDigits: digits });
}

/** For charts and the answer sentence only: "2.27 M", "100 k", "950". Takes major units. */
export function shortMoney(amount: string | number): string {
  const value = Number(amount);
  const size = Math.abs(value);
  if (size >= 999_500) return `${plain(value / 1e6, 2)}${NO_BREAK_SPACE}M`;
  if (size >= 1_000) return `${plain(value / 1e3, 0)}${NO_BREAK_SPACE}k`;
  return plain(value, 0);
}

/** A plain number by the group's habits; takes decimal text or a number. */
export function formatNumber(value: string | number, fractionDigits = 0): string {
  return write(String(value), {
    minimumFractionDigits: fractionDigits,
    maximumFractionDigits: fractionDigits,
  });
}

/** Percent of a share, such as 0.035 → "3.5 %". */
export function formatPercent(share: number, fractionDigits = 0): string {
  return `${plain(share * 100, fractionDigits)}${NO_BREAK_SPACE}%`;
}

/** "€" for EUR, "£" for GBP, the code where the locale has no sign. */
export function currencySign(currency: string): string {
  const parts = new Intl.NumberFormat(conventions().locale, {
    style: 'currency',
    currency,
    currencyDisplay: 'narrowSymbol',
  }).formatToParts(0);
  return parts.find((part) => part.type === 'currency')?.value ?? currency;
}

/** Decimal places of a currency: 2 for EUR, 0 for JPY, 3 for KWD. */
export function minorDigits(currency: string): number {
  return (
    new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions().maximumFractionDigits ?? 2
  );
}

function plain(value: number, fractionDigits: number): string {
  return write(String(value), { maximumFractionDigits: fractionDigits });
}

// Intl takes decimal text as it is, so that no figure passes through a float. Thousands are always parted by a
// no-break space: a point or comma there would be read differently from one country to the next.
function write(decimal: string, options: Intl.NumberFormatOptions): string {
  return new Intl.NumberFormat(conventions().locale, {
    currencyDisplay: 'narrowSymbol',
    ...options,
    useGrouping: 'always',
  })
    .formatToParts(decimal as `${number}`)
    .map(house)
    .join('');
}

function house(part: Intl.NumberFormatPart): string {
  if (part.type === 'group') return NO_BREAK_SPACE;
  if (part.type === 'minusSign') return MINUS;
  return part.value;
}
