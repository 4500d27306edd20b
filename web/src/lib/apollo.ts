import {
  ApolloClient,
  ApolloLink,
  CombinedGraphQLErrors,
  HttpLink,
  InMemoryCache,
  gql,
} from '@apollo/client';
import type { TypedDocumentNode } from '@apollo/client';
import { SetContextLink } from '@apollo/client/link/context';
import { ErrorLink } from '@apollo/client/link/error';
import { createQueryPreloader } from '@apollo/client/react';
import { from, switchMap, tap, throwError } from 'rxjs';
import type { RefreshSessionMutation, RefreshSessionMutationVariables } from './apollo.generated';
import { possibleTypes } from '../generated/possible-types';
import { OfflineError, errorCode } from './error-code';
import { createSession } from './session';

declare module '@apollo/client' {
  interface DefaultContext {
    headers?: Record<string, string>;
    /** The token the request went out with. */
    token?: string;
  }
}

const REFRESH_SESSION: TypedDocumentNode<RefreshSessionMutation, RefreshSessionMutationVariables> = gql`
  mutation RefreshSession {
    refreshSession {
      accessToken
    }
  }
`;

/** Operations that run without an access token; the cookie or the password speaks for them. */
const WITHOUT_TOKEN: ReadonlySet<string | undefined> = new Set(['SignIn', 'RefreshSession']);

export const session = createSession(async () => {
  const { data } = await client.mutate({ mutation: REFRESH_SESSION, fetchPolicy: 'no-cache' });
  return data!.refreshSession.accessToken;
});

const addToken = new SetContextLink(async ({ headers }, operation) => {
  if (WITHOUT_TOKEN.has(operation.operationName)) return { headers };
  const token = await session.renew();
  return { token, headers: { ...headers, authorization: `Bearer ${token}` } };
});

const renewOnce = new ErrorLink(({ error, operation, forward }) => {
  if (errorCode(error) !== 'UNAUTHENTICATED' || WITHOUT_TOKEN.has(operation.operationName)) return;
  const { token } = operation.getContext();
  // Without a token the renewal itself was refused, and the session has already ended.
  if (!token) return;
  return from(session.renew(token)).pipe(
    switchMap(() => forward(operation)),
    tap(({ errors }) => errors && endIfRefused(new CombinedGraphQLErrors({ errors }))),
  );
});

// A fresh token that is refused too will not get better by renewing it.
function endIfRefused(error: unknown) {
  if (errorCode(error) === 'UNAUTHENTICATED') session.end('expired');
}

// fetch gives a TypeError when no answer came; a bug of ours gives one too, and must not be taken for it.
const nameOffline = new ErrorLink(({ error }) =>
  error instanceof TypeError ? throwError(() => new OfflineError(error.message)) : undefined,
);

/** Wraps the link that reaches the API (or stands in for it in a test) with token, renewal and sign-out. */
export function withSession(transport: ApolloLink): ApolloLink {
  return ApolloLink.from([renewOnce, addToken, nameOffline, transport]);
}

export const client: ApolloClient = new ApolloClient({
  link: withSession(new HttpLink({ uri: '/graphql', credentials: 'same-origin' })),
  cache: new InMemoryCache({
    possibleTypes,
    typePolicies: {
      // Parts without an id of their own: what one page asked for and what the next asks for belong together.
      Viewer: { merge: true },
      RoundCounts: { merge: true },
      RoundOverview: { merge: true },
      ScoreSheet: { merge: true },
      QuoteCost: { merge: true },
      CandidateBenefit: { merge: true },
      RunProgress: { merge: true },
    },
  }),
});

export const preloadQuery = createQueryPreloader(client);
