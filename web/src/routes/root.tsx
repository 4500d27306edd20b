import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Announcements } from '../ui/announce';
import { IconSprite } from '../ui/icon';

/** Around every page: icons, announcements, scroll position. */
export function Root() {
  return (
    <>
      <IconSprite />
      <Outlet />
      <Announcements />
      <ScrollRestoration />
    </>
  );
}
