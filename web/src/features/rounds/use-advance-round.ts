import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { AdvanceRoundMutation, AdvanceRoundMutationVariables } from './use-advance-round.generated';

const ADVANCE_ROUND: TypedDocumentNode<AdvanceRoundMutation, AdvanceRoundMutationVariables> = gql`
  mutation AdvanceRound($input: AdvanceRoundInput!) {
    advanceRound(input: $input) {
      ... on Round {
        id
        stage
        version
      }
      ... on RoundNotReady {
        message
        missing
      }
    }
  }
`;

export interface NotReady {
  message: string;
  missing: readonly string[];
}

/** Opens or closes scoring. Gives what is still missing when the round is not ready. */
export function useAdvanceRound() {
  const [advanceRound, { loading }] = useMutation(ADVANCE_ROUND, { refetchQueries: 'active' });
  async function advance(round: { id: string; version: number }): Promise<NotReady | undefined> {
    const input = { roundId: round.id, version: round.version };
    const { data } = await advanceRound({ variables: { input } });
    return data?.advanceRound.__typename === 'RoundNotReady' ? data.advanceRound : undefined;
  }
  return { advance, loading };
}
