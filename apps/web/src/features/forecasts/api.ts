import { api, withQuery } from '../../lib/api/client';
import { useApi } from '../../lib/api/use-api';
import { addDays } from './days';
import type { Forecast, ForecastInput, ForecastSkill, ForecastTableResult } from './types';

/** Days shown before and after today. */
const BACK_DAYS = 30;
const AHEAD_DAYS = 10;

export const useForecasts = (districtId: number, today: string) =>
  useApi<Forecast[]>(
    withQuery('/api/forecasts', {
      districtId,
      from: addDays(today, -BACK_DAYS),
      to: addDays(today, AHEAD_DAYS),
    }),
    { live: true, keepPrevious: true },
  );

export const useSkill = (districtId: number) =>
  useApi<ForecastSkill>(withQuery('/api/forecasts/skill', { districtId }));

export const enterForecast = (forecast: ForecastInput) => api.post<Forecast>('/api/forecasts', forecast);
export const enterTable = (text: string) => api.post<ForecastTableResult>('/api/forecasts/table', { text });
