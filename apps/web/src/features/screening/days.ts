import { fromZonedInput, toZonedInput } from '../../lib/format/zoned-input';

const DAY_MS = 86_400_000;

/** Days in the calendar at a time. */
export const CALENDAR_DAYS = 35;

/** A day some days later (earlier where negative), both as 2026-01-31. */
export const dayAfter = (day: string, days: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);

/** How many days lie from one to another, both included. */
export const daysFromTo = (first: string, last: string): number =>
  (Date.parse(`${last}T00:00:00Z`) - Date.parse(`${first}T00:00:00Z`)) / DAY_MS + 1;

/** The day it is in a zone at an instant. */
export const dayIn = (instant: string | number, zone: string): string =>
  toZonedInput(instant, zone).slice(0, 10);

/** Whether a text is a day of the calendar. */
export const isDay = (text: string): boolean =>
  /^\d{4}-\d{2}-\d{2}$/.test(text) && !Number.isNaN(Date.parse(`${text}T00:00:00Z`));

/** Begin and end, as ISO 8601, of the days that end with `day` in a zone. */
export function daysEndingWith(day: string, days: number, zone: string): { from: string; to: string } {
  return {
    from: fromZonedInput(dayAfter(day, 1 - days), zone)!,
    to: fromZonedInput(dayAfter(day, 1), zone)!,
  };
}

/** The weeks of the calendar that hold a day, counted back from today, so that they do not move with each day chosen. */
export function calendarDays(day: string, today: string): { from: string; to: string } {
  const ago = daysFromTo(day, today) - 1;
  const to = dayAfter(today, -CALENDAR_DAYS * Math.max(0, Math.floor(ago / CALENDAR_DAYS)));
  return { from: dayAfter(to, 1 - CALENDAR_DAYS), to };
}
