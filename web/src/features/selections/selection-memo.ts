import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { SelectionMemoFragment } from './selection-memo.generated';

/** A submitted portfolio with its memo, as frozen. */
export const SELECTION_MEMO: TypedDocumentNode<SelectionMemoFragment> = gql`
  fragment SelectionMemo on Selection {
    id
    number
    state
    version
    reason
    comment
    fingerprint
    submittedAt
    decidedAt
    submittedBy {
      id
      name
    }
    decidedBy {
      id
      name
    }
    memo {
      roundName
      runNumber
      certificateStatus
      benefit
      capital {
        amount
        currency
      }
      lifeCycleCost {
        amount
        currency
      }
      ceiling {
        amount
        currency
      }
      spendable {
        amount
        currency
      }
      leftUnderCeiling {
        amount
        currency
      }
      lines {
        code
        name
        siteName
        departmentName
        vendorName
        quoteNumber
        benefit
        mandatory
        capital {
          amount
          currency
        }
        lifeCycleCost {
          amount
          currency
        }
      }
      leftOut {
        code
        name
        reason
        benefit
        capital {
          amount
          currency
        }
      }
      cautions {
        title
        text
      }
      assumptions {
        name
        text
      }
      limitUses {
        name
        used
        least
        most
      }
    }
  }
`;

export type SelectionMemo = SelectionMemoFragment;
export type Memo = SelectionMemoFragment['memo'];
