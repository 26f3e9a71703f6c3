/** Where the basin's sun stands, roughly: degrees north and east. */
const LATITUDE_DEG = 44.05;
const LONGITUDE_DEG = -112.95;

/** Local standard time of the basin, seconds from UTC; the model knows no daylight saving. */
export const STANDARD_OFFSET_S = -7 * 3600;

const DAY_S = 86_400;
const RADIANS = Math.PI / 180;

/** The local standard day and hour of an instant. */
export interface LocalTime {
  /** Whole local standard days since 1970-01-01. */
  readonly day: number;
  /** Hour of that day, 0 to 24, with its fraction. */
  readonly hour: number;
}

/**
 * Local standard day and hour of an instant.
 *
 * Units: UTC epoch s in; days and hours out. Valid: any instant. Source: none (definition).
 */
export function localTime(t: number): LocalTime {
  const localS = t + STANDARD_OFFSET_S;
  const day = Math.floor(localS / DAY_S);
  return { day, hour: (localS - day * DAY_S) / 3600 };
}

/**
 * The instant of an hour of a local standard day.
 *
 * Units: UTC epoch s. Valid: any day; hours may lie outside 0 to 24. Source: none (definition).
 */
export function instantOf(day: number, hour: number): number {
  return Math.round(day * DAY_S + hour * 3600 - STANDARD_OFFSET_S);
}

/** Day of the year, 1 to 366, and the year of a local day. */
export function calendar(day: number): { year: number; dayOfYear: number } {
  const year = new Date(day * DAY_S * 1000).getUTCFullYear();
  return { year, dayOfYear: day - Date.UTC(year, 0, 1) / 1000 / DAY_S + 1 };
}

/**
 * The local day of a date.
 *
 * Units: days since 1970-01-01. Valid: month 1 to 12. Source: none (definition).
 */
export function dayOfDate(year: number, month: number, date: number): number {
  return Date.UTC(year, month - 1, date) / 1000 / DAY_S;
}

/**
 * Sunrise and sunset, good to some ten minutes: enough for a model.
 *
 * Units: hours of local standard time. Valid: below the polar circles. Source: declination −23.44° cos(360°/365 (N + 10)).
 */
export function sunHours(day: number): { sunrise: number; sunset: number } {
  const declination = -23.44 * Math.cos(((2 * Math.PI) / 365) * (calendar(day).dayOfYear + 10)) * RADIANS;
  const halfDay = Math.acos(-Math.tan(LATITUDE_DEG * RADIANS) * Math.tan(declination)) / RADIANS / 15;
  const noon = 12 - (LONGITUDE_DEG - (STANDARD_OFFSET_S / 3600) * 15) / 15;
  return { sunrise: noon - halfDay, sunset: noon + halfDay };
}
