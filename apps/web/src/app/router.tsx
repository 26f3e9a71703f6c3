import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { adminRoutes } from './admin-routes';
import { entryRoutes } from './entry-routes';
import { publicRoutes } from './public-routes';
import { RootFrame } from './root-frame';
import { staffRoutes } from './staff-routes';

const pageFailed = { lazy: async () => ({ ErrorBoundary: (await import('./page-failed')).PageFailed }) };
const notFound = {
  lazy: async () => ({ Component: (await import('../pages/not-found-page')).NotFoundPage }),
};

/** Everything staff do, in the frame with the navigation; a page that breaks does not take the frame with it. */
const staffFrame: RouteObject = {
  lazy: async () => ({ Component: (await import('./frame/staff-frame')).StaffFrame }),
  children: [{ ...pageFailed, children: [...staffRoutes, ...adminRoutes] }],
};

/** All routes; each page is fetched when it is first visited, so that residents do not pay for the desk. */
export const routes: RouteObject[] = [
  {
    element: <RootFrame />,
    children: [
      ...publicRoutes,
      {
        lazy: async () => ({ Component: (await import('./chakra-frame')).ChakraFrame }),
        children: [{ ...pageFailed, children: [...entryRoutes, staffFrame, { path: '*', ...notFound }] }],
      },
    ],
  },
];

/** The router of the running application. */
export const createAppRouter = () => createBrowserRouter(routes);
