import type { createBrowserRouter } from 'react-router-dom';
import { client, session } from './apollo';
import { paths } from './paths';

type Router = ReturnType<typeof createBrowserRouter>;

/** Goes to the sign-in page whenever the session ends, keeping the address the person was at or on the way to. */
export function leaveWhenSignedOut(router: Router): () => void {
  return session.onEnd((why) => {
    void client.clearStore();
    const { pathname, search } = router.state.navigation.location ?? router.state.location;
    if (pathname === '/sign-in') return;
    void router.navigate(why === 'expired' ? paths.signIn(pathname + search) : paths.signIn(), {
      replace: why === 'expired',
    });
  });
}
