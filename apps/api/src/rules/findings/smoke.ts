import {
  fromMeasured,
  notKnown,
  nowCast,
  NOWCAST_HOURS,
  regulatoryDayMean,
  runningDayMean,
  type HourlyMean,
} from '@lidwatch/atmosphere';
import type { MeasuredValues } from '@lidwatch/rules';
import { standardMidnight, standardOffsetS } from './local-time';

const HOUR_S = 3600;

/** How far back the smoke measures look: to the start of the last finished day, s. */
export const SMOKE_REACH_S = 49 * HOUR_S;

const NO_MONITOR = notKnown('the district has no PM2.5 monitor');

/**
 * The PM2.5 measures of a district at one block end, from its monitor's hourly means in µg/m³. The newest full hour
 * stands until the next is complete; while that one is late, the hour is not known.
 */
export function smokeValues(
  hours: readonly HourlyMean[] | undefined,
  t: number,
  timeZone: string,
): MeasuredValues {
  if (!hours) {
    return {
      ...{ pm25Hour: NO_MONITOR, pm25NowCast: NO_MONITOR },
      ...{ pm25Day: NO_MONITOR, pm25Running24h: NO_MONITOR },
    };
  }
  const newest = Math.floor(t / HOUR_S) * HOUR_S;
  const recent = hours.filter(({ tEnd }) => tEnd > newest - SMOKE_REACH_S && tEnd <= newest);
  const ending = new Map(recent.map(({ tEnd, valueUgM3 }) => [tEnd, valueUgM3]));
  const newestFirst = Array.from(
    { length: NOWCAST_HOURS },
    (_, ago) => ending.get(newest - ago * HOUR_S) ?? null,
  );
  const midnight = standardMidnight(timeZone, t);
  return {
    pm25Hour: fromMeasured(ending.get(newest), 'the monitor gave no full hour'),
    pm25NowCast: nowCast(newestFirst).reportedUgM3,
    pm25Day: regulatoryDayMean(recent, midnight, standardOffsetS(timeZone, t)).meanUgM3,
    pm25Running24h: runningDayMean(recent, newest).meanUgM3,
  };
}
