import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { RoundCeilingFragment } from './round-ceiling.generated';

/** What may be spent in a round. The ceiling is on capital; a share of it may be held back. */
export const ROUND_CEILING: TypedDocumentNode<RoundCeilingFragment> = gql`
  fragment RoundCeiling on Round {
    id
    version
    stage
    heldBackPercent
    ceiling {
      amount
      currency
    }
    spendable {
      amount
      currency
    }
  }
`;
