import { TZDate } from '@date-fns/tz';

/** A day of the calendar and when it begins and ends in a zone, UTC epoch seconds. */
export interface LocalDay {
  /** As 2026-01-31. */
  readonly day: string;
  readonly from: number;
  readonly to: number;
}

const DAY_MS = 86_400_000;
const asUtc = (day: string): number => Date.parse(`${day}T00:00:00Z`);
const nameOf = (ms: number): string => new Date(ms).toISOString().slice(0, 10);

function midnight(ms: number, timeZone: string): number {
  const day = new Date(ms);
  return (
    new TZDate(day.getUTCFullYear(), day.getUTCMonth(), day.getUTCDate(), 0, 0, 0, timeZone).getTime() / 1000
  );
}

/** How many days lie from one to another, both included; NaN where either is no day of the calendar. */
export const daysFromTo = (from: string, to: string): number =>
  nameOf(asUtc(from) || 0) === from && nameOf(asUtc(to) || 0) === to
    ? (asUtc(to) - asUtc(from)) / DAY_MS + 1
    : NaN;

/** The days from one to another, both included, midnight to midnight in a zone; 23 or 25 h where its clocks change. */
export function localDays(from: string, to: string, timeZone: string): LocalDay[] {
  const first = asUtc(from);
  return Array.from({ length: daysFromTo(from, to) }, (_, i) => {
    const at = first + i * DAY_MS;
    return { day: nameOf(at), from: midnight(at, timeZone), to: midnight(at + DAY_MS, timeZone) };
  });
}
