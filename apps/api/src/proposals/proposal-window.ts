import type { NoticeRule } from '@lidwatch/rules';
import { localMoment } from '../rules/findings/local-time';

const pad = (n: number): string => String(n).padStart(2, '0');

/** Whether `at` lies in [from, to) on a ring: 20 to 6 goes over midnight. */
const onRing = <T extends number | string>(at: T, from: T, to: T, withEnd: boolean): boolean => {
  const beforeEnd = withEnd ? at <= to : at < to;
  return from <= to ? at >= from && beforeEnd : at >= from || beforeEnd;
};

/** Whether a rule lets a notice be proposed at an instant (UTC epoch seconds), by its hours of day and its season. */
export function mayProposeAt(rule: NoticeRule, timeZone: string, t: number): boolean {
  const { month, day, hour } = localMoment(timeZone, t);
  const { hoursOfDay, season } = rule;
  if (hoursOfDay && !onRing(hour, hoursOfDay.from, hoursOfDay.to, false)) return false;
  return !season || onRing(`${pad(month)}-${pad(day)}`, season.from, season.to, true);
}
