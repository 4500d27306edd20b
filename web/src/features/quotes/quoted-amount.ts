import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { Amount } from '../../lib/money';
import { fromMinor, toMinor } from '../../lib/minor-units';
import type { QuotedAmountFragment } from './quoted-amount.generated';

export const QUOTED_AMOUNT: TypedDocumentNode<QuotedAmountFragment> = gql`
  fragment QuotedAmount on Quote {
    id
    quantity
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
  }
`;

/** All that the vendor asks now, in the vendor's currency, with or without VAT as on the quote. */
export function quotedAmount(quote: Omit<QuotedAmountFragment, 'id' | '__typename'>): Amount {
  const { unitPrice, quantity, delivery, installation, training, discount } = quote;
  const extras = toMinor(delivery) + toMinor(installation) + toMinor(training);
  return fromMinor(toMinor(unitPrice) * quantity + extras - toMinor(discount), unitPrice.currency);
}
