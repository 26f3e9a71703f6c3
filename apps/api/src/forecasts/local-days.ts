import { zoneOffsetS } from '../common/zone-offset';

const HOUR_S = 3600;
const DAY_S = 86_400;
/** From this hour on, the day that is to come is tomorrow's. */
const EVENING = 18;
const NOON = 12;

/** A stretch of time (from, to], UTC epoch seconds. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
}

const dayOf = (shownS: number): string => new Date(shownS * 1000).toISOString().slice(0, 10);

/** A day so many days later, days as 2026-01-31. */
export const addDays = (day: string, days: number): string =>
  dayOf(Date.parse(`${day}T00:00:00Z`) / 1000 + days * DAY_S);

/** The local day of an instant. */
export const localDay = (timeZone: string, t: number): string => dayOf(t + zoneOffsetS(timeZone, t));

/** The instant at which a zone's clocks show an hour of a day; where they show it twice, the first. */
export function localInstant(timeZone: string, day: string, hour: number): number {
  const shownS = Date.parse(`${day}T00:00:00Z`) / 1000 + hour * HOUR_S;
  const before = shownS - zoneOffsetS(timeZone, shownS - DAY_S);
  if (before + zoneOffsetS(timeZone, before) === shownS) return before;
  return shownS - zoneOffsetS(timeZone, shownS + DAY_S);
}

/** The night that a forecast for a day is about: noon to noon. */
export const nightOf = (timeZone: string, day: string): Stretch => ({
  from: localInstant(timeZone, day, NOON),
  to: localInstant(timeZone, addDays(day, 1), NOON),
});

/** The day after that night: midnight to midnight. */
export const dayAfter = (timeZone: string, day: string): Stretch => ({
  from: localInstant(timeZone, addDays(day, 1), 0),
  to: localInstant(timeZone, addDays(day, 2), 0),
});

/** Which day's forecast speaks of the night at hand at an instant (before noon still last night), by its low and wind. */
export function dayForNight(timeZone: string, t: number): string {
  const shownS = t + zoneOffsetS(timeZone, t);
  return new Date(shownS * 1000).getUTCHours() < NOON ? dayOf(shownS - DAY_S) : dayOf(shownS);
}

/** Which day's forecast speaks of the day to come at an instant (until the evening it is today), by its high. */
export function dayForHigh(timeZone: string, t: number): string {
  const shownS = t + zoneOffsetS(timeZone, t);
  return new Date(shownS * 1000).getUTCHours() < EVENING ? dayOf(shownS - DAY_S) : dayOf(shownS);
}
