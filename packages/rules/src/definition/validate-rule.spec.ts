import fc from 'fast-check';
import type { ProblemCode } from './problems';
import { validateRule } from './validate-rule';

const STRONG = { measure: 'inversionStrengthC', op: '>=', value: 2, heldMinutes: 120 };
const WEAK = { measure: 'inversionStrengthC', op: '<', value: 1, heldMinutes: 60 };
const ADVISORY = { begin: STRONG, end: WEAK, longestValidityHours: 24 };

const withBegin = (begin: unknown) => ({ advisory: { ...ADVISORY, begin } });
const nested = (levels: number): unknown => (levels === 0 ? STRONG : { all: [nested(levels - 1)] });
const cyclic: Record<string, unknown> = {};
cyclic['advisory'] = cyclic;

/** What is wrong, the rule, where it must be said to be, and as what. */
const REFUSED: readonly [string, unknown, string, ProblemCode][] = [
  ['nothing', undefined, '$', 'not-a-rule'],
  ['null', null, '$', 'not-a-rule'],
  ['a list', [], '$', 'not-a-rule'],
  ['a text', 'advisory', '$', 'not-a-rule'],
  ['an empty object', {}, '$', 'missing'],
  ['a cycle', cyclic, '$', 'not-a-rule'],
  ['a number JSON cannot carry', { advisory: { ...ADVISORY, longestValidityHours: 24n } }, '$', 'not-a-rule'],
  ['far too large', { advisory: 'x'.repeat(200_000) }, '$', 'too-large'],
  ['an unknown kind', { curfew: ADVISORY }, '$.curfew', 'unknown-key'],
  ['a key of prototypes', JSON.parse('{"__proto__": {}}'), '$.__proto__', 'unknown-key'],
  ['no begin', { advisory: { end: WEAK, longestValidityHours: 24 } }, '$.advisory.begin', 'missing'],
  ['no validity', { advisory: { begin: STRONG, end: WEAK } }, '$.advisory.longestValidityHours', 'missing'],
  [
    'endless validity',
    { advisory: { ...ADVISORY, longestValidityHours: 1e9 } },
    '$.advisory.longestValidityHours',
    'out-of-range',
  ],
  [
    'a key that means nothing',
    { advisory: { ...ADVISORY, colour: 'red' } },
    '$.advisory.colour',
    'unknown-key',
  ],
  ['a condition that is none', withBegin({}), '$.advisory.begin', 'not-a-condition'],
  ['a condition that is a number', withBegin(7), '$.advisory.begin', 'not-a-condition'],
  [
    'two kinds of group at once',
    withBegin({ all: [STRONG], any: [STRONG] }),
    '$.advisory.begin',
    'not-a-condition',
  ],
  ['an empty group', withBegin({ all: [] }), '$.advisory.begin.all', 'empty-group'],
  [
    'an empty group deep inside',
    withBegin({ all: [STRONG, { any: [] }] }),
    '$.advisory.begin.all[1].any',
    'empty-group',
  ],
  ['a group that is no list', withBegin({ all: STRONG }), '$.advisory.begin.all', 'not-a-condition'],
  [
    'an unknown measure',
    withBegin({ ...STRONG, measure: 'smokiness' }),
    '$.advisory.begin.measure',
    'unknown-measure',
  ],
  [
    'a measure named like an object member',
    withBegin({ ...STRONG, measure: 'toString' }),
    '$.advisory.begin.measure',
    'unknown-measure',
  ],
  ['no measure', withBegin({ op: '>=', value: 2 }), '$.advisory.begin.measure', 'missing'],
  ['an unknown comparison', withBegin({ ...STRONG, op: '=>' }), '$.advisory.begin.op', 'wrong-op'],
  [
    'a yes-no measure with an order',
    withBegin({ measure: 'inversionSure', op: '>', value: true }),
    '$.advisory.begin.op',
    'wrong-op',
  ],
  [
    'a yes-no measure with a number',
    withBegin({ measure: 'inversionSure', op: '=', value: 1 }),
    '$.advisory.begin.value',
    'wrong-value',
  ],
  ['a measured number "equal to"', withBegin({ ...STRONG, op: '=' }), '$.advisory.begin.op', 'wrong-op'],
  ['a number with a truth', withBegin({ ...STRONG, value: true }), '$.advisory.begin.value', 'wrong-value'],
  ['a number in quotes', withBegin({ ...STRONG, value: '2' }), '$.advisory.begin.value', 'wrong-value'],
  [
    'a limit that is not a number',
    withBegin({ ...STRONG, value: NaN }),
    '$.advisory.begin.value',
    'wrong-value',
  ],
  [
    'an impossible limit',
    withBegin({ measure: 'relativeHumidityPct', op: '>', value: 400 }),
    '$.advisory.begin.value',
    'impossible-value',
  ],
  [
    'half an hour of the day',
    withBegin({ measure: 'hourOfDay', op: '>=', value: 13.5 }),
    '$.advisory.begin.value',
    'impossible-value',
  ],
  [
    'a negative hold',
    withBegin({ ...STRONG, heldMinutes: -5 }),
    '$.advisory.begin.heldMinutes',
    'out-of-range',
  ],
  [
    'a hold of months',
    withBegin({ ...STRONG, heldMinutes: 1e6 }),
    '$.advisory.begin.heldMinutes',
    'out-of-range',
  ],
  [
    'a tolerance without a hold',
    withBegin({ ...STRONG, heldMinutes: undefined, toleranceMinutes: 15 }),
    '$.advisory.begin.toleranceMinutes',
    'tolerance-without-hold',
  ],
  [
    'a tolerance of the whole hold',
    withBegin({ ...STRONG, toleranceMinutes: 120 }),
    '$.advisory.begin.toleranceMinutes',
    'tolerance-not-below-hold',
  ],
  ['groups nested too deep', withBegin(nested(6)), `$.advisory.begin${'.all[0]'.repeat(6)}`, 'too-deep'],
  ['hundreds of clauses', withBegin({ all: Array(300).fill(STRONG) }), '$.advisory.begin', 'too-many-parts'],
  [
    'hours that are no hours',
    { advisory: { ...ADVISORY, hoursOfDay: { from: 25, to: 3 } } },
    '$.advisory.hoursOfDay.from',
    'out-of-range',
  ],
  [
    'no hour at all',
    { advisory: { ...ADVISORY, hoursOfDay: { from: 6, to: 6 } } },
    '$.advisory.hoursOfDay',
    'wrong-value',
  ],
  [
    'a thirtieth of February',
    { advisory: { ...ADVISORY, season: { from: '02-30', to: '03-31' } } },
    '$.advisory.season.from',
    'wrong-date',
  ],
  [
    'a season without an end',
    { advisory: { ...ADVISORY, season: { from: '11-01' } } },
    '$.advisory.season.to',
    'missing',
  ],
  ['a condition no values make true', withBegin({ all: [STRONG, WEAK] }), '$.advisory.begin', 'never-true'],
  [
    'begin and end for the same values',
    { advisory: { ...ADVISORY, end: { ...WEAK, value: 3 } } },
    '$.advisory',
    'begin-and-end-overlap',
  ],
  [
    'begin and end about different things',
    { burnBan: { ...ADVISORY, end: { measure: 'pm25NowCast', op: '<', value: 12 } } },
    '$.burnBan',
    'begin-and-end-overlap',
  ],
];

describe('a rule is refused for', () => {
  test.each(REFUSED)('%s', (_, input, path, code) => {
    const result = validateRule(input);
    const problems = result.ok ? [] : result.problems;
    expect(problems.map((problem) => [problem.path, problem.code])).toContainEqual([path, code]);
    for (const { text } of problems) expect(text).toMatch(/^\S.{20,}\.$/s);
  });
});

describe('a rule is accepted', () => {
  test('with every key there is, as a copy', () => {
    const input = {
      advisory: {
        begin: {
          all: [
            STRONG,
            { measure: 'inversionSure', op: '=', value: true },
            { not: { measure: 'month', op: '=', value: 7 } },
          ],
        },
        end: { any: [WEAK], heldMinutes: 60, toleranceMinutes: 15 },
        earliestReproposalMinutes: 180,
        longestValidityHours: 24,
        hoursOfDay: { from: 12, to: 2 },
        season: { from: '10-15', to: '02-29' },
      },
      burnBan: ADVISORY,
    };
    const result = validateRule(input);
    expect(result).toEqual({ ok: true, rule: input });
    expect(result.ok && result.rule.advisory).not.toBe(input.advisory);
  });

  test('whose begin and end meet at one limit without sharing it', () => {
    const rule = { advisory: { ...ADVISORY, end: { measure: 'inversionStrengthC', op: '<', value: 2 } } };
    expect(validateRule(rule).ok).toBe(true);
    expect(validateRule({ advisory: { ...rule.advisory, end: { ...rule.advisory.end, op: '<=' } } }).ok).toBe(
      false,
    );
  });
});

test('the message about an overlap gives values that show it', () => {
  const rule = { advisory: { ...ADVISORY, end: { measure: 'pm25NowCast', op: '<', value: 12 } } };
  expect(validateRule(rule)).toMatchObject({
    problems: [{ text: expect.stringContaining('pm25NowCast is 0 µg/m³ and inversionStrengthC is 2 °C') }],
  });
});

test('no input makes it throw', () => {
  const hostile: unknown[] = [
    new Proxy(
      {},
      {
        ownKeys: () => {
          throw new Error('trap');
        },
      },
    ),
    {
      get advisory() {
        throw null;
      },
    },
    {
      toJSON: () => {
        throw new TypeError('no');
      },
    },
    Array.from({ length: 5000 }).reduce<unknown>((inner) => [inner], []),
    Array.from({ length: 100_000 }).reduce<unknown>((inner) => ({ not: inner }), {}),
    Symbol('rule'),
    () => ADVISORY,
    new Map([['advisory', ADVISORY]]),
  ];
  for (const input of hostile) expect(validateRule(input).ok).toBe(false);
  fc.assert(
    fc.property(
      fc.anything({ withBigInt: true, withNullPrototype: true }),
      (input) => !validateRule(input).ok,
    ),
  );
  fc.assert(fc.property(fc.jsonValue(), (part) => !validateRule(withBegin({ all: [part, STRONG] })).ok));
});
