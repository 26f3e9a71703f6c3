import type { NoticeRule } from './rule-definition';

/** The calendar and clock of a district at one instant. */
export interface LocalMoment {
  /** 1 to 12. */
  readonly month: number;
  /** Day of the month, 1 to 31. */
  readonly day: number;
  /** 0 to 23. */
  readonly hour: number;
}

const pad = (n: number): string => String(n).padStart(2, '0');

/** Whether `at` lies between two places on a ring: 20 to 6 goes over midnight. */
const between = (
  at: number | string,
  from: number | string,
  to: number | string,
  endCounts: boolean,
): boolean => {
  const beforeEnd = at < to || (endCounts && at === to);
  return from <= to ? at >= from && beforeEnd : at >= from || beforeEnd;
};

/**
 * Whether a rule lets a notice be proposed to begin at a local moment, by its hours of day and its season.
 *
 * Units: local calendar. Valid: any moment; a rule without hours or season allows all. Source: none (the project's own
 * rule language).
 */
export function mayBeginAt(rule: NoticeRule, { month, day, hour }: LocalMoment): boolean {
  const { hoursOfDay, season } = rule;
  if (hoursOfDay && !between(hour, hoursOfDay.from, hoursOfDay.to, false)) return false;
  return !season || between(`${pad(month)}-${pad(day)}`, season.from, season.to, true);
}
