import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { client, session } from '../../lib/apollo';
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

/** Moves the session to another organisation of the member and forgets everything of the one before. */
export function useSwitchOrganisation() {
  const [switchOrganisation] = useMutation(SWITCH_ORGANISATION, { fetchPolicy: 'no-cache' });
  return async (organisationId: string) => {
    const { data } = await switchOrganisation({ variables: { organisationId } });
    session.start(data!.switchOrganisation.accessToken);
    await client.clearStore();
  };
}
