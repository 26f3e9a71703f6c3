import { exactly } from '@lidwatch/atmosphere';
import fc from 'fast-check';
import { blockSeries } from '../evaluation/block-series';
import { evaluate } from '../evaluation/evaluate';
import { anyCondition, TRIED_MEASURES } from '../testing/arbitraries';
import { partsOf, type Condition } from './rule-definition';
import { satisfyTogether } from './satisfy';

const withoutHeld = (condition: Condition): boolean =>
  !condition.heldMinutes && partsOf(condition).every(withoutHeld);

const anyPair = fc.tuple(anyCondition([0]), anyCondition([0])).filter((pair) => pair.every(withoutHeld));

const truthAt = (condition: Condition, values: Record<string, number>) => {
  const measured = Object.fromEntries(Object.entries(values).map(([name, value]) => [name, exactly(value)]));
  const series = blockSeries([{ tEnd: 900, blockSeconds: 900, speaker: 'mill', values: measured }]);
  return evaluate(condition, series, 900, 'begin').truth;
};

/** Values between and on the limits (0 to 4) of the random clauses, so that trying all of them decides. */
const GRID = Array.from({ length: 13 }, (_, i) => i / 2 - 1).filter((value) => value >= -0.5);

test('values found make every condition true', () => {
  fc.assert(
    fc.property(anyPair, (pair) => {
      const result = satisfyTogether(pair);
      fc.pre(result.found === 'yes');
      const values = {
        inversionStrengthC: 0,
        pm25NowCast: 0,
        inversionSure: 0,
        ...(result.found === 'yes' && result.example),
      };
      for (const condition of pair) expect(truthAt(condition, values)).toBe('true');
    }),
  );
});

test('where none are found, trying them all finds none either', () => {
  fc.assert(
    fc.property(anyPair, (pair) => {
      fc.pre(satisfyTogether(pair).found === 'no');
      const [first, second] = TRIED_MEASURES as [string, string];
      for (const a of GRID) {
        for (const b of GRID.filter((value) => value >= 0)) {
          for (const inversionSure of [0, 1]) {
            const values = { [first]: a, [second]: b, inversionSure };
            expect(pair.every((condition) => truthAt(condition, values) === 'true')).toBe(false);
          }
        }
      }
    }),
    { numRuns: 60 },
  );
});

test('what has not held for an hour may be so now', () => {
  const strong: Condition = { measure: 'inversionStrengthC', op: '>=', value: 2 };
  expect(satisfyTogether([strong, { not: strong }]).found).toBe('no');
  expect(satisfyTogether([strong, { not: { ...strong, heldMinutes: 60 } }]).found).toBe('yes');
});

test('a whole number has no value between its neighbours', () => {
  const hour = (op: '>' | '<', value: number): Condition => ({ measure: 'hourOfDay', op, value });
  expect(satisfyTogether([hour('>', 12), hour('<', 13)]).found).toBe('no');
  expect(satisfyTogether([hour('>', 12), hour('<', 14)])).toEqual({
    found: 'yes',
    example: { hourOfDay: 13 },
  });
});

test('a knot of choices is given up rather than waited for', () => {
  const either = (op: '>' | '<', ...values: number[]): Condition => ({
    any: values.map((value) => ({ measure: 'windSpeedMPerS', op, value })),
  });
  const impossible = [either('<', 1, 2), either('>', 3, 4)];
  expect(satisfyTogether([{ all: impossible }]).found).toBe('no');
  const idle = Array.from({ length: 17 }, () => either('>', 0, 0.1));
  expect(satisfyTogether([{ all: [...idle, ...impossible, ...idle] }]).found).toBe('too tangled to say');
});
