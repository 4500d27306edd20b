import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { useState } from 'react';
import { errorMessage } from '../../lib/error-code';
import { VIEWER } from '../../lib/viewer';
import type {
  SubmitSelectionMutation,
  SubmitSelectionMutationVariables,
} from './use-submit-selection.generated';

const SUBMIT_SELECTION: TypedDocumentNode<SubmitSelectionMutation, SubmitSelectionMutationVariables> = gql`
  mutation SubmitSelection($input: SubmitSelectionInput!) {
    submitSelection(input: $input) {
      ... on Selection {
        id
      }
      ... on SelectionAlreadyOpen {
        message
      }
      ... on RunOutdated {
        message
      }
    }
  }
`;

interface Submission {
  runId: string;
  pointIndex: number;
  reason: string;
}

/** Sends a portfolio for approval; gives true when it went, and keeps the reason when it was refused. */
export function useSubmitSelection() {
  // The round steps on to Decide, which the strip and the navigation show.
  const [submitSelection, { loading }] = useMutation(SUBMIT_SELECTION, {
    refetchQueries: [{ query: VIEWER }],
  });
  const [refusal, setRefusal] = useState<string>();
  async function submit(input: Submission): Promise<boolean> {
    setRefusal(undefined);
    try {
      const { data } = await submitSelection({ variables: { input } });
      const result = data!.submitSelection;
      if (result.__typename === 'Selection') return true;
      setRefusal(result.message);
    } catch (error) {
      setRefusal(errorMessage(error));
    }
    return false;
  }
  return { submit, loading, refusal };
}
