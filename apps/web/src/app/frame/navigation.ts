import { paths } from '../paths';
import type { Role } from '../../lib/api/types';
import type { IconName } from './nav-icon';

/** One place of the application, as the navigation names it. */
export interface Place {
  to: string;
  name: string;
  icon: IconName;
}

const NOTICES: Place = { to: paths.notices, name: 'Notices', icon: 'notices' };
const HISTORY: Place = { to: paths.history, name: 'History', icon: 'history' };
const READINGS: Place = { to: paths.readings, name: 'Readings', icon: 'readings' };
const FORECASTS: Place = { to: paths.forecasts, name: 'Forecasts', icon: 'forecasts' };
const RULES: Place = { to: paths.rules, name: 'Rules', icon: 'rules' };
const DESK: Place = { to: paths.desk, name: 'Desk', icon: 'desk' };

/** Where each role may go, its own work first. */
export const placesOf: Record<Role, readonly Place[]> = {
  analyst: [DESK, NOTICES, HISTORY, READINGS, FORECASTS, RULES],
  officer: [{ to: paths.officer, name: 'Decisions', icon: 'decisions' }, NOTICES, HISTORY, READINGS],
  administrator: [{ to: paths.admin, name: 'Admin', icon: 'admin' }, DESK, NOTICES, HISTORY, READINGS, RULES],
};
