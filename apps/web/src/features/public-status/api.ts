import useSWR from 'swr';
import { api } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import { embeddedList, embeddedStatus } from './embedded-status';
import type { PublicStatus } from './public-status';

/** A resident's page asks again each minute: a notice is days long, and a phone's battery counts. */
const REFRESH = { refreshInterval: 60_000, dedupingInterval: 10_000 };

/** What holds in a district; begins with the answer served in the page. */
export const usePublicDistrict = (slug: string) =>
  useSWR<PublicStatus, ApiProblem>(
    `/api/public/districts/${encodeURIComponent(slug)}`,
    (path: string) => api.get<PublicStatus>(path),
    { ...REFRESH, fallbackData: embeddedStatus(slug) },
  );

/** What holds in every district; begins with the answer served in the page. */
export const usePublicStatus = () =>
  useSWR<PublicStatus[], ApiProblem>('/api/public/status', (path: string) => api.get<PublicStatus[]>(path), {
    ...REFRESH,
    fallbackData: embeddedList(),
  });
