import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { Decision } from '../../generated/graphql';
import type {
  DecideSelectionMutation,
  DecideSelectionMutationVariables,
} from './use-decide-selection.generated';

const DECIDE_SELECTION: TypedDocumentNode<DecideSelectionMutation, DecideSelectionMutationVariables> = gql`
  mutation DecideSelection($input: DecideSelectionInput!) {
    decideSelection(input: $input) {
      ... on Selection {
        id
        state
        version
      }
      ... on SelectionAlreadyDecided {
        message
      }
      ... on OwnSubmission {
        message
      }
      ... on CommentNeeded {
        message
      }
    }
  }
`;

/** Approves, returns or declines. Gives the refusal in words, or nothing when it was done. */
export function useDecideSelection() {
  const [decideSelection, { loading }] = useMutation(DECIDE_SELECTION, { refetchQueries: 'active' });
  async function decide(selection: { id: string; version: number }, decision: Decision, comment: string) {
    const input = { id: selection.id, version: selection.version, decision, comment };
    const { data } = await decideSelection({ variables: { input } });
    const result = data?.decideSelection;
    return result && result.__typename !== 'Selection' ? result.message : undefined;
  }
  return { decide, loading };
}
