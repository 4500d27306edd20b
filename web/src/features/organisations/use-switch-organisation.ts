import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import type {
  SwitchOrganisationMutation,
  SwitchOrganisationMutationVariables,
} from './use-switch-organisation.generated';

const SWITCH_ORGANISATION: TypedDocumentNode<
  SwitchOrganisationMutation,
  SwitchOrganisationMutationVariables
> = gql`
  mutation SwitchOrganisation($organisationId: ID!) {
    switchOrganisation(organisationId: $organisationId) {
      accessToken
    }
  }
`;

/** Moves the session to another organisation of the member. The page must be loaded anew, to forget the one before. */
export function useSwitchOrganisation() {
  const [switchOrganisation] = useMutation(SWITCH_ORGANISATION, { fetchPolicy: 'no-cache' });
  return async (organisationId: string) => {
    await switchOrganisation({ variables: { organisationId } });
  };
}
