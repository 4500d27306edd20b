import type { ApolloLink } from '@apollo/client';
import { ApolloProvider } from '@apollo/client/react';
import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { RouterProvider, createMemoryRouter } from 'react-router-dom';
import { client, session, withSession } from '../lib/apollo';
import { leaveWhenSignedOut } from '../lib/leave-when-signed-out';
import { routes } from '../router';

/** Opens the whole web at `path`, with `link` in place of the API. Signed in unless `token` is null. */
export async function renderRoute(
  path: string,
  link: ApolloLink,
  { token = 'token-1' }: { token?: string | null } = {},
) {
  session.end('signed-out');
  if (token) session.start(token);
  client.setLink(withSession(link));
  await client.clearStore();
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  const stop = leaveWhenSignedOut(router, (to) => void router.navigate(to));
  const view = render(
    <ApolloProvider client={client}>
      <RouterProvider router={router} />
    </ApolloProvider>,
  );
  return {
    user: userEvent.setup(),
    router,
    where: () => router.state.location.pathname + router.state.location.search,
    unmount: () => {
      stop();
      view.unmount();
    },
  };
}
