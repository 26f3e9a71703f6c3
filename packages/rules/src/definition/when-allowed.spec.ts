import { mayBeginAt, type LocalMoment } from './when-allowed';
import type { NoticeRule } from './rule-definition';

const always = { measure: 'windSpeedMPerS', op: '<', value: 2 } as const;
const rule = (limits: Partial<NoticeRule>): NoticeRule => ({
  begin: always,
  end: always,
  longestValidityHours: 1,
  ...limits,
});
const at = (month: number, day: number, hour: number): LocalMoment => ({ month, day, hour });

const CASES: readonly [string, Partial<NoticeRule>, LocalMoment, boolean][] = [
  ['no limits', {}, at(7, 1, 3), true],
  ['the first hour', { hoursOfDay: { from: 12, to: 17 } }, at(1, 1, 12), true],
  ['the hour of the end', { hoursOfDay: { from: 12, to: 17 } }, at(1, 1, 17), false],
  ['after midnight', { hoursOfDay: { from: 20, to: 6 } }, at(1, 1, 5), true],
  ['noon of a night', { hoursOfDay: { from: 20, to: 6 } }, at(1, 1, 12), false],
  ['the last hour of the day', { hoursOfDay: { from: 20, to: 24 } }, at(1, 1, 23), true],
  ['the first day', { season: { from: '11-01', to: '02-28' } }, at(11, 1, 0), true],
  ['the last day', { season: { from: '11-01', to: '02-28' } }, at(2, 28, 23), true],
  ['a leap day after it', { season: { from: '11-01', to: '02-28' } }, at(2, 29, 0), false],
  ['summer', { season: { from: '11-01', to: '02-28' } }, at(7, 1, 0), false],
];

test.each(CASES)('%s', (_, limits, moment, expected) => {
  expect(mayBeginAt(rule(limits), moment)).toBe(expected);
});
