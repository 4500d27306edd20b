import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { StepBackRoundMutation, StepBackRoundMutationVariables } from './use-step-back-round.generated';

const STEP_BACK_ROUND: TypedDocumentNode<StepBackRoundMutation, StepBackRoundMutationVariables> = gql`
  mutation StepBackRound($input: StepBackRoundInput!) {
    stepBackRound(input: $input) {
      id
      stage
      version
    }
  }
`;

/** Takes the round one step back, with the reason that the record keeps. */
export function useStepBackRound() {
  const [stepBackRound, { loading }] = useMutation(STEP_BACK_ROUND, { refetchQueries: 'active' });
  async function stepBack(round: { id: string; version: number }, reason: string): Promise<void> {
    await stepBackRound({ variables: { input: { roundId: round.id, version: round.version, reason } } });
  }
  return { stepBack, loading };
}
