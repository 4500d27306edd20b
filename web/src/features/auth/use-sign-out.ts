import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { session } from '../../lib/apollo';
import type { SignOutMutation, SignOutMutationVariables } from './use-sign-out.generated';

const SIGN_OUT: TypedDocumentNode<SignOutMutation, SignOutMutationVariables> = gql`
  mutation SignOut {
    signOut
  }
`;

/** Ends the session on the server and here. Ends it here even when the server cannot be reached. */
export function useSignOut() {
  const [signOut] = useMutation(SIGN_OUT, { fetchPolicy: 'no-cache', errorPolicy: 'all' });
  return async () => {
    await signOut().catch(() => undefined);
    session.end('signed-out');
  };
}
