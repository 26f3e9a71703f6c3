import { counted } from '../../lib/format/number';
import type { DayOfSensor } from './types';

/** From this share of a day's readings on the calendar marks it as suspect. */
const SUSPECT_SHARE = 0.1;

/** How a cell of the calendar is drawn. */
export interface DayLook {
  /** *none*: nothing was expected; *silent*: nothing came; *some*: what came stands as high as its share. */
  kind: 'none' | 'silent' | 'some';
  /** Of what was expected, 0 to 1: what can be used. */
  share: number;
  suspect: boolean;
  failed: boolean;
}

/** How one sensor's day looks. */
export function dayLook({ expected, taken, suspect, failed, completenessPercent }: DayOfSensor): DayLook {
  const share = (completenessPercent ?? 0) / 100;
  const kind = expected === 0 ? 'none' : taken === 0 ? 'silent' : 'some';
  return { kind, share, suspect: suspect > 0 && suspect >= SUSPECT_SHARE * expected, failed: failed > 0 };
}

/** One sensor's day in words: "98 %, 3 failed", "no readings", "not expected". */
export function dayWords({ expected, taken, suspect, failed, completenessPercent }: DayOfSensor): string {
  if (expected === 0) return 'not expected';
  if (taken === 0) return 'no readings';
  return [
    `${completenessPercent} %`,
    ...(failed > 0 ? [`${failed} failed`] : []),
    ...(suspect > 0 ? [`${suspect} suspect`] : []),
  ].join(', ');
}

/** How complete the shown days are in all, in a sentence. */
export function calendarSentence(days: readonly { sensors: readonly DayOfSensor[] }[]): string {
  const all = days.flatMap(({ sensors }) => sensors);
  const sum = (of: (day: DayOfSensor) => number) => all.reduce((total, day) => total + of(day), 0);
  const expected = sum((day) => day.expected);
  if (expected === 0) return 'No readings were expected in this time.';
  const usable = (100 * sum(({ taken, failed }) => taken - failed)) / expected;
  const silent = all.filter((day) => day.expected > 0 && day.taken === 0).length;
  return [
    `${Math.min(100, usable).toFixed(1)} % of the expected readings can be used.`,
    `${counted(
      sum(({ failed }) => failed),
      'reading',
    )} failed, ${sum(({ suspect }) => suspect).toLocaleString('en-US')} suspect.`,
    ...(silent > 0 ? [`${counted(silent, 'day')} of a sensor without any reading.`] : []),
  ].join(' ');
}
