import type { RouteObject } from 'react-router-dom';
import { paths } from './paths';

/** Pages for residents: plain elements and a stylesheet, without the design system. */
export const publicRoutes: RouteObject[] = [
  {
    path: paths.home,
    lazy: async () => ({ Component: (await import('../pages/public-list-page')).PublicListPage }),
  },
  {
    path: paths.district(),
    lazy: async () => ({ Component: (await import('../pages/public-district-page')).PublicDistrictPage }),
  },
  {
    path: paths.subscribe,
    lazy: async () => ({ Component: (await import('../pages/subscribe-page')).SubscribePage }),
  },
  {
    path: paths.confirmSubscription(),
    lazy: async () => ({
      Component: (await import('../pages/subscription-confirm-page')).SubscriptionConfirmPage,
    }),
  },
  {
    path: paths.subscription(),
    lazy: async () => ({ Component: (await import('../pages/subscription-page')).SubscriptionPage }),
  },
];
