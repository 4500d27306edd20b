import { fieldsOf } from './quote-figures';
import type { QuoteFigures } from './quote-figures';

/** What the form begins with; numbers not known yet are empty. */
export type StartFigures = {
  [Name in keyof Fields]: Fields[Name] extends number ? number | '' : Fields[Name];
};

type Fields = ReturnType<typeof fieldsOf>;

export function startFigures(
  quote: QuoteFigures | undefined,
  { currency, quantity }: { currency: string; quantity: number },
): StartFigures {
  if (quote) return fieldsOf(quote);
  return {
    vendorName: '',
    number: '',
    quoteDate: '',
    validUntil: '',
    currency,
    pricesIncludeVat: false,
    unitPrice: '',
    quantity,
    discount: '0',
    delivery: '0',
    installation: '0',
    training: '0',
    warrantyYears: '',
    serviceTier: '',
    serviceYearly: '',
    leadWeeks: '',
    incoterm: '',
    namedPlace: '',
    paymentTerms: '',
  };
}
