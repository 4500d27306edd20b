import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { QuoteFieldsInput } from '../../generated/graphql';
import type { FieldProblems } from '../../lib/refusal';
import { QUOTE_FIGURES } from './quote-figures';
import type { QuoteFieldName } from './quote-figures';
import type {
  CreateQuoteMutation,
  CreateQuoteMutationVariables,
  SavedQuoteFragment,
  UpdateQuoteMutation,
  UpdateQuoteMutationVariables,
} from './use-save-quote.generated';

const SAVED_QUOTE: TypedDocumentNode<SavedQuoteFragment> = gql`
  fragment SavedQuote on Quote {
    ...QuoteFigures
    faults
    cost {
      lifeCycleCost {
        amount
        currency
      }
    }
  }
  ${QUOTE_FIGURES}
`;

const CREATE_QUOTE: TypedDocumentNode<CreateQuoteMutation, CreateQuoteMutationVariables> = gql`
  mutation CreateQuote($input: CreateQuoteInput!) {
    createQuote(input: $input) {
      ...SavedQuote
      ... on UnknownCurrency {
        message
      }
      ... on QuoteNumberTaken {
        message
      }
      ... on QuoteDatesReversed {
        message
      }
      ... on DiscountExceedsPrice {
        message
      }
    }
  }
  ${SAVED_QUOTE}
`;

const UPDATE_QUOTE: TypedDocumentNode<UpdateQuoteMutation, UpdateQuoteMutationVariables> = gql`
  mutation UpdateQuote($input: UpdateQuoteInput!) {
    updateQuote(input: $input) {
      ...SavedQuote
      ... on UnknownCurrency {
        message
      }
      ... on QuoteNumberTaken {
        message
      }
      ... on QuoteDatesReversed {
        message
      }
      ... on DiscountExceedsPrice {
        message
      }
    }
  }
  ${SAVED_QUOTE}
`;

export type SavedQuote = SavedQuoteFragment;
type Result = CreateQuoteMutation['createQuote'];
type Refused = Exclude<Result['__typename'], 'Quote'>;

/** The field that each refusal is about. */
const FIELD_OF: Record<Refused, QuoteFieldName> = {
  UnknownCurrency: 'currency',
  QuoteNumberTaken: 'number',
  QuoteDatesReversed: 'validUntil',
  DiscountExceedsPrice: 'discount',
};

/** Saves a new quote of a candidate, or a stored one. Gives the quote, or the field to mend. */
export function useSaveQuote() {
  const options = { refetchQueries: 'active', awaitRefetchQueries: true } as const;
  const [createQuote, creating] = useMutation(CREATE_QUOTE, options);
  const [updateQuote, updating] = useMutation(UPDATE_QUOTE, options);
  return {
    loading: creating.loading || updating.loading,
    create: async (candidateId: string, fields: QuoteFieldsInput) => {
      const { data } = await createQuote({ variables: { input: { candidateId, fields } } });
      return resultOf(data!.createQuote);
    },
    update: async (quote: { id: string; version: number }, fields: QuoteFieldsInput) => {
      const { id, version } = quote;
      const { data } = await updateQuote({ variables: { input: { id, version, fields } } });
      return resultOf(data!.updateQuote);
    },
  };
}

function resultOf(result: Result): { saved: SavedQuote } | { problems: FieldProblems } {
  if (result.__typename === 'Quote') return { saved: result };
  return { problems: { [FIELD_OF[result.__typename]]: result.message } };
}
