import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { CreateLimitInput, UpdateLimitInput } from '../../generated/graphql';
import { LIMIT_ROW } from './limit-row';
import type {
  CreateLimitMutation,
  CreateLimitMutationVariables,
  UpdateLimitMutation,
  UpdateLimitMutationVariables,
} from './use-save-limit.generated';

const CREATE_LIMIT: TypedDocumentNode<CreateLimitMutation, CreateLimitMutationVariables> = gql`
  mutation CreateLimit($input: CreateLimitInput!) {
    createLimit(input: $input) {
      ...LimitRow
      ... on LimitNameTaken {
        message
      }
      ... on LimitEmpty {
        message
      }
    }
  }
  ${LIMIT_ROW}
`;

const UPDATE_LIMIT: TypedDocumentNode<UpdateLimitMutation, UpdateLimitMutationVariables> = gql`
  mutation UpdateLimit($input: UpdateLimitInput!) {
    updateLimit(input: $input) {
      ...LimitRow
      ... on LimitNameTaken {
        message
      }
      ... on LimitEmpty {
        message
      }
    }
  }
  ${LIMIT_ROW}
`;

export type SavedLimit = CreateLimitMutation['createLimit'];

/** Adds and changes limits. Gives the limit, or why it cannot stand so. */
export function useSaveLimit() {
  const [createLimit] = useMutation(CREATE_LIMIT, { refetchQueries: 'active' });
  const [updateLimit] = useMutation(UPDATE_LIMIT, { refetchQueries: 'active' });
  return {
    create: async (input: CreateLimitInput): Promise<SavedLimit> =>
      (await createLimit({ variables: { input } })).data!.createLimit,
    update: async (input: UpdateLimitInput): Promise<SavedLimit> =>
      (await updateLimit({ variables: { input } })).data!.updateLimit,
  };
}
