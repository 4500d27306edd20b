import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import type {
  ComparedQuoteFragment,
  CostTermsFragment,
  CostedCandidateFragment,
} from './compared-quote.generated';

/** What the comparison says of a quote. */
export const COMPARED_QUOTE: TypedDocumentNode<ComparedQuoteFragment> = gql`
  fragment ComparedQuote on Quote {
    id
    number
    validUntil
    leadWeeks
    quantity
    warrantyYears
    pricesIncludeVat
    faults
    inForce
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
    cost {
      years
      capital {
        amount
        currency
      }
      lifeCycleCost {
        amount
        currency
      }
      equivalentAnnualCost {
        amount
        currency
      }
      parts {
        kind
        amount {
          amount
          currency
        }
      }
    }
  }
`;

/** By what rules of the round its quotes are costed and judged. */
export const COST_TERMS: TypedDocumentNode<CostTermsFragment> = gql`
  fragment CostTerms on Round {
    id
    decisionDate
    longestLeadWeeks
    discountRate
    paymentTiming
    vatRate
    exchangeRates {
      currency
      rate
      asOf
    }
  }
`;

/** What the candidate itself adds to the cost of each of its quotes. */
export const COSTED_CANDIDATE: TypedDocumentNode<CostedCandidateFragment> = gql`
  fragment CostedCandidate on Candidate {
    id
    usefulLifeYears
    residualPercent
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
  }
`;

export type CostedCandidate = CostedCandidateFragment;
export type ComparedQuote = ComparedQuoteFragment;
export type CostTerms = CostTermsFragment;
export type CostPartKind = ComparedQuote['cost']['parts'][number]['kind'];
