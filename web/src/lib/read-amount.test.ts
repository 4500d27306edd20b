import { beforeEach, expect, test } from 'vitest';
import { setConventions } from './conventions';
import { readAmount } from './read-amount';

beforeEach(() => setConventions({ locale: 'de-DE', timeZone: 'Europe/Berlin' }));

test.each([
  ['1 234,56', '1234.56'],
  ['1.234,56', '1234.56'],
  ['1,234.56', '1234.56'],
  ['1\u00a0234\u00a0567', '1234567'],
  ['1.234.567', '1234567'],
  ['2 400 000', '2400000'],
  ['1234,5', '1234.5'],
  ['1.234', '1234'],
  ['1,234', '1234'],
  ['0.07', '0.07'],
  ['007', '7'],
  [',5', '0.5'],
  ['-6 400', '-6400'],
  ['−6 400', '-6400'],
])('reads %s as %s', (typed, amount) => {
  expect(readAmount(typed)).toEqual({ amount });
});

test.each(['', 'abc', '12 €', '1.2.3', '1,23,456', '1.234.56', '--5', '0,234', '1e6'])(
  'refuses %j and says how to write it',
  (typed) => {
    expect(readAmount(typed)).toHaveProperty('problem');
  },
);

test('refuses smaller parts than the currency has', () => {
  expect(readAmount('1234,567')).toHaveProperty('problem');
  expect(readAmount('12,5', 0)).toHaveProperty('problem');
});

test('takes a lone sign before three digits as decimal only where the currency has three places', () => {
  expect(readAmount('1,234', 3)).toEqual({ amount: '1.234' });
  expect(readAmount('1.234', 3)).toEqual({ amount: '1234' });
});
