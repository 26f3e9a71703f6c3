import { TZDate } from '@date-fns/tz';
import { draw } from './draw';

const HOUR_S = 3600;
const MINUTE_S = 60;

/** A stretch of the working day, in hours of the district's clock. */
interface Hours {
  readonly from: number;
  readonly to: number;
}

/** When the desk is staffed, when officers issue, and when they end. */
const DESK: Hours = { from: 6.5, to: 20 };
const ISSUING: Hours = { from: 12.5, to: 16.4 };
const ENDING: Hours = { from: 10.5, to: 13 };

/** What is known of a proposal when its course is planned. */
export interface Planned {
  readonly id: number;
  readonly act: 'begin' | 'end';
  /** UTC epoch seconds. */
  readonly openedAt: number;
}

/** The next instant at or after `t` within some hours of the day: `t` itself, or a drawn one when they next come. */
function within(t: number, { from, to }: Hours, timeZone: string, drawn: number): number {
  const local = new TZDate(t * 1000, timeZone);
  const hour = local.getHours() + local.getMinutes() / 60;
  if (hour >= from && hour < to) return t;
  const dayLater = hour >= to ? 1 : 0;
  const begin = new TZDate(
    local.getFullYear(),
    local.getMonth(),
    local.getDate() + dayLater,
    0,
    0,
    0,
    timeZone,
  );
  return begin.getTime() / 1000 + Math.round((from + drawn * Math.min(1.5, to - from)) * HOUR_S);
}

/**
 * When an analyst looks at a proposal: twenty to fifty minutes after it opened while the desk is staffed, else in the
 * first hour and a half of the next day.
 *
 * Units: UTC epoch s. Valid: any proposal. Source: the demo's own story.
 */
export function confirmingAt({ id, openedAt }: Planned, timeZone: string): number {
  return within(openedAt + (20 + 30 * draw('confirm', id)) * MINUTE_S, DESK, timeZone, draw('morning', id));
}

/**
 * When an officer decides on a confirmed proposal: to begin between half past twelve and half past four, to end
 * between half past ten and one.
 *
 * Units: UTC epoch s. Valid: any proposal. Source: the demo's own story.
 */
export function decidingAt({ id, act }: Planned, confirmedAt: number, timeZone: string): number {
  const soonest = confirmedAt + (6 + 30 * draw('decide', id)) * MINUTE_S;
  return within(soonest, act === 'begin' ? ISSUING : ENDING, timeZone, draw('hour', id));
}
