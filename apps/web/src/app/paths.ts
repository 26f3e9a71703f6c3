import type { Role } from '../lib/api/types';

/** Every address of the web application. Links are made here, never typed. */
export const paths = {
  home: '/',
  district: (slug = ':slug') => `/d/${slug}`,
  subscribe: '/subscribe',
  confirmSubscription: (token = ':token') => `/s/confirm/${token}`,
  subscription: (token = ':token') => `/s/${token}`,
  signIn: '/sign-in',
  welcome: (token = ':token') => `/welcome/${token}`,
  desk: '/desk',
  officer: '/officer',
  proposal: (id: number | ':id' = ':id') => `/proposals/${id}`,
  history: '/history',
  readings: '/readings',
  importFile: (towerId?: number) =>
    towerId === undefined ? '/readings/import' : `/readings/import?tower=${towerId}`,
  upload: (id: number | ':id' = ':id') => `/readings/import/${id}`,
  importResult: (id: number | ':id' = ':id') => `/readings/imports/${id}`,
  towerReadings: (id: number | ':id' = ':id') => `/readings/towers/${id}`,
  notices: '/notices',
  notice: (id: number | ':id' = ':id') => `/notices/${id}`,
  forecasts: '/forecasts',
  rules: '/rules',
  admin: '/admin',
  adminTowers: '/admin/towers',
  adminTower: (id: number | ':id' = ':id') => `/admin/towers/${id}`,
  adminDistricts: '/admin/districts',
} as const;

/** Where each role's work begins after signing in. */
export const startOf: Record<Role, string> = {
  analyst: paths.desk,
  officer: paths.officer,
  administrator: paths.admin,
};
