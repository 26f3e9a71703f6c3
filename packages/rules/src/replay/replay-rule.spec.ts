import { exactly, notKnown } from '@lidwatch/atmosphere';
import type { NoticeRule } from '../definition/rule-definition';
import { blockColumns } from './columns';
import { replayRule } from './replay-rule';

const HOUR_S = 3600;
const rule: NoticeRule = {
  begin: { measure: 'inversionStrengthC', op: '>=', value: 2, heldMinutes: 120, toleranceMinutes: 0 },
  end: { measure: 'inversionStrengthC', op: '<', value: 1, heldMinutes: 60 },
  longestValidityHours: 6,
};
const utc = (t: number) => ({ month: 1, day: 1 + Math.floor(t / 86_400), hour: Math.floor(t / HOUR_S) % 24 });

/** Hourly strengths, the nth (from 1) of the block that ends at n o'clock; null is not known. */
function replayed(strengths: readonly (number | null)[], changes: Partial<NoticeRule> = {}) {
  const blocks = strengths.map((strength, i) => ({
    ...{ tEnd: (i + 1) * HOUR_S, blockSeconds: HOUR_S, speaker: 'mill' },
    values: { inversionStrengthC: strength === null ? notKnown('silent') : exactly(strength) },
  }));
  const notices = replayRule({ ...rule, ...changes }, blockColumns(blocks, ['inversionStrengthC']), utc);
  return notices.map(({ from, to, endedBy }) => [from / HOUR_S, to / HOUR_S, endedBy]);
}

test('begins when the condition has held and ends when the other has', () => {
  expect(replayed([0, 3, 3, 3, 1.5, 0, 0])).toEqual([[3, 6, 'condition to end']]);
});

test('not known begins nothing and ends nothing', () => {
  expect(replayed([3, null, null, 3])).toEqual([]);
  expect(replayed([3, 3, null, null, null])).toEqual([[2, 5, 'end of the record']]);
});

test('ends at its longest validity, and may begin again at once', () => {
  expect(replayed([3, 3, 3, 3, 3, 3, 3, 3, 3, 0])).toEqual([
    [2, 8, 'longest validity'],
    [8, 10, 'condition to end'],
  ]);
});

test('begins only within its hours', () => {
  expect(replayed([3, 3, 3, 3, 3, 0], { hoursOfDay: { from: 4, to: 6 } })).toEqual([
    [4, 6, 'condition to end'],
  ]);
});

test('nothing on record is no notice', () => {
  expect(replayed([])).toEqual([]);
});
