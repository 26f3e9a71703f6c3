import useSWR from 'swr';
import { api, withQuery } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import type { Desk, Page } from '../../lib/api/types';
import { useApi } from '../../lib/api/use-api';
import type { Import, Mapping, Preview, Proposal, RefusedRow, Tower, Upload } from './types';

/** How often an import under way is asked after, ms. */
const UNDER_WAY_MS = 700;

export const useTowers = () => useApi<Tower[]>('/api/towers', { live: true });

/** How lately every tower was heard, as the desk says it. */
export const useFreshness = () => useApi<Pick<Desk, 'towers'>>('/api/desk', { live: true });

/** An upload; asked after often while it is being imported. */
export const useUpload = (id: number) =>
  useSWR<Upload, ApiProblem>(`/api/uploads/${id}`, (key: string) => api.get<Upload>(key), {
    refreshInterval: (upload) => (upload?.state === 'running' ? UNDER_WAY_MS : 0),
    dedupingInterval: 300,
  });

/** How an uploaded file seems to be laid out. Asked once: what a person has corrected since is not overwritten. */
export const useProposal = (id: number, sheet: string | undefined) =>
  useSWR<Proposal, ApiProblem>(
    withQuery(`/api/uploads/${id}/proposal`, { sheet }),
    (key: string) => api.get<Proposal>(key),
    { revalidateOnFocus: false, revalidateIfStale: false, shouldRetryOnError: false },
  );

/** What importing by a mapping would give; null: do not ask yet. The last answer stays while another is asked for. */
export const usePreview = (id: number, mapping: Mapping | null) =>
  useSWR<Preview, ApiProblem>(
    mapping && [`/api/uploads/${id}/preview`, JSON.stringify(mapping)],
    ([path, given]: [string, string]) => api.post<Preview>(path, { mapping: JSON.parse(given) as Mapping }),
    { revalidateOnFocus: false, keepPreviousData: true, shouldRetryOnError: false },
  );

export const commitUpload = (id: number, mapping: Mapping) =>
  api.post<Upload>(`/api/uploads/${id}/commit`, { mapping });
export const cancelUpload = (id: number) => api.post<Upload>(`/api/uploads/${id}/cancel`);

export const useImports = (page: number, towerId?: number) =>
  useApi<Page<Import>>(withQuery('/api/imports', { page, pageSize: 10, towerId }), {
    live: true,
    keepPrevious: true,
  });
export const useImport = (id: number | null) =>
  useApi<Import>(id === null ? null : `/api/imports/${id}`, { live: true });
export const useRefused = (importId: number, page: number) =>
  useApi<Page<RefusedRow>>(withQuery(`/api/imports/${importId}/refused`, { page, pageSize: 20 }), {
    keepPrevious: true,
  });
export const withdrawImport = (id: number, reason: string) =>
  api.post<Import>(`/api/imports/${id}/withdraw`, { reason });

/** Where an import's refused rows are to be downloaded. */
export const refusedTable = (importId: number): string => `/api/imports/${importId}/refused.csv`;
