import type { LocalMoment } from '@lidwatch/rules';
import { zoneOffsetS } from '../../common/zone-offset';

const DAY_S = 86_400;

/** Month, day and hour in a zone at an instant (UTC epoch seconds). */
export function localMoment(timeZone: string, t: number): LocalMoment {
  const local = new Date((t + zoneOffsetS(timeZone, t)) * 1000);
  return { month: local.getUTCMonth() + 1, day: local.getUTCDate(), hour: local.getUTCHours() };
}

/**
 * The offset of a zone's standard time from UTC, s: the smaller of those of January and July of the year. 40 CFR 50
 * App. N counts days in standard time all year.
 */
export function standardOffsetS(timeZone: string, t: number): number {
  const year = new Date(t * 1000).getUTCFullYear();
  return Math.min(...[0, 6].map((month) => zoneOffsetS(timeZone, Date.UTC(year, month, 1) / 1000)));
}

/** The last midnight in local standard time at or before an instant (UTC epoch seconds). */
export function standardMidnight(timeZone: string, t: number): number {
  const offset = standardOffsetS(timeZone, t);
  return Math.floor((t + offset) / DAY_S) * DAY_S - offset;
}
