import { useApi } from '../../lib/api/use-api';
import type { Desk } from '../../lib/api/types';

/** Everything the desk shows, asked again every few seconds. */
export const useDesk = () => useApi<Desk>('/api/desk', { live: true });
