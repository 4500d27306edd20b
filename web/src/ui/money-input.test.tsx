import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, test, vi } from 'vitest';
import { setConventions } from '../lib/conventions';
import { MoneyInput } from './money-input';

test('says how it read the amount and hands it on as decimal text', async () => {
  setConventions({ locale: 'de-DE', timeZone: 'Europe/Berlin' });
  const onAmount = vi.fn();
  render(
    <form aria-label="Quote">
      <MoneyInput label="Unit price" name="unitPrice" currency="EUR" onAmount={onAmount} />
    </form>,
  );
  await userEvent.type(screen.getByLabelText('Unit price'), '1,234.5');
  expect(screen.getByLabelText('Unit price')).toHaveAccessibleDescription(/Read as 1.234,50.€/);
  expect(new FormData(screen.getByRole<HTMLFormElement>('form', { name: 'Quote' })).get('unitPrice')).toBe(
    '1234.5',
  );
  expect(onAmount).toHaveBeenLastCalledWith('1234.5');
});

test('says how to write it once the field is left', async () => {
  render(<MoneyInput label="Unit price" name="unitPrice" currency="EUR" />);
  await userEvent.type(screen.getByLabelText('Unit price'), 'twelve');
  expect(screen.getByLabelText('Unit price')).toBeValid();
  await userEvent.tab();
  expect(screen.getByLabelText('Unit price')).toBeInvalid();
  expect(screen.getByLabelText('Unit price')).toHaveAccessibleDescription(/Write the amount in digits/);
});
