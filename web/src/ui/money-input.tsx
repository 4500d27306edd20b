import { useState } from 'react';
import { currencySign, formatAmount, formatMoney, minorDigits } from '../lib/money';
import { readAmount } from '../lib/read-amount';
import { TextField } from './field';

interface MoneyInputProps {
  label: string;
  /** Form field name: holds plain decimal text such as "1234.56", or "" while nothing readable is typed. */
  name: string;
  currency: string;
  /** Decimal text to begin with. */
  defaultValue?: string;
  help?: string;
  error?: string;
  required?: boolean;
  /** Called with decimal text whenever what was typed can be read, with "" otherwise. */
  onAmount?: (amount: string) => void;
}

/** Takes money as people write it ("1 234,56", "1.234,56", "1,234.56") and says below how it was read. */
export function MoneyInput({
  label,
  name,
  currency,
  defaultValue,
  help,
  error,
  required,
  onAmount,
}: MoneyInputProps) {
  const [typed, setTyped] = useState(() =>
    defaultValue ? formatAmount({ amount: defaultValue, currency }) : '',
  );
  const [changed, setChanged] = useState(false);
  const [left, setLeft] = useState(false);
  const read = readAmount(typed, minorDigits(currency));
  const amount = 'amount' in read ? read.amount : '';
  const problem = left && typed.trim() !== '' && 'problem' in read ? read.problem : undefined;

  function change(text: string) {
    setTyped(text);
    setChanged(true);
    const next = readAmount(text, minorDigits(currency));
    onAmount?.('amount' in next ? next.amount : '');
  }

  return (
    <>
      <TextField
        label={label}
        inputMode="decimal"
        autoComplete="off"
        value={typed}
        unit={currencySign(currency)}
        required={required}
        error={problem ?? error}
        help={changed && amount ? `Read as ${formatMoney({ amount, currency })}` : help}
        onChange={(event) => change(event.target.value)}
        onBlur={() => setLeft(true)}
      />
      <input type="hidden" name={name} value={amount} />
    </>
  );
}
