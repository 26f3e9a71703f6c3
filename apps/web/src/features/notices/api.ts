import useSWR from 'swr';
import { api, withQuery } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import type { Delivery, NoticeDetail, NoticePreview, NoticeRow, Page } from '../../lib/api/types';
import { useApi } from '../../lib/api/use-api';

/** What the notice log can be narrowed to; instants as ISO 8601. */
export interface NoticeFilter {
  districtId?: string | undefined;
  kind?: string | undefined;
  state?: string | undefined;
  from?: string | undefined;
  to?: string | undefined;
  q?: string | undefined;
  page?: number | undefined;
  pageSize?: number | undefined;
}

/** Notices, newest first. */
export const useNotices = (filter: NoticeFilter) =>
  useApi<Page<NoticeRow>>(withQuery('/api/notices', { ...filter }), { live: true, keepPrevious: true });

/** One notice with its texts, events and delivery. */
export const useNotice = (id: number) => useApi<NoticeDetail>(`/api/notices/${id}`, { live: true });

/** The messages of a notice, one line each. */
export const useDeliveries = (id: number, filter: { state?: string; channel?: string; page?: number }) =>
  useApi<Page<Delivery>>(withQuery(`/api/notices/${id}/deliveries`, filter), {
    live: true,
    keepPrevious: true,
  });

/** What would go out if the notice were ended now. Null: do not ask. */
export const useEndPreview = (notice: { id: number; version: number } | null) =>
  useSWR<NoticePreview, ApiProblem>(
    notice && [`/api/notices/${notice.id}/end-preview`, notice.version],
    ([path]: [string, number]) => api.post<NoticePreview>(path),
    { revalidateOnFocus: false, shouldRetryOnError: false },
  );

/** What ending needs: why, which text was seen, and for a burn ban the password. */
export interface EndInput {
  reason: string;
  version: number;
  previewHash: string;
  password?: string;
  requestKey: string;
}

/** Ends a notice. The same key does it once. */
export const endNotice = (id: number, body: EndInput) =>
  api.post<NoticeDetail>(`/api/notices/${id}/end`, body);
