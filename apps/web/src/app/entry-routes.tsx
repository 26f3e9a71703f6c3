import type { RouteObject } from 'react-router-dom';
import { paths } from './paths';

/** The way in for staff: sign-in, and the links of the first administrator and of invitations. */
export const entryRoutes: RouteObject[] = [
  {
    path: paths.signIn,
    lazy: async () => ({ Component: (await import('../pages/sign-in-page')).SignInPage }),
  },
  {
    path: paths.welcome(),
    lazy: async () => ({ Component: (await import('../pages/welcome-page')).WelcomePage }),
  },
];
