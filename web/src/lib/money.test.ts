import { beforeEach, expect, test } from 'vitest';
import { setConventions } from './conventions';
import {
  currencySign,
  formatMoney,
  formatMoneyWhole,
  formatNumber,
  formatPercent,
  shortMoney,
} from './money';

const spaced = (text: string) => text.replaceAll('\u00a0', ' ');
const german = { locale: 'de-DE', timeZone: 'Europe/Berlin' };
const british = { locale: 'en-GB', timeZone: 'Europe/London' };

beforeEach(() => setConventions(german));

test('parts thousands by a no-break space, whatever the locale would do', () => {
  expect(formatMoney({ amount: '2300556.00', currency: 'EUR' })).toBe('2\u00a0300\u00a0556,00\u00a0€');
  setConventions(british);
  expect(formatMoney({ amount: '360800.40', currency: 'GBP' })).toBe('£360\u00a0800.40');
});

test('is exact beyond what a float can hold', () => {
  expect(spaced(formatMoney({ amount: '90071992547409931.07', currency: 'EUR' }))).toBe(
    '90 071 992 547 409 931,07 €',
  );
});

test('writes as many places as the currency has', () => {
  expect(spaced(formatMoney({ amount: '1234', currency: 'JPY' }))).toBe('1 234 ¥');
  expect(spaced(formatMoney({ amount: '1234.5', currency: 'KWD' }))).toMatch(/^1 234,500/);
});

test('groups four digits too, and writes a true minus', () => {
  expect(spaced(formatMoneyWhole({ amount: '-6400.00', currency: 'EUR' }))).toBe('−6 400 €');
});

test('rounds to whole units for overviews', () => {
  expect(spaced(formatMoneyWhole({ amount: '183600.50', currency: 'EUR' }))).toBe('183 601 €');
});

test.each([
  ['2265800', '2,27 M'],
  ['999500', '1 M'],
  ['100000', '100 k'],
  ['999499', '999 k'],
  ['950', '950'],
])('shortens %s to %s on charts', (amount, text) => {
  expect(spaced(shortMoney(amount))).toBe(text);
});

test('names the currency and writes numbers and shares', () => {
  expect(currencySign('GBP')).toBe('£');
  expect(spaced(formatNumber('1999.4567', 1))).toBe('1 999,5');
  expect(spaced(formatPercent(0.003, 1))).toBe('0,3 %');
});
