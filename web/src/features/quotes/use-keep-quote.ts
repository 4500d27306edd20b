import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { refusalOf } from '../../lib/refusal';
import { useReload } from '../../lib/use-reload';
import type { KeepQuoteMutation, KeepQuoteMutationVariables } from './use-keep-quote.generated';

const KEEP_QUOTE: TypedDocumentNode<KeepQuoteMutation, KeepQuoteMutationVariables> = gql`
  mutation KeepQuote($input: KeepQuoteInput!) {
    keepQuote(input: $input) {
      ... on Candidate {
        id
        version
        keptReason
      }
      ... on QuoteNotUsable {
        message
      }
    }
  }
`;

/** Keeps a quote, or with `quoteId` null goes back to the round's rule. Gives the refusal's words, nothing when it is done. */
export function useKeepQuote(candidate: { id: string; version: number }) {
  const reload = useReload();
  const [keepQuote, { loading }] = useMutation(KEEP_QUOTE, {
    refetchQueries: 'active',
    awaitRefetchQueries: true,
  });
  async function keep(quoteId: string | null, reason: string): Promise<string | undefined> {
    const input = { candidateId: candidate.id, version: candidate.version, quoteId, reason };
    try {
      const { data } = await keepQuote({ variables: { input } });
      return data?.keepQuote.__typename === 'QuoteNotUsable' ? data.keepQuote.message : undefined;
    } catch (error) {
      const refusal = refusalOf(error, { reason: 'The reason' });
      if (refusal.kind === 'conflict') await reload();
      return refusal.kind === 'fields' ? Object.values(refusal.problems)[0] : refusal.message;
    }
  }
  return { keep, loading };
}
