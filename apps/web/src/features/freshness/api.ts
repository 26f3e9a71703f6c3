import { useApi } from '../../lib/api/use-api';
import type { components } from '../../lib/api/schema';

/** Something wrong with a tower's data. */
export type Trouble = components['schemas']['Trouble'];

/** What is wrong now, and what lately was; asked again every few seconds. */
export const useTroubles = () => useApi<Trouble[]>('/api/troubles', { live: true });
