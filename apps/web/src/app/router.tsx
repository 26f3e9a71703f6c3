import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { adminRoutes } from './admin-routes';
import { entryRoutes } from './entry-routes';
import { publicRoutes } from './public-routes';
import { RootFrame } from './root-frame';
import { staffRoutes } from './staff-routes';

/** All routes; each page is fetched when it is first visited, so that residents do not pay for the desk. */
export const routes: RouteObject[] = [
  {
    element: <RootFrame />,
    children: [
      ...publicRoutes,
      {
        lazy: async () => ({ Component: (await import('./chakra-frame')).ChakraFrame }),
        children: [
          ...entryRoutes,
          {
            lazy: async () => ({ Component: (await import('../components/layout/staff-frame')).StaffFrame }),
            children: [...staffRoutes, ...adminRoutes],
          },
          {
            path: '*',
            lazy: async () => ({ Component: (await import('../pages/not-found-page')).NotFoundPage }),
          },
        ],
      },
    ],
  },
];

/** The router of the running application. */
export const createAppRouter = () => createBrowserRouter(routes);
