import type { Role } from './roles';

/**
 * Who may do what, as a table. An officer's entry holds for the officer's own districts only; the service checks the
 * district from the resource itself.
 */
export const permissions = {
  'desk.read': ['administrator', 'analyst', 'officer'],
  'readings.read': ['administrator', 'analyst', 'officer'],
  'readings.override': ['analyst'],
  'imports.read': ['administrator', 'analyst', 'officer'],
  'towers.read': ['administrator', 'analyst', 'officer'],
  'towers.write': ['administrator', 'analyst'],
  'ingest-keys.write': ['administrator'],
  'districts.read': ['administrator', 'analyst', 'officer'],
  'districts.write': ['administrator'],
  'rules.read': ['administrator', 'analyst', 'officer'],
  'rules.write': ['analyst'],
  'proposals.read': ['administrator', 'analyst', 'officer'],
  'proposals.decide': ['analyst'],
  'proposals.issue': ['officer'],
  'notices.read': ['administrator', 'analyst', 'officer'],
  'notices.issue': ['officer'],
  'notices.end': ['officer'],
  'subscribers.counts': ['administrator', 'analyst', 'officer'],
  'users.read': ['administrator'],
  'users.write': ['administrator'],
  'activity.read': ['administrator', 'analyst', 'officer'],
} as const satisfies Record<string, readonly Role[]>;

/** A thing that can be done, by name. */
export type Permission = keyof typeof permissions;

/** Whether a role may do a thing (its districts apart). */
export function may(role: Role, permission: Permission): boolean {
  return (permissions[permission] as readonly Role[]).includes(role);
}
