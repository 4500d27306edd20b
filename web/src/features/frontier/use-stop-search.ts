import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { useState } from 'react';
import { errorMessage } from '../../lib/error-code';
import type { StopSearchMutation, StopSearchMutationVariables } from './use-stop-search.generated';

const STOP_SEARCH: TypedDocumentNode<StopSearchMutation, StopSearchMutationVariables> = gql`
  mutation StopSearch($runId: ID!) {
    stopSearch(runId: $runId) {
      id
      stopRequested
    }
  }
`;

/** Ends a search early; what it has found is kept. */
export function useStopSearch() {
  const [stopSearch, { loading }] = useMutation(STOP_SEARCH);
  const [problem, setProblem] = useState<string>();
  async function stop(runId: string) {
    try {
      setProblem(undefined);
      await stopSearch({ variables: { runId } });
    } catch (error) {
      setProblem(errorMessage(error));
    }
  }
  return { stop, loading, problem };
}
