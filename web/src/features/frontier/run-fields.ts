import { gql } from '@apollo/client';

/** What changes while a search goes on. */
export const RUN_PROGRESS_FIELDS = gql`
  fragment RunProgressFields on Run {
    id
    number
    state
    costAxis
    createdAt
    startedAt
    finishedAt
    stopRequested
    notes
    failure
    kneeIndex
    ceiling {
      amount
      currency
    }
    progress {
      lookedAt
      kept
      share
    }
    certificate {
      status
      gapPercent
      provenShare
      provenStretches
      bound {
        costs
        benefits
      }
    }
    points {
      benefit
      atMostMore
      picks
      cost {
        amount
        currency
      }
      capital {
        amount
        currency
      }
    }
  }
`;

/** All of a run: what changes, what was frozen with it, and the many points of the chart. */
export const RUN_FIELDS = gql`
  fragment RunFields on Run {
    ...RunProgressFields
    items {
      candidateId
      code
      name
      siteName
      departmentName
      vendorName
      benefit
      mandatory
    }
    leftOut {
      candidateId
      code
      name
      reason
      mandatory
    }
    lookedAt {
      costs
      benefits
    }
    onceKept {
      costs
      benefits
    }
  }
  ${RUN_PROGRESS_FIELDS}
`;
