import { tzOffset } from '@date-fns/tz';
import type { LocalMoment } from '@lidwatch/rules';

const MINUTE_S = 60;
const DAY_S = 86_400;

/** So many offsets are remembered; to ask the system's calendar for one costs as much as a district's block. */
const MOST_KEPT = 20_000;
const kept = new Map<string, number>();

function offsetS(timeZone: string, t: number): number {
  const key = `${t} ${timeZone}`;
  const known = kept.get(key);
  if (known !== undefined) return known;
  const offset = tzOffset(timeZone, new Date(t * 1000)) * MINUTE_S;
  if (kept.size >= MOST_KEPT) kept.clear();
  kept.set(key, offset);
  return offset;
}

/** Month, day and hour in a zone at an instant (UTC epoch seconds). */
export function localMoment(timeZone: string, t: number): LocalMoment {
  const local = new Date((t + offsetS(timeZone, t)) * 1000);
  return { month: local.getUTCMonth() + 1, day: local.getUTCDate(), hour: local.getUTCHours() };
}

/**
 * The offset of a zone's standard time from UTC, s: the smaller of those of January and July of the year. 40 CFR 50
 * App. N counts days in standard time all year.
 */
export function standardOffsetS(timeZone: string, t: number): number {
  const year = new Date(t * 1000).getUTCFullYear();
  return Math.min(...[0, 6].map((month) => offsetS(timeZone, Date.UTC(year, month, 1) / 1000)));
}

/** The last midnight in local standard time at or before an instant (UTC epoch seconds). */
export function standardMidnight(timeZone: string, t: number): number {
  const offset = standardOffsetS(timeZone, t);
  return Math.floor((t + offset) / DAY_S) * DAY_S - offset;
}
