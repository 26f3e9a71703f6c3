import { exactly } from '@lidwatch/atmosphere';
import type { Condition, NoticeRule } from '../definition/rule-definition';
import { blockColumns } from './columns';
import { sweepLimit, withLimit } from './sweep';

const HOUR_S = 3600;
const DAY_S = 24 * HOUR_S;
const calm: Condition = { measure: 'windSpeedMPerS', op: '<', value: 3 };
const strong: Condition = { measure: 'inversionStrengthC', op: '>=', value: 2 };
const rule: NoticeRule = {
  begin: { all: [strong, { not: { any: [{ not: calm }] } }] },
  end: { measure: 'inversionStrengthC', op: '<', value: 1 },
  longestValidityHours: 24,
};

test('one limit is replaced and nothing else', () => {
  expect(withLimit(rule.begin, [1, 0, 0, 0], 5)).toEqual({
    all: [strong, { not: { any: [{ not: { ...calm, value: 5 } }] } }],
  });
});

test.each([
  ['a group', [], 'Only a clause'],
  ['no such part', [7], 'no part 7'],
  ['beyond a clause', [0, 0], 'no parts'],
] as const)('a path to %s is refused', (_, path, text) => {
  expect(() => withLimit(rule.begin, path, 1)).toThrow(text);
});

test('a lower limit warns more often, of what happened and of what did not', () => {
  const peaks = [3, 1.5, 4, 2.2];
  const blocks = peaks.flatMap((peak, day) =>
    [0, peak, 0].map((strength, i) => ({
      ...{ tEnd: day * DAY_S + (i + 1) * HOUR_S, blockSeconds: HOUR_S, speaker: 'mill' },
      values: { inversionStrengthC: exactly(strength), windSpeedMPerS: exactly(1) },
    })),
  );
  const days = peaks.map((peak, day) => ({ from: day * DAY_S, to: (day + 1) * DAY_S, happened: peak >= 3 }));
  const columns = blockColumns(blocks, ['inversionStrengthC', 'windSpeedMPerS']);
  const points = sweepLimit(rule, [0], [1.2, 2, 3, 9], columns, days, () => ({ month: 1, day: 1, hour: 0 }));
  expect(points.map(({ counts: { hits, falseAlarms, misses } }) => [hits, falseAlarms, misses])).toEqual([
    [2, 2, 0],
    [2, 1, 0],
    [2, 0, 0],
    [0, 0, 2],
  ]);
  expect(points.map(({ scores }) => scores.far)).toEqual([0.5, 1 / 3, 0, null]);
});
