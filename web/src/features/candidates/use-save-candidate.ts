import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type { CreateCandidateInput, UpdateCandidateInput } from '../../generated/graphql';
import { CANDIDATE_DETAILS } from './candidate-details';
import type {
  CreateCandidateMutation,
  CreateCandidateMutationVariables,
  UpdateCandidateMutation,
  UpdateCandidateMutationVariables,
} from './use-save-candidate.generated';

const CREATE_CANDIDATE: TypedDocumentNode<CreateCandidateMutation, CreateCandidateMutationVariables> = gql`
  mutation CreateCandidate($input: CreateCandidateInput!) {
    createCandidate(input: $input) {
      ...CandidateDetails
      ... on MandatoryNeedsReason {
        message
      }
    }
  }
  ${CANDIDATE_DETAILS}
`;

const UPDATE_CANDIDATE: TypedDocumentNode<UpdateCandidateMutation, UpdateCandidateMutationVariables> = gql`
  mutation UpdateCandidate($input: UpdateCandidateInput!) {
    updateCandidate(input: $input) {
      ...CandidateDetails
      ... on MandatoryNeedsReason {
        message
      }
    }
  }
  ${CANDIDATE_DETAILS}
`;

export type Saved = CreateCandidateMutation['createCandidate'];

/** Adds and changes candidates. Gives the candidate, or why it needs a reason to be mandatory. */
export function useSaveCandidate() {
  const [createCandidate] = useMutation(CREATE_CANDIDATE, { refetchQueries: 'active' });
  const [updateCandidate] = useMutation(UPDATE_CANDIDATE, { refetchQueries: 'active' });
  return {
    create: async (input: CreateCandidateInput): Promise<Saved> =>
      (await createCandidate({ variables: { input } })).data!.createCandidate,
    update: async (input: UpdateCandidateInput): Promise<Saved> =>
      (await updateCandidate({ variables: { input } })).data!.updateCandidate,
  };
}
