import { fullYear } from '../../towers/time-keeping/stamp';
import type { TimePart } from '../../towers/time-keeping/time-parts';
import type { TimeColumn } from './mapping';

type Parts = Partial<Record<TimePart, string>>;

const two = (digits: string | undefined, otherwise = '0'): string => (digits ?? otherwise).padStart(2, '0');

/** Day and month of a day of a year, as -MM-DD; empty where the year has no such day. */
const dayOfYear = (year: string, day: string): string => {
  const date = new Date(Date.UTC(Number(year), 0, Number(day)));
  return date.getUTCFullYear() === Number(year) ? date.toISOString().slice(4, 10) : '-00-00';
};

const yearOf = ({ year, 'two-digit year': short }: Parts): string =>
  short === undefined ? (year ?? '') : String(fullYear(two(short)));

/** Spreadsheets write a day without a time as its first midnight. */
const MIDNIGHT = /[T ]0?0:00(?::00(?:\.0+)?)?(?:\s*AM)?$/i;

const dateOf = (parts: Parts): string => {
  if (parts.date !== undefined) return parts.date.replace(MIDNIGHT, '');
  const year = yearOf(parts);
  const day = parts['day of year'];
  return day === undefined
    ? `${year}-${two(parts.month)}-${two(parts.day)}`
    : `${year}${dayOfYear(year, day)}`;
};

const clockOf = (parts: Parts): string => {
  if (parts.time !== undefined) return parts.time;
  if (parts.hhmm !== undefined) {
    const digits = parts.hhmm.padStart(4, '0');
    return /^\d{4}$/.test(digits) ? `${digits.slice(0, 2)}:${digits.slice(2)}` : parts.hhmm;
  }
  return `${two(parts.hour)}:${two(parts.minute)}`;
};

/**
 * One text of a time that stands in several cells, each trimmed: a date and a clock time as they are written, or ISO
 * 8601 made of year, month, day (or day of year), hour, minute (or hhmm).
 */
export function joinTime(cells: readonly string[], columns: readonly TimeColumn[]): string {
  const parts: Parts = {};
  columns.forEach(({ part }, i) => (parts[part] = (cells[i] ?? '').trim()));
  return `${dateOf(parts)} ${clockOf(parts)}`;
}
