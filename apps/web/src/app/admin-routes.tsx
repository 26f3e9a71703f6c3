import type { RouteObject } from 'react-router-dom';
import { paths } from './paths';
import { RoleGate } from './role-gate';

/** The administrator's pages, and the towers and rules that analysts keep, too; inside the staff frame. */
export const adminRoutes: RouteObject[] = [
  {
    element: <RoleGate roles={['administrator']} />,
    children: [
      {
        path: paths.admin,
        lazy: async () => ({ Component: (await import('../pages/admin-people-page')).AdminPeoplePage }),
      },
      {
        path: paths.adminDistricts,
        lazy: async () => ({ Component: (await import('../pages/admin-districts-page')).AdminDistrictsPage }),
      },
    ],
  },
  {
    element: <RoleGate roles={['analyst', 'administrator']} />,
    children: [
      {
        path: paths.adminTowers,
        lazy: async () => ({ Component: (await import('../pages/admin-towers-page')).AdminTowersPage }),
      },
      {
        path: paths.adminTower(),
        lazy: async () => ({ Component: (await import('../pages/admin-tower-page')).AdminTowerPage }),
      },
      {
        path: paths.rules,
        lazy: async () => ({ Component: (await import('../pages/rules-page')).RulesPage }),
      },
    ],
  },
];
