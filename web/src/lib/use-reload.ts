import { useApolloClient } from '@apollo/client/react';

/** Asks again for everything the page shows, without a loading state: what is on the screen stays until the answer. */
export function useReload(): () => Promise<unknown> {
  const client = useApolloClient();
  return () => client.refetchQueries({ include: 'active' });
}
