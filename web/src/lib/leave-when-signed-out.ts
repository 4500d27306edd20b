import type { createBrowserRouter } from 'react-router-dom';
import { session } from './apollo';
import { paths } from './paths';

type Router = ReturnType<typeof createBrowserRouter>;

/**
 * Goes to the sign-in page whenever the session ends. An expired session keeps the address the person was at or on
 * the way to. The page is loaded anew, so that nothing of the person before stays in memory.
 */
export function leaveWhenSignedOut(
  router: Router,
  load = (path: string) => window.location.replace(path),
): () => void {
  return session.onEnd((why) => {
    const { pathname, search } = router.state.navigation.location ?? router.state.location;
    if (pathname === '/sign-in') return;
    load(why === 'expired' ? paths.signIn(pathname + search) : paths.signIn());
  });
}
