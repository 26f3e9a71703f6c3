import { quoted } from '../../common/quoted';
import { readStamp, type Stamp, type StampForm } from './stamp';
import {
  instantOf,
  type CivilChoice,
  type LoggerClock,
  type MissingHour,
  type RepeatedHour,
} from './logger-clock';
import type { TimeRefusal } from './time-refusal';

/** What a stamp marks: the instant of the reading, or the start, middle or end of the logger's interval. */
export const stampMeanings = ['instant', 'start', 'middle', 'end'] as const;
/** One of the meanings of a stamp. */
export type StampMeaning = (typeof stampMeanings)[number];

/** How a source tells the time. */
export interface TimeKeeping {
  readonly clock: LoggerClock;
  readonly stamp: StampMeaning;
  readonly form: StampForm;
  /** The logger's interval, s. */
  readonly intervalS: number;
  readonly repeatedHour?: RepeatedHour;
  readonly missingHour?: MissingHour;
}

/** No reading of this trade is older: earlier dates are a logger that lost its clock. */
export const EARLIEST_S = Date.UTC(1990, 0, 1) / 1000;
const LEAST_AHEAD_S = 15 * 60;

/**
 * How far a stamp may run ahead of the service's clock, s: a quarter of an hour, or one and a half of the logger's
 * intervals. A reading from further ahead would be taken for the weather of an hour that has not been; it is refused,
 * kept as it came, and seen as a trouble of the tower's clock.
 */
export const aheadS = (intervalS: number): number => Math.max(LEAST_AHEAD_S, 1.5 * intervalS);

/** The end of the interval that an instant marks, UTC epoch seconds. */
export function endOfInterval(instantS: number, stamp: StampMeaning, intervalS: number): number {
  if (stamp === 'start') return instantS + intervalS;
  return stamp === 'middle' ? instantS + Math.round(intervalS / 2) : instantS;
}

/**
 * From a stamp's text to the END of its interval, UTC epoch seconds; or why not. Only instants from 1990 to
 * shortly after `nowS` (`aheadS`) are plausible.
 */
export function intervalEnd(text: string, time: TimeKeeping, nowS: number): number | TimeRefusal {
  const stamp = readStamp(text, time.form);
  return 'code' in stamp ? stamp : endOfStamp(stamp, text, time, nowS, fixedChoice(time));
}

/** What is meant around a change of the clocks, as far as it does not hang on the order of the rows. */
export function fixedChoice({ repeatedHour, missingHour }: TimeKeeping): CivilChoice {
  return {
    ...(repeatedHour === 'first' || repeatedHour === 'second' ? { repeated: repeatedHour } : {}),
    ...(missingHour === 'later' ? { missing: missingHour } : {}),
  };
}

/** The END of the interval that a stamp marks, or why not; as `intervalEnd`, for a stamp that is read already. */
export function endOfStamp(
  stamp: Stamp,
  text: string,
  time: TimeKeeping,
  nowS: number,
  choice: CivilChoice,
): number | TimeRefusal {
  const instant = instantOf(stamp, time.clock, choice);
  if (typeof instant !== 'number') return instant;
  if (instant < EARLIEST_S)
    return {
      code: 'time-not-plausible',
      why: `the time ${quoted(text.trim())} lies before 1990; set the logger's clock and send the rows again with the right time.`,
    };
  const ahead = instant - nowS;
  if (ahead > aheadS(time.intervalS)) {
    const far = ahead > 86_400 ? 'more than a day' : `${Math.round(ahead / 60)} min`;
    return {
      code: 'time-ahead',
      why: `the time ${quoted(text.trim())} lies ${far} in the future; set the logger's clock or this tower's zone, and send the rows again with the right time.`,
    };
  }
  return endOfInterval(instant, time.stamp, time.intervalS);
}
