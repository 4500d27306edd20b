import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type { CandidateDetailsFragment, TakesFragment } from './candidate-details.generated';

/** What the panel and the form show of one candidate. */
export const CANDIDATE_DETAILS: TypedDocumentNode<CandidateDetailsFragment> = gql`
  fragment CandidateDetails on Candidate {
    id
    code
    name
    version
    need
    kind
    genericGroup
    quantity
    usefulLifeYears
    residualPercent
    installationDays
    floorAreaM2
    mandatory
    mandatoryReason
    siteNeeds
    keptReason
    quoteInForceReason
    department {
      id
      name
    }
    site {
      id
      name
    }
    worksNet {
      amount
      currency
    }
    consumablesYearly {
      amount
      currency
    }
    energyYearly {
      amount
      currency
    }
    currentRunningYearly {
      amount
      currency
    }
    benefit {
      points
      missingScores
    }
    quotes {
      id
      number
      validUntil
      leadWeeks
      faults
      inForce
      vendor {
        id
        name
      }
      cost {
        lifeCycleCost {
          amount
          currency
        }
      }
    }
    quoteInForce {
      id
      cost {
        capital {
          amount
          currency
        }
        lifeCycleCost {
          amount
          currency
        }
        addedRunningYearly {
          amount
          currency
        }
      }
    }
    links {
      id
      kind
      least
      most
      reason
      candidate {
        id
        code
        name
        quoteInForce {
          id
          cost {
            capital {
              amount
              currency
            }
          }
        }
      }
      members {
        id
        code
        name
        quoteInForce {
          id
          cost {
            capital {
              amount
              currency
            }
          }
        }
      }
    }
  }
`;

/** The limits of the round that a candidate may take up. */
export const TAKES: TypedDocumentNode<TakesFragment> = gql`
  fragment Takes on Round {
    id
    stage
    limits {
      id
      measure
      most
      site {
        id
      }
    }
  }
`;
