import { TZDate } from '@date-fns/tz';

const two = (n: number) => String(n).padStart(2, '0');

/** An instant as a `datetime-local` field wants it, in the district's zone: "2026-01-15T11:00". */
export function toZonedInput(instant: string | number, zone: string): string {
  const at = new TZDate(new Date(instant).getTime(), zone);
  const date = `${at.getFullYear()}-${two(at.getMonth() + 1)}-${two(at.getDate())}`;
  return `${date}T${two(at.getHours())}:${two(at.getMinutes())}`;
}

/**
 * The instant of what a `datetime-local` or `date` field holds, read in the district's zone, as ISO 8601 in UTC; null
 * when the field is empty or no date.
 */
export function fromZonedInput(text: string, zone: string): string | null {
  const match = /^(\d{4})-(\d\d)-(\d\d)(?:T(\d\d):(\d\d))?/.exec(text);
  if (!match) return null;
  const [year = 0, month = 1, day = 1, hour = 0, minute = 0] = match
    .slice(1)
    .map((part) => Number(part ?? 0));
  const at = new TZDate(year, month - 1, day, hour, minute, 0, zone);
  return Number.isNaN(at.getTime()) ? null : new Date(at.getTime()).toISOString();
}
