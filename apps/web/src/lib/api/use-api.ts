import useSWR, { type SWRResponse } from 'swr';
import type { ApiProblem } from './problem';
import { api } from './client';

/** How often a live screen asks again, ms: well within the 15 s in which it must be fresh. */
export const LIVE_REFRESH_MS = 8_000;

interface Options {
  /** Ask again in the background while the page is seen. */
  live?: boolean;
  /** Keep showing the last answer while another address is asked (paging, another span). */
  keepPrevious?: boolean;
}

/** What the API says at `path` (null: do not ask yet), kept fresh by SWR. */
export function useApi<T>(
  path: string | null,
  { live, keepPrevious }: Options = {},
): SWRResponse<T, ApiProblem> {
  return useSWR<T, ApiProblem>(path, (key: string) => api.get<T>(key), {
    refreshInterval: live ? LIVE_REFRESH_MS : 0,
    dedupingInterval: 1_000,
    keepPreviousData: keepPrevious ?? false,
    shouldRetryOnError: live ?? false,
    errorRetryInterval: LIVE_REFRESH_MS,
  });
}
