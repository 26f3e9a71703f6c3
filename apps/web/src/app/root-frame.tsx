import { Outlet, ScrollRestoration } from 'react-router-dom';

/** What surrounds every route: where the page was scrolled to is kept when going back. */
export function RootFrame() {
  return (
    <>
      <Outlet />
      <ScrollRestoration />
    </>
  );
}
