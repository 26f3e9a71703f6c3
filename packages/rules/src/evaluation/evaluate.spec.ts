import { atLeast, between, type Quantity, type Truth } from '@lidwatch/atmosphere';
import type { Condition, Purpose } from '../definition/rule-definition';
import { endOf, strengths } from '../testing/blocks';
import { evaluate } from './evaluate';

const TWO_DEGREES = { measure: 'inversionStrengthC', op: '>=', value: 2 } as const;
const heldHour = (toleranceMinutes?: number): Condition => ({
  ...TWO_DEGREES,
  heldMinutes: 60,
  toleranceMinutes,
});

type Row = readonly (number | Quantity | null | undefined)[];

/** Held for 60 minutes over 15-min blocks, evaluated at the last of the row: the expected answer. */
const HELD: readonly [string, Row, Condition, Purpose, Truth, (string | null)[]?][] = [
  ['four true blocks', [2, 3, 4, 5], heldHour(), 'begin', 'true'],
  ['any false is false', [3, 1, 3, 3], heldHour(), 'begin', 'false'],
  ['false now', [3, 3, 3, 1], heldHour(), 'begin', 'false'],
  ['false just before the hour does not count', [1, 3, 3, 3, 3], heldHour(), 'begin', 'true'],
  ['a record shorter than the hour', [3, 3, 3], heldHour(), 'begin', 'not known'],
  ['a short record with a false in it is false', [1, 3, 3], heldHour(), 'begin', 'false'],
  ['30 min not known are tolerated to begin', [3, null, null, 3], heldHour(), 'begin', 'true'],
  ['45 min not known are not', [null, null, 3, null, 3], heldHour(15), 'begin', 'not known'],
  ['no minute is tolerated to end', [3, null, 3, 3], heldHour(), 'end', 'not known'],
  ['a tolerance of its own goes before the default', [3, null, 3, 3], heldHour(15), 'end', 'true'],
  ['not known now is tolerated like any other time', [3, 3, 3, null], heldHour(), 'begin', 'true'],
  ['a missing block is time not known', [3, undefined, 3, 3], heldHour(15), 'begin', 'true'],
  ['two missing blocks', [3, undefined, undefined, 3], heldHour(15), 'begin', 'not known'],
  [
    'a missing block where the hour starts, older ones there',
    [3, undefined, 3, 3, 3],
    heldHour(15),
    'begin',
    'true',
  ],
  ['at least 2 is true', [atLeast(2), 3, 3, 3], heldHour(0), 'begin', 'true'],
  ['a range over the limit is not known', [between(1, 3), 3, 3, 3], heldHour(0), 'begin', 'not known'],
  [
    'a change of tower starts anew',
    [3, 3, 3, 3, 3],
    heldHour(),
    'begin',
    'not known',
    ['mill', 'mill', 'mill', 'bench', 'bench'],
  ],
  [
    'what the tower before said does not count',
    [1, 3, 3, 3, 3],
    heldHour(),
    'begin',
    'true',
    ['mill', 'bench', 'bench', 'bench', 'bench'],
  ],
  [
    'a false of the tower before is no false',
    [3, 1, 3, 3, 3],
    heldHour(),
    'begin',
    'not known',
    ['mill', 'mill', 'bench', 'bench', 'bench'],
  ],
  [
    'the same tower after a silence goes on',
    [3, null, 3, 3],
    heldHour(),
    'begin',
    'true',
    ['mill', null, 'mill', 'mill'],
  ],
  [
    'another tower after a silence starts anew',
    [3, null, 3, 3, 3],
    heldHour(),
    'begin',
    'not known',
    ['mill', null, 'bench', 'bench', 'bench'],
  ],
  [
    'a hold that cuts a block counts the whole block',
    [1, 3, 3],
    { ...TWO_DEGREES, heldMinutes: 35 },
    'begin',
    'false',
  ],
  ['silence alone holds nothing', [null, null], { ...TWO_DEGREES, heldMinutes: 30 }, 'begin', 'not known'],
];

describe('held for', () => {
  for (const [name, row, condition, purpose, expected, speakers] of HELD) {
    test(name, () => {
      expect(evaluate(condition, strengths(row, speakers), endOf(row.length), purpose).truth).toBe(expected);
    });
  }

  test('says how much of the time was true, false and not known', () => {
    const series = strengths([1, 3, null, 3, 3]);
    expect(evaluate({ ...TWO_DEGREES, heldMinutes: 75 }, series, endOf(5), 'begin').held).toEqual({
      neededMinutes: 75,
      toleratedMinutes: 30,
      recordMinutes: 75,
      trueMinutes: 45,
      falseMinutes: 15,
      notKnownMinutes: 15,
    });
  });

  test('says how long it has held where that is longer than asked', () => {
    const held = (row: (number | null)[]) =>
      evaluate(heldHour(), strengths(row), endOf(row.length), 'begin').held;
    expect(held([1, 3, 3, 3, 3, 3, 3])).toMatchObject({ trueMinutes: 60, unbrokenMinutes: 90 });
    expect(held([3, 3, 3, 3, 3, 3])).toMatchObject({ unbrokenMinutes: 90, unbrokenOrMore: true });
    expect(held([1, 3, 3, 3, 3])).not.toHaveProperty('unbrokenMinutes');
  });

  test('says that the record starts with a change of tower', () => {
    const node = evaluate(heldHour(), strengths([3, 3, 3], ['mill', 'bench', 'bench']), endOf(3), 'begin');
    expect(node.held).toMatchObject({
      recordMinutes: 30,
      trueMinutes: 30,
      recordStartsAfter: 'change of tower',
    });
  });

  test('nothing on record is not known', () => {
    const node = evaluate(heldHour(), strengths([]), endOf(3), 'begin');
    expect(node).toMatchObject({ truth: 'not known', now: 'not known', held: { recordMinutes: 0 } });
  });

  test('of a group holds only while the group as a whole does', () => {
    const group: Condition = {
      any: [TWO_DEGREES, { measure: 'inversionStrengthC', op: '<', value: 0 }],
      heldMinutes: 60,
    };
    expect(evaluate(group, strengths([3, -1, 3, -2]), endOf(4), 'begin').truth).toBe('true');
    expect(evaluate(group, strengths([3, 1, 3, -2]), endOf(4), 'begin').truth).toBe('false');
  });

  test('within held-for looks back over both', () => {
    const nested: Condition = {
      all: [{ ...TWO_DEGREES, heldMinutes: 30 }],
      heldMinutes: 30,
      toleranceMinutes: 0,
    };
    expect(evaluate(nested, strengths([3, 3, 3]), endOf(3), 'begin').truth).toBe('true');
    expect(evaluate(nested, strengths([1, 3, 3]), endOf(3), 'begin').truth).toBe('false');
    expect(evaluate(nested, strengths([3, 3]), endOf(2), 'begin').truth).toBe('not known');
  });
});

describe('the evaluated tree', () => {
  test('carries what was measured beside each limit', () => {
    const condition: Condition = {
      all: [TWO_DEGREES, { not: { measure: 'pm25NowCast', op: '<', value: 20 } }],
    };
    expect(evaluate(condition, strengths([atLeast(5.1)]), endOf(1), 'begin')).toEqual({
      kind: 'all',
      truth: 'not known',
      now: 'not known',
      parts: [
        { kind: 'clause', ...TWO_DEGREES, truth: 'true', now: 'true', measured: { lo: 5.1, hi: Infinity } },
        {
          kind: 'not',
          truth: 'not known',
          now: 'not known',
          parts: [
            {
              kind: 'clause',
              measure: 'pm25NowCast',
              op: '<',
              value: 20,
              truth: 'not known',
              now: 'not known',
              measured: { lo: -Infinity, hi: Infinity, reason: 'nothing was measured' },
            },
          ],
        },
      ],
    });
  });

  test('a value that is not a number is not known', () => {
    const node = evaluate(TWO_DEGREES, strengths([{ lo: NaN, hi: 3 }]), endOf(1), 'begin');
    expect(node.truth).toBe('not known');
  });

  test('time without a block is not known', () => {
    expect(evaluate(TWO_DEGREES, strengths([3]), endOf(1) + 60, 'begin').truth).toBe('not known');
  });
});
