import { formatDecimal, money } from '@metewand/money';

const DAY = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});

/** A calendar day in running text: "15 Feb 2027". */
export function dayInWords(day: string): string {
  return DAY.format(new Date(`${day}T00:00:00Z`));
}

/** An amount in running text, to the last minor unit: "2 300 556.00 EUR", with no-break spaces. */
export function amountInWords(minor: number, currency: string): string {
  const [whole, decimals] = formatDecimal(money(minor, currency)).split('.');
  return `${decimals ? `${grouped(whole)}.${decimals}` : grouped(whole)}\u00a0${currency}`;
}

/** A figure in running text, without the zeros that say nothing: "30000.00" reads "30 000". */
export function figureInWords(decimal: string): string {
  const [whole, decimals = ''] = decimal.split('.');
  const rest = decimals.replace(/0+$/, '');
  return rest ? `${grouped(whole)}.${rest}` : grouped(whole);
}

function grouped(whole: string): string {
  return whole.replace(/\B(?=(\d{3})+$)/g, '\u00a0').replace('-', '\u2212');
}
