import { TZDate } from '@date-fns/tz';

/** A stretch of the past that the demo's loggers tell of, UTC epoch seconds. */
export interface Span {
  readonly from: number;
  readonly to: number;
}

/** Days before the first start that are always told, whatever the season: a cold pool and what came before. */
const RECENT_DAYS = 12;
const DAY_S = 86_400;

const midnight = (year: number, month: number, timeZone: string): number =>
  new TZDate(year, month - 1, 1, 0, 0, 0, timeZone).getTime() / 1000;

/**
 * What of the past is told at a first start: the last whole winter (November to February) and the days before now.
 * The present season's earlier days are left out, so that a first start takes as long at its end as at its beginning.
 * In time order, never overlapping.
 *
 * @param now UTC epoch seconds
 * @param timeZone the zone whose November it is
 */
export function historySpans(now: number, timeZone: string): Span[] {
  const year = new TZDate(now * 1000, timeZone).getFullYear();
  const ended = midnight(year, 3, timeZone) <= now ? year : year - 1;
  const winter = { from: midnight(ended - 1, 11, timeZone), to: midnight(ended, 3, timeZone) };
  const recent = { from: now - RECENT_DAYS * DAY_S, to: now };
  return recent.from <= winter.to ? [{ from: winter.from, to: now }] : [winter, recent];
}
