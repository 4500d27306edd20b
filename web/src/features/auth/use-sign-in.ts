import { gql } from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { useMutation } from '@apollo/client/react';
import { session } from '../../lib/apollo';
import { errorMessage } from '../../lib/error-code';
import type { SignInMutation, SignInMutationVariables } from './use-sign-in.generated';

const SIGN_IN: TypedDocumentNode<SignInMutation, SignInMutationVariables> = gql`
  mutation SignIn($input: SignInInput!) {
    signIn(input: $input) {
      ... on SignedIn {
        accessToken
      }
      ... on SignInRefused {
        message
      }
    }
  }
`;

/** Signs in; gives the reason when it was refused, undefined when it went well. */
export function useSignIn() {
  const [signIn, { loading }] = useMutation(SIGN_IN, { fetchPolicy: 'no-cache' });
  async function run(email: string, password: string): Promise<string | undefined> {
    try {
      const { data } = await signIn({ variables: { input: { email, password } } });
      const result = data!.signIn;
      if (result.__typename === 'SignInRefused') return result.message;
      session.start(result.accessToken);
    } catch (error) {
      return errorMessage(error);
    }
  }
  return { signIn: run, loading };
}
