import type { Choice } from '../../../components/form/choice-entry';
import type { Role } from '../../../lib/api/types';

/** The roles with what each comes to do. */
export const ROLE_CHOICES: readonly (Choice & { value: Role })[] = [
  { value: 'analyst', label: 'Analyst: watches the air, keeps readings and rules, confirms proposals' },
  { value: 'officer', label: 'Officer: issues and ends notices in their own districts' },
  { value: 'administrator', label: 'Administrator: people, districts, towers, keys' },
];
