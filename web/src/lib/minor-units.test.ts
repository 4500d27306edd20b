import { expect, it } from 'vitest';
import { difference } from './minor-units';

it.each([
  ['2304000.00', '2300556.00', 'EUR', '3444.00'],
  ['10', '10.05', 'EUR', '-0.05'],
  ['500', '1200', 'JPY', '-700'],
  ['1.250', '0.005', 'KWD', '1.245'],
])('takes exactly from %s the amount %s', (from, what, currency, amount) => {
  expect(difference({ amount: from, currency }, { amount: what, currency })).toEqual({ amount, currency });
});
