import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { DeleteLimitMutation, DeleteLimitMutationVariables } from './use-delete-limit.generated';

const DELETE_LIMIT: TypedDocumentNode<DeleteLimitMutation, DeleteLimitMutationVariables> = gql`
  mutation DeleteLimit($id: ID!) {
    deleteLimit(id: $id)
  }
`;

export function useDeleteLimit() {
  const [deleteLimit, { loading }] = useMutation(DELETE_LIMIT, { refetchQueries: 'active' });
  async function remove(id: string): Promise<void> {
    await deleteLimit({ variables: { id } });
  }
  return { remove, loading };
}
