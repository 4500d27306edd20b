import { expect, it } from 'vitest';
import { aQuote, euros } from '../../test/quote-factories';
import { quotedAmount } from './quoted-amount';

it('adds up to the cent what the vendor asks', () => {
  const quote = aQuote({
    unitPrice: euros('0.10'),
    quantity: 3,
    delivery: euros('0.20'),
    installation: euros('0.00'),
    training: euros('100000.01'),
    discount: euros('0.50'),
  });
  expect(quotedAmount(quote)).toEqual({ amount: '100000.01', currency: 'EUR' });
});

it('knows currencies without smaller units', () => {
  const yen = (amount: string) => ({ __typename: 'Money' as const, amount, currency: 'JPY' });
  const none = yen('0');
  const quote = aQuote({
    unitPrice: yen('1200'),
    delivery: none,
    installation: none,
    training: none,
    discount: none,
  });
  expect(quotedAmount(quote)).toEqual({ amount: '1200', currency: 'JPY' });
});
