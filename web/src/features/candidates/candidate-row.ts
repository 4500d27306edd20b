import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { CandidateRowFragment } from './candidate-row.generated';

/** One line of the table. */
export const CANDIDATE_ROW: TypedDocumentNode<CandidateRowFragment> = gql`
  fragment CandidateRow on Candidate {
    id
    code
    name
    mandatory
    department {
      id
      name
    }
    site {
      id
      name
    }
    quotes {
      id
    }
    quoteInForce {
      id
      validUntil
      vendor {
        id
        name
      }
      cost {
        capital {
          amount
          currency
        }
        lifeCycleCost {
          amount
          currency
        }
      }
    }
    benefit {
      points
      missingScores
    }
    links {
      id
      kind
      candidate {
        id
      }
      members {
        id
        code
      }
    }
  }
`;
