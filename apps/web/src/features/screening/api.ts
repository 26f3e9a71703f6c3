import useSWR, { useSWRConfig, type SWRResponse } from 'swr';
import { api, withQuery } from '../../lib/api/client';
import type { ApiProblem } from '../../lib/api/problem';
import type { Page } from '../../lib/api/types';
import { LIVE_REFRESH_MS, useApi } from '../../lib/api/use-api';
import type {
  CheckLimits,
  FlaggedSpan,
  RawReadings,
  ReadingDetail,
  Rework,
  Said,
  Sensor,
  SensorLimits,
  SetSpan,
  Tower,
  TowerCalendar,
} from './types';

/** How often work under way is asked after, ms. */
const UNDER_WAY_MS = 1_500;

/** A span of time as the API takes it. */
export interface Ends {
  from: string;
  to: string;
}

export const useTowers = () => useApi<Tower[]>('/api/towers');

/** How complete a tower's days are; days as 2026-01-31, both included. */
export const useCalendar = (towerId: number, days: Ends) =>
  useApi<TowerCalendar>(withQuery(`/api/towers/${towerId}/calendar`, { ...days }), {
    live: true,
    keepPrevious: true,
  });

/** A tower's readings as they came, over (from, to]. */
export const useRaw = (towerId: number, ends: Ends) =>
  useApi<RawReadings>(withQuery(`/api/towers/${towerId}/raw`, { ...ends }), {
    live: true,
    keepPrevious: true,
  });

/** One reading with the file and row it came from. */
export const useReading = (towerId: number, reading: { sensorId: number; t: string }) =>
  useApi<ReadingDetail>(withQuery(`/api/towers/${towerId}/reading`, { ...reading }));

/** What flagged spans are narrowed to; empty: all. */
export interface FlagFilter {
  check: string;
  quality: string;
  sensorId: string;
}

export const useFlags = (towerId: number, ends: Ends, filter: FlagFilter, page: number) =>
  useApi<Page<FlaggedSpan>>(
    withQuery(`/api/towers/${towerId}/flags`, { ...ends, ...filter, page, pageSize: 10 }),
    { live: true, keepPrevious: true },
  );

export const useSetSpans = (towerId: number) =>
  useApi<SetSpan[]>(withQuery('/api/overrides', { towerId }), { live: true });

const isUnderWay = (reworks: Rework[] | undefined): boolean =>
  reworks?.some(({ endedAt }) => endedAt === null) ?? false;

/** What was worked out anew for a tower; asked more often while something is under way. `onEnded` follows its end. */
export function useReworks(towerId: number, onEnded: () => void): SWRResponse<Rework[], ApiProblem> {
  const path = withQuery('/api/reworks', { towerId });
  const { cache } = useSWRConfig();
  return useSWR<Rework[], ApiProblem>(path, (key: string) => api.get<Rework[]>(key), {
    refreshInterval: (reworks) => (isUnderWay(reworks) ? UNDER_WAY_MS : LIVE_REFRESH_MS),
    dedupingInterval: 500,
    onSuccess: (reworks) => {
      const before = cache.get(path)?.data as Rework[] | undefined;
      if (isUnderWay(before) && !isUnderWay(reworks)) onEnded();
    },
  });
}

/** Asks again for everything that is shown of a tower's readings. */
export function useRefresh(towerId: number): () => void {
  const { mutate } = useSWRConfig();
  const isOfTower = (key: unknown) =>
    typeof key === 'string' &&
    (key.startsWith(`/api/towers/${towerId}/`) ||
      key === '/api/towers' ||
      key.startsWith('/api/overrides?') ||
      key.startsWith('/api/reworks?'));
  return () => void mutate(isOfTower);
}

/** A span of a sensor to be set, its ends being those of the first and the last reading. */
export interface SpanToSet extends Ends {
  sensorId: number;
  quality: Said;
  reason: string;
}

export const useLimits = (towerId: number) => useApi<SensorLimits[]>(`/api/towers/${towerId}/limits`);
/** Sets the limits of a sensor's checks, with the reason. */
export const setLimits = (sensorId: number, limits: CheckLimits & { reason: string }) =>
  api.put<SensorLimits>(`/api/sensors/${sensorId}/limits`, limits);

export const setSpan = (span: SpanToSet) => api.post<SetSpan>('/api/overrides', span);
export const undoSpan = (id: number) => api.remove<SetSpan>(`/api/overrides/${id}`);

/** A correction of a sensor from an instant on: corrected = gain × reading + offset. */
export interface Correction {
  offset: number;
  gain: number;
  from: string;
  note: string;
}

export const correctSensor = (id: number, correction: Correction) =>
  api.patch<Sensor>(`/api/sensors/${id}`, correction);
