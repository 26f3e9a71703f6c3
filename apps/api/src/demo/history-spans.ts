import { TZDate } from '@date-fns/tz';

/** A stretch of the past that the demo's loggers tell of, UTC epoch seconds. */
export interface Span {
  readonly from: number;
  readonly to: number;
}

/** Days before the first start that are always told, whatever the season: a cold pool and what came before. */
const ALWAYS_DAYS = 10;
const DAY_S = 86_400;

const midnight = (year: number, month: number, timeZone: string): number =>
  new TZDate(year, month - 1, 1, 0, 0, 0, timeZone).getTime() / 1000;

/**
 * What of the past is told at a first start: the winter before (November to February), the present one up to now,
 * and out of season the last ten days. In time order, never overlapping.
 *
 * @param now UTC epoch seconds
 * @param timeZone the zone whose November it is
 */
export function historySpans(now: number, timeZone: string): Span[] {
  const year = new TZDate(now * 1000, timeZone).getFullYear();
  const begun = midnight(year, 11, timeZone) <= now ? year : year - 1;
  const winter = (first: number): Span => ({
    from: midnight(first, 11, timeZone),
    to: Math.min(now, midnight(first + 1, 3, timeZone)),
  });
  const lastDays = { from: now - ALWAYS_DAYS * DAY_S, to: now };
  const spans: Span[] = [];
  for (const span of [winter(begun - 1), winter(begun), lastDays]) {
    const last = spans.at(-1);
    if (last && span.from <= last.to)
      spans[spans.length - 1] = { from: last.from, to: Math.max(last.to, span.to) };
    else spans.push(span);
  }
  return spans;
}
