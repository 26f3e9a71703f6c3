import type { RouteObject } from 'react-router-dom';
import { paths } from './paths';
import { RoleGate } from './role-gate';

/** The pages of analysts and officers, inside the staff frame. */
export const staffRoutes: RouteObject[] = [
  {
    element: <RoleGate roles={['analyst', 'administrator']} />,
    children: [
      { path: paths.desk, lazy: async () => ({ Component: (await import('../pages/desk-page')).DeskPage }) },
      {
        path: paths.importFile(),
        lazy: async () => ({ Component: (await import('../pages/import-file-page')).ImportFilePage }),
      },
      {
        path: paths.upload(),
        lazy: async () => ({ Component: (await import('../pages/upload-page')).UploadPage }),
      },
    ],
  },
  {
    element: <RoleGate roles={['officer']} />,
    children: [
      {
        path: paths.officer,
        lazy: async () => ({ Component: (await import('../pages/officer-page')).OfficerPage }),
      },
    ],
  },
  {
    element: <RoleGate roles={['analyst', 'officer', 'administrator']} />,
    children: [
      {
        path: paths.proposal(),
        lazy: async () => ({ Component: (await import('../pages/proposal-page')).ProposalPage }),
      },
      {
        path: paths.history,
        lazy: async () => ({ Component: (await import('../pages/history-page')).HistoryPage }),
      },
      {
        path: paths.forecasts,
        lazy: async () => ({ Component: (await import('../pages/forecasts-page')).ForecastsPage }),
      },
      {
        path: paths.readings,
        lazy: async () => ({ Component: (await import('../pages/readings-page')).ReadingsPage }),
      },
      {
        path: paths.importResult(),
        lazy: async () => ({ Component: (await import('../pages/import-page')).ImportPage }),
      },
      {
        path: paths.towerReadings(),
        lazy: async () => ({
          Component: (await import('../pages/tower-readings-page')).TowerReadingsPage,
        }),
      },
      {
        path: paths.notices,
        lazy: async () => ({ Component: (await import('../pages/notices-page')).NoticesPage }),
      },
      {
        path: paths.notice(),
        lazy: async () => ({ Component: (await import('../pages/notice-page')).NoticePage }),
      },
    ],
  },
];
