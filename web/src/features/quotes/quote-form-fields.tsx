import { useState } from 'react';
import type { FieldProblems } from '../../lib/refusal';
import type { QuoteFigures } from './quote-figures';
import { Prices, ServiceAndDelivery, WhoAndWhen } from './quote-form-groups';
import { startFigures } from './start-figures';

interface QuoteFormFieldsProps {
  quote?: QuoteFigures;
  /** Pieces that are asked for. */
  quantity: number;
  currencies: readonly [own: string, ...others: string[]];
  vatRate: number;
  problems: FieldProblems;
}

/** All fields. They begin once: news about the quote never writes over what somebody is typing. */
export function QuoteFormFields({ quote, quantity, currencies, vatRate, problems }: QuoteFormFieldsProps) {
  const [start] = useState(() => startFigures(quote, { currency: currencies[0], quantity }));
  const [currency, setCurrency] = useState(start.currency);
  const group = { start, problems };
  return (
    <>
      <WhoAndWhen {...group} />
      <Prices
        {...group}
        {...{ currencies, vatRate, currency }}
        onCurrency={(typed) => /^[A-Z]{3}$/u.test(typed) && setCurrency(typed)}
      />
      <ServiceAndDelivery {...group} currency={currency} />
    </>
  );
}
