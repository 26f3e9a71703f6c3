import type { Case } from '../scores/contingency';
import type { Span } from '../scores/lead-times';

/** A day of a district, with whether what the warning is for happened; null where that is not known. */
export interface ObservedDay extends Span {
  readonly happened: boolean | null;
}

/**
 * Each day as a case for scoring: warned when a notice was in force at some time of it.
 *
 * Units: UTC epoch seconds. Valid: days and notices in any order. Source: common practice.
 */
export function dayCases(notices: readonly Span[], days: readonly ObservedDay[]): Case[] {
  return days.map(({ from, to, happened }) => ({
    warned: notices.some((notice) => notice.from < to && notice.to > from),
    happened,
  }));
}
