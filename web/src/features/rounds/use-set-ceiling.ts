import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { SetCeilingInput } from '../../generated/graphql';
import { ROUND_CEILING } from './round-ceiling';
import type { SetCeilingMutation, SetCeilingMutationVariables } from './use-set-ceiling.generated';

const SET_CEILING: TypedDocumentNode<SetCeilingMutation, SetCeilingMutationVariables> = gql`
  mutation SetCeiling($input: SetCeilingInput!) {
    setCeiling(input: $input) {
      ...RoundCeiling
    }
  }
  ${ROUND_CEILING}
`;

export function useSetCeiling() {
  const [setCeiling, { loading }] = useMutation(SET_CEILING, { refetchQueries: 'active' });
  async function set(input: SetCeilingInput): Promise<void> {
    await setCeiling({ variables: { input } });
  }
  return { set, loading };
}
