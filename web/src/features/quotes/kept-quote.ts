import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { KeptQuoteFragment } from './kept-quote.generated';

/** By which quote a candidate counts, and why. */
export const KEPT_QUOTE: TypedDocumentNode<KeptQuoteFragment> = gql`
  fragment KeptQuote on Candidate {
    id
    version
    keptReason
    quoteInForceReason
    quoteInForce {
      id
    }
    quotes {
      id
      number
      faults
      inForce
      vendor {
        id
        name
      }
    }
  }
`;

export type KeptQuote = KeptQuoteFragment;

export type KeptState =
  | { kind: 'kept'; vendor: string; number: string }
  | { kind: 'rule'; vendor: string; number: string }
  /** One was kept by hand, but can no longer be bought by. */
  | { kind: 'lapsed'; vendor: string; number: string }
  | { kind: 'none' };

export function keptState({ quotes, quoteInForceReason, keptReason }: KeptQuote): KeptState {
  const inForce = quotes.find((quote) => quote.inForce);
  if (!inForce) return { kind: 'none' };
  const names = { vendor: inForce.vendor.name, number: inForce.number };
  if (quoteInForceReason === 'KEPT') return { kind: 'kept', ...names };
  return { kind: keptReason ? 'lapsed' : 'rule', ...names };
}
