import { quoted } from '../../common/quoted';
import type { TimeRefusal } from './time-refusal';

/**
 * How a source writes its time stamps. `iso` also takes slashes or points in a date whose year stands first, and digits
 * alone; the forms with the year last also take two digits for it, and a month by its English name.
 */
export const stampForms = [
  'iso',
  'day/month/year',
  'month/day/year',
  'epoch-seconds',
  'epoch-milliseconds',
] as const;
/** One of the ways to write a time stamp. */
export type StampForm = (typeof stampForms)[number];

/** A time stamp as it was read: what the clock showed, and the offset written beside it, if any. */
export interface Stamp {
  /** What the clock showed, counted as if it were UTC, epoch seconds. */
  readonly shownS: number;
  /** Offset from UTC written in the stamp itself, s; it wins over the source's clock. */
  readonly offsetS?: number;
}

const ISO =
  /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})[T ]\s*(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,](\d+))?)?\s*(Z|UTC|GMT|[+-]\d{2}(?::?\d{2})?)?$/i;
/** Digits alone: date and clock (a date and an hour, too), as many loggers and archives write them. */
const COMPACT =
  /^(\d{4})(\d{2})(\d{2})[T ]?(\d{2})(?::?(\d{2})(?::?(\d{2})(?:[.,](\d+))?)?)?\s*(Z|UTC|GMT|[+-]\d{2}(?::?\d{2})?)?$/i;
const THREE_PARTS =
  /^(\d{1,2}|[a-z]{3})[-/. ](\d{1,2}|[a-z]{3})[-/., ]\s?(\d{4}|\d{2})[T ,]\s*(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,](\d+))?)?\s*(AM|PM)?$/i;
const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];
const EPOCH = /^\d{9,10}(?:\.\d+)?$/;
const EPOCH_MS = /^\d{12,13}$/;

const cure: Record<StampForm, string> = {
  iso: 'write it as 2026-01-31 05:10:00, with Z or an offset such as -07:00 if the logger knows it',
  'day/month/year': 'write it as 31/01/2026 05:10:00, as this source declares',
  'month/day/year': 'write it as 01/31/2026 05:10:00, as this source declares',
  'epoch-seconds': 'write whole seconds since 1970, as this source declares',
  'epoch-milliseconds': 'write whole milliseconds since 1970, as this source declares',
};

const unreadable = (text: string, form: StampForm): TimeRefusal => ({
  code: 'time-not-readable',
  why:
    text.trim() === ''
      ? `the time is empty; ${cure[form]}.`
      : `the time ${quoted(text)} cannot be read; ${cure[form]}.`,
});

/** Offset from UTC in seconds from `Z`, `UTC`, `+02`, `-0700` or `-07:00`; undefined beyond 14 h, which no
 * place on Earth has. */
export function offsetSeconds(text: string): number | undefined {
  if (/^(Z|UTC|GMT)$/i.test(text)) return 0;
  const parts = /^([+-])(\d{2})(?::?(\d{2}))?$/.exec(text);
  if (!parts) return undefined;
  const minutes = Number(parts[2]) * 60 + Number(parts[3] ?? 0);
  if (minutes > 14 * 60 || Number(parts[3] ?? 0) > 59) return undefined;
  return (parts[1] === '-' ? -60 : 60) * minutes;
}

const shown = (y: number, mo: number, d: number, h: number, mi: number, s: number): number | undefined => {
  const day = new Date(Date.UTC(y, mo - 1, d));
  const real = day.getUTCFullYear() === y && day.getUTCMonth() === mo - 1 && day.getUTCDate() === d;
  const midnightAtTheEnd = h === 24 && mi === 0 && s === 0;
  if (!real || mi > 59 || s > 59 || (h > 23 && !midnightAtTheEnd)) return undefined;
  return day.getTime() / 1000 + h * 3600 + mi * 60 + s;
};

const fraction = (digits: string | undefined): number => (digits ? Math.round(Number(`0.${digits}`)) : 0);

const readIso = (parts: RegExpExecArray): Stamp | undefined => {
  const [, y, mo, d, h, mi, s, part, zone] = parts;
  const shownS = shown(Number(y), Number(mo), Number(d), Number(h), Number(mi ?? 0), Number(s ?? 0));
  if (shownS === undefined) return undefined;
  if (!zone) return { shownS: shownS + fraction(part) };
  const offsetS = offsetSeconds(zone);
  return offsetS === undefined ? undefined : { shownS: shownS + fraction(part), offsetS };
};

/** A month by its number or its English name; NaN for neither. */
const monthOf = (text: string): number =>
  /^\d/.test(text) ? Number(text) : MONTHS.indexOf(text.toLowerCase()) + 1 || NaN;

/** Two digits are 1969 to 2068, as in POSIX strptime. */
export const fullYear = (digits: string): number =>
  digits.length > 2 ? Number(digits) : Number(digits) + (Number(digits) < 69 ? 2000 : 1900);

const readThreeParts = (parts: RegExpExecArray, form: StampForm): Stamp | undefined => {
  const [, first, second, y, h, mi, s, part, half] = parts;
  const [d, mo] = form === 'day/month/year' ? [first, second] : [second, first];
  let hour = Number(h);
  if (half) {
    if (hour < 1 || hour > 12) return undefined;
    hour = (hour % 12) + (half.toUpperCase() === 'PM' ? 12 : 0);
  }
  const shownS = shown(fullYear(y!), monthOf(mo!), Number(d), hour, Number(mi), Number(s ?? 0));
  return shownS === undefined ? undefined : { shownS: shownS + fraction(part) };
};

/**
 * Reads one time stamp in the form its source declares. Fractions of a second are rounded to the second; 24:00 is
 * the midnight that ends the day (ISO 8601-1). A day that does not exist, or a form other than the declared one, is
 * refused with the cure: nothing is guessed.
 */
export function readStamp(text: string, form: StampForm = 'iso'): Stamp | TimeRefusal {
  const trimmed = text.trim();
  if (form === 'epoch-seconds') {
    return EPOCH.test(trimmed) ? { shownS: Math.round(Number(trimmed)), offsetS: 0 } : unreadable(text, form);
  }
  if (form === 'epoch-milliseconds') {
    return EPOCH_MS.test(trimmed)
      ? { shownS: Math.round(Number(trimmed) / 1000), offsetS: 0 }
      : unreadable(text, form);
  }
  const iso = form === 'iso' ? (ISO.exec(trimmed) ?? COMPACT.exec(trimmed)) : null;
  const other = form === 'iso' ? null : THREE_PARTS.exec(trimmed);
  const stamp = iso ? readIso(iso) : other ? readThreeParts(other, form) : undefined;
  return stamp ?? unreadable(text, form);
}
