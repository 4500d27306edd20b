import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { QuoteFieldsInput } from '../../generated/graphql';
import type { QuoteFiguresFragment } from './quote-figures.generated';

/** All that the form of a quote holds. */
export const QUOTE_FIGURES: TypedDocumentNode<QuoteFiguresFragment> = gql`
  fragment QuoteFigures on Quote {
    id
    version
    number
    quoteDate
    validUntil
    pricesIncludeVat
    quantity
    warrantyYears
    serviceTier
    leadWeeks
    incoterm
    namedPlace
    paymentTerms
    vendor {
      id
      name
    }
    unitPrice {
      amount
      currency
    }
    delivery {
      amount
      currency
    }
    installation {
      amount
      currency
    }
    training {
      amount
      currency
    }
    discount {
      amount
      currency
    }
    serviceYearly {
      amount
      currency
    }
  }
`;

export type QuoteFigures = QuoteFiguresFragment;
export type QuoteFieldName = Exclude<keyof QuoteFieldsInput, 'documentId'>;

/** What each field is called on the screen. */
export const QUOTE_LABELS: Record<QuoteFieldName, string> = {
  vendorName: 'Vendor',
  number: 'Quote number',
  quoteDate: 'Date of the quote',
  validUntil: 'Valid until',
  currency: 'Currency',
  pricesIncludeVat: 'Prices include VAT',
  unitPrice: 'Price of one piece',
  quantity: 'Pieces',
  discount: 'Discount on the whole',
  delivery: 'Delivery',
  installation: 'Installation',
  training: 'Training',
  warrantyYears: 'Warranty',
  serviceTier: 'Service level',
  serviceYearly: 'Service per year',
  leadWeeks: 'Delivery time',
  incoterm: 'Delivery term',
  namedPlace: 'Named place',
  paymentTerms: 'Payment terms',
};

/** The fields as the API takes them, from a quote that is already stored. */
export function fieldsOf(quote: QuoteFigures): Required<Omit<QuoteFieldsInput, 'documentId'>> {
  const { number, quoteDate, validUntil, pricesIncludeVat, quantity, warrantyYears } = quote;
  const { serviceTier, leadWeeks, incoterm, namedPlace, paymentTerms } = quote;
  return {
    ...{ number, quoteDate, validUntil, pricesIncludeVat, quantity, warrantyYears },
    ...{ serviceTier, leadWeeks, incoterm, namedPlace, paymentTerms },
    vendorName: quote.vendor.name,
    currency: quote.unitPrice.currency,
    unitPrice: quote.unitPrice.amount,
    delivery: quote.delivery.amount,
    installation: quote.installation.amount,
    training: quote.training.amount,
    discount: quote.discount.amount,
    serviceYearly: quote.serviceYearly?.amount ?? null,
  };
}
