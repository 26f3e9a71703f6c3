import fc from 'fast-check';
import type { Quality } from '../profile';
import {
  screenTower,
  screeningContext,
  type MeasuredQuantity,
  type RawReading,
  type ScreeningInput,
  type SensorSeries,
  type VerticalLimits,
} from '.';

const H = 3600;
const S = 600;
type Values = readonly (number | null)[];
const readings = (values: Values, stepS = S): RawReading[] =>
  values.map((value, i) => ({ tEnd: (i + 1) * stepS, value }));
const sensor = (
  sensorId: string,
  heightM: number,
  values: Values,
  more: Partial<SensorSeries> = {},
): SensorSeries => ({
  sensorId,
  heightM,
  quantity: 'air temperature' as MeasuredQuantity,
  intervalS: S,
  readings: readings(values, more.intervalS ?? S),
  ...more,
});
/** Only what is beyond the autoconvective rate is unusual between levels. */
const WIDE = { riseC: 99, fallC: 99, risePerMetreByDayC: 0.1, fallPerMetreAtNightC: 0.1 };
const always = { from: 0, to: 1e9 };
const flat = (n: number, value: number): number[] => Array<number>(n).fill(value);
const noisy = (n: number, base = 0): number[] =>
  Array.from({ length: n }, (_, i) => base + ((i * 7) % 10) / 5);
const qualities = (input: Partial<ScreeningInput> & Pick<ScreeningInput, 'sensors'>, id = 'a'): Quality[] =>
  screenTower({ ...always, ...input })
    .get(id)!
    .map((r) => r.quality);
const flagsAt = (input: Partial<ScreeningInput> & Pick<ScreeningInput, 'sensors'>, i: number, id = 'a') =>
  screenTower({ ...always, ...input }).get(id)![i]!.flags;

describe('range', () => {
  it.each<[MeasuredQuantity, number, Quality]>([
    ['air temperature', -80, 'valid'],
    ['air temperature', -80.1, 'failed'],
    ['air temperature', 200, 'failed'],
    ['relative humidity', 101, 'valid'],
    ['relative humidity', 107, 'suspect'],
    ['wind speed', 25, 'valid'],
    ['wind speed', 26, 'suspect'],
    ['wind speed', -0.1, 'failed'],
    ['wind direction', 361, 'failed'],
    ['pressure', 300, 'failed'],
    ['pm25', -11, 'failed'],
    ['pm25', 1500, 'suspect'],
  ])('%s %f is %s', (quantity, value, expected) => {
    expect(qualities({ sensors: [sensor('a', 2, [value], { quantity })] })).toEqual([expected]);
  });
  it('takes the site’s own limits', () => {
    const limits = { plausible: { lowest: -40, highest: 30 } };
    expect(qualities({ sensors: [sensor('a', 2, [-41], { limits })] })).toEqual(['suspect']);
  });
  it('keeps missing values missing', () => {
    expect(qualities({ sensors: [sensor('a', 2, [null, NaN])] })).toEqual(['missing', 'missing']);
  });
});

describe('spike', () => {
  const spiky = [0, 0, 9, 0, 0];
  it('fails a single reading that both its neighbours contradict', () => {
    expect(qualities({ sensors: [sensor('a', 2, spiky)] })).toEqual([
      'valid',
      'valid',
      'failed',
      'valid',
      'valid',
    ]);
  });
  it.each<[string, Values]>([
    ['a step that stays', [0, 0, 9, 9, 9]],
    ['two readings', [0, 9, 9, 0, 0]],
    ['below the limit', [0, 0, 5, 0, 0]],
    ['the last reading, whose next is not in yet', [0, 0, 0, 0, 9]],
    ['across a missing reading', [0, null, 9, null, 0]],
  ])('does not fail %s', (_, values) => {
    expect(qualities({ sensors: [sensor('a', 2, values)] })).not.toContain('failed');
  });
  it('is withdrawn when another level does the same', () => {
    expect(qualities({ sensors: [sensor('a', 2, spiky), sensor('b', 10, [0, 0, 5, 0, 0])] })[2]).not.toBe(
      'failed',
    );
  });
  it('is no evidence afterwards: nothing an hour later is a step from it', () => {
    const values = [...flat(3, 0), 9, ...flat(10, 0)];
    expect(qualities({ sensors: [sensor('a', 2, values)] }).filter((q) => q !== 'valid')).toEqual(['failed']);
  });
});

describe('step', () => {
  const warming = [...noisy(7), ...noisy(7, 7)];
  it('makes the later reading suspect, with the limit and its source', () => {
    const flags = flagsAt({ sensors: [sensor('a', 2, warming)] }, 8);
    expect(flags).toMatchObject([{ check: 'step', verdict: 'suspect' }]);
    expect(flags[0]!.reason).toMatch(/rose by .* in 1 h \(limit 5 °C, EPA-454/);
  });
  it('is withdrawn when a neighbouring level, or tower, moves the same way: a break-up', () => {
    const other = sensor('b', 202, [...noisy(7), ...noisy(7, 5)], { limits: { levelDifference: WIDE } });
    const alone = sensor('a', 2, warming);
    expect(qualities({ sensors: [alone, other] })).not.toContain('suspect');
    expect(qualities({ sensors: [alone], neighbours: [[other]] })).not.toContain('suspect');
    expect(flagsAt({ sensors: [alone], neighbours: [[other]] }, 8)[0]!.withdrawn).toBe(
      'b moves the same way',
    );
  });
  it('is not withdrawn by a level that stays, or goes the other way', () => {
    const limits = { levelDifference: WIDE };
    for (const other of [noisy(14), [...noisy(7), ...noisy(7, -7)]]) {
      expect(qualities({ sensors: [sensor('a', 2, warming), sensor('b', 10, other, { limits })] })).toContain(
        'suspect',
      );
    }
  });
});

describe('stuck and steady', () => {
  const stuck = flat(20, -3);
  it('fails the very same value for 3 h while another level moves', () => {
    expect(new Set(qualities({ sensors: [sensor('a', 2, stuck), sensor('b', 10, noisy(20))] }))).toEqual(
      new Set(['failed']),
    );
  });
  it.each<[string, SensorSeries[]]>([
    ['alone', [sensor('a', 2, stuck)]],
    ['less than 3 h', [sensor('a', 2, flat(18, -3)), sensor('b', 10, noisy(18))]],
    [
      'while the other is quiet',
      [
        sensor('a', 2, stuck),
        sensor(
          'b',
          10,
          stuck.map((v, i) => v + (i % 2) / 10),
        ),
      ],
    ],
    [
      'nearly the same',
      [
        sensor(
          'a',
          2,
          stuck.map((v, i) => v + (i % 2) / 100),
        ),
        sensor('b', 10, noisy(20)),
      ],
    ],
  ])('does not fail it %s', (_, sensors) => {
    expect(qualities({ sensors })).not.toContain('failed');
  });
  const steady = Array.from({ length: 80 }, (_, i) => (i % 3) / 10);
  it('makes 12 h within 0.5 °C suspect at most', () => {
    expect(new Set(qualities({ sensors: [sensor('a', 2, steady)] }))).toEqual(new Set(['suspect']));
    expect(new Set(qualities({ sensors: [sensor('a', 2, steady.slice(0, 72))] }))).toEqual(
      new Set(['valid']),
    );
  });
  it('is withdrawn when another level is as steady: fog, melting snow', () => {
    expect(new Set(qualities({ sensors: [sensor('a', 2, steady), sensor('b', 10, steady)] }))).toEqual(
      new Set(['valid']),
    );
  });
  it('follows the wind direction past north', () => {
    const north = Array.from({ length: 25 }, (_, i) => (i % 2 === 0 ? 359.8 : 0.2));
    expect(qualities({ sensors: [sensor('a', 10, north, { quantity: 'wind direction' })] })).toContain(
      'suspect',
    );
  });
});

describe('internal consistency', () => {
  const air = sensor('air', 2, [5, 5]);
  it.each([
    [[5, 6], 0, ['valid', 'suspect']],
    [[5, 6], 0.7, ['valid', 'valid']],
  ])('dew points %j with σ %f', (values, sigma, expected) => {
    const dew = sensor('a', 2, values, { quantity: 'dew point', sigma });
    expect(qualities({ sensors: [air, dew] })).toEqual(expected);
  });
  it('has no answer without an air temperature at the same height', () => {
    expect(
      qualities({ sensors: [sensor('air', 10, [5]), sensor('a', 2, [9], { quantity: 'dew point' })] }),
    ).toEqual(['valid']);
  });
});

describe('vertical consistency', () => {
  const tower = (lower: number, upper: number, top?: number) => [
    sensor('a', 2, [lower]),
    sensor('b', 32, [upper]),
    ...(top === undefined ? [] : [sensor('c', 62, [top])]),
  ];
  it.each<[string, SensorSeries[], Quality]>([
    ['rises by more than 5 °C', tower(-20, -14), 'suspect'],
    ['rises by 5 °C', tower(-20, -15), 'valid'],
    ['falls by more than 3 °C', tower(0, -4), 'suspect'],
    ['beyond the autoconvective rate', tower(0, -1.1), 'suspect'],
    ['a strong inversion that goes on above', tower(-20, -14, -13), 'valid'],
  ])('%s', (_, sensors, expected) => {
    expect(qualities({ sensors })).toEqual([expected]);
  });
  it('by day +0.1 °C/m, at night −0.1 °C/m, only where the sun is known', () => {
    const [rise, fall] = [
      [sensor('a', 2, [0]), sensor('b', 12, [1.5])],
      [sensor('a', 2, [0]), sensor('b', 22, [-2.5])],
    ];
    expect(flagsAt({ sensors: rise!, sunElevationDeg: () => 20 }, 0)[0]!.reason).toContain('by day');
    expect(flagsAt({ sensors: rise!, sunElevationDeg: () => -5 }, 0)).toEqual([]);
    // A night's inversion that the low sun has not reached yet.
    expect(flagsAt({ sensors: rise!, sunElevationDeg: () => 14 }, 0)).toEqual([]);
    expect(flagsAt({ sensors: fall!, sunElevationDeg: () => -5 }, 0)[0]!.reason).toContain('at night');
    expect(flagsAt({ sensors: rise! }, 0)).toEqual([]);
  });
  it('takes the limits of the upper sensor, and none where they are switched off', () => {
    const of = (levelDifference: VerticalLimits | null) => [
      sensor('a', 2, [0]),
      sensor('b', 102, [4], { limits: { levelDifference } }),
    ];
    const riseC = 3.5;
    const limits = { riseC, fallC: 3, risePerMetreByDayC: 0.1, fallPerMetreAtNightC: 0.1 };
    expect(flagsAt({ sensors: of(limits) }, 0)[0]!.reason).toContain('exceeds +3.5 °C');
    expect(qualities({ sensors: of({ ...limits, riseC: 4 }) })).toEqual(['valid']);
    const fall = [sensor('a', 2, [0]), sensor('b', 12, [-9], { limits: { levelDifference: null } })];
    expect(qualities({ sensors: fall })).toEqual(['valid']);
  });
  it('never fails a reading', () => {
    fc.assert(
      fc.property(fc.integer({ min: -70, max: 50 }), fc.integer({ min: -70, max: 50 }), (lower, upper) => {
        expect(qualities({ sensors: tower(lower, upper) })).not.toContain('failed');
      }),
    );
  });
});

describe('neighbours, clock and people', () => {
  const here = sensor('a', 2, [0], { limits: { neighbourDifference: 8 } });
  it('differs from the median of its neighbours, where the site sets a limit', () => {
    const neighbours = [[sensor('n1', 2, [9])], [sensor('n2', 2, [9.5])], [sensor('n3', 2, [-40])]];
    expect(qualities({ sensors: [here], neighbours })).toEqual(['suspect']);
    expect(qualities({ sensors: [sensor('a', 2, [0])], neighbours })).toEqual(['valid']);
    expect(qualities({ sensors: [here] })).toEqual(['valid']);
  });
  it('fails what a wrong clock stamped', () => {
    const wrongClocks = [{ from: S, to: S, reason: 'the logger ran a day late' }];
    expect(qualities({ sensors: [sensor('a', 2, [0, 0])], wrongClocks })).toEqual(['failed', 'valid']);
    expect(
      qualities({ sensors: [sensor('a', 2, [0])], wrongClocks: [{ ...wrongClocks[0]!, sensorIds: ['b'] }] }),
    ).toEqual(['valid']);
  });
  const by = (quality: 'valid' | 'failed', at: number) => ({
    sensorId: 'a',
    from: S,
    to: S,
    quality,
    reason: 'looked at',
    at,
  });
  it('lets a person’s word win, the newest of several, in whatever order', () => {
    const sensors = [sensor('a', 2, [200, 200])];
    expect(qualities({ sensors, overrides: [by('valid', 1)] })).toEqual(['valid', 'failed']);
    for (const overrides of [
      [by('valid', 1), by('failed', 2)],
      [by('failed', 2), by('valid', 1)],
    ]) {
      expect(qualities({ sensors: [sensor('a', 2, [0])], overrides })).toEqual(['failed']);
    }
    expect(qualities({ sensors: [sensor('a', 2, [null])], overrides: [by('valid', 1)] })).toEqual([
      'missing',
    ]);
  });
  it('keeps the flags beside the word', () => {
    const [reading] = screenTower({
      ...always,
      sensors: [sensor('a', 2, [200])],
      overrides: [by('valid', 1)],
    }).get('a')!;
    expect([reading!.flags.length, reading!.override!.reason]).toEqual([1, 'looked at']);
  });
  it('report only: says failed, leaves nothing out', () => {
    const input = { sensors: [sensor('a', 2, [200])], mode: 'report only' as const };
    expect(qualities(input)).toEqual(['suspect']);
    expect(flagsAt(input, 0)[0]!.verdict).toBe('failed');
    expect(qualities({ ...input, overrides: [by('failed', 1)] })).toEqual(['failed']);
  });
  it('refuses two values for one instant', () => {
    const twice = [
      { tEnd: 1, value: 1 },
      { tEnd: 1, value: 2 },
    ];
    expect(() => qualities({ sensors: [sensor('a', 2, [], { readings: twice })] })).toThrow(
      'only the one in force',
    );
    expect(() => qualities({ sensors: [sensor('a', 2, [1], { intervalS: 0, readings: [] })] })).toThrow(
      'interval',
    );
  });
});

describe('order and span', () => {
  /** Wild enough to set off every check: level stretches, jumps, spikes, gaps. */
  const wild = fc.array(
    fc.record({
      n: fc.integer({ min: 1, max: 90 }),
      base: fc.integer({ min: -40, max: 20 }),
      wiggle: fc.constantFrom(0, 0.1, 1, 9),
      gone: fc.boolean(),
    }),
    { minLength: 3, maxLength: 6 },
  );
  const expand = (
    parts: readonly { n: number; base: number; wiggle: number; gone: boolean }[],
  ): (number | null)[] =>
    parts.flatMap((p) =>
      Array.from({ length: p.n }, (_, i) => (p.gone && i === 1 ? null : p.base + ((i * 7) % 10) * p.wiggle)),
    );
  const towerOf = (a: (number | null)[], b: (number | null)[]) => [
    sensor('a', 2, a),
    sensor('b', 10, b),
    sensor(
      'dew',
      2,
      b.map((v) => (v === null ? null : v - 1)),
      { quantity: 'dew point' },
    ),
  ];

  it('gives the same result whatever order the data arrived in', () => {
    fc.assert(
      fc.property(wild, wild, (a, b) => {
        const sensors = towerOf(expand(a), expand(b));
        const turned = [...sensors].reverse().map((s) => ({ ...s, readings: [...s.readings].reverse() }));
        const [one, other] = [
          screenTower({ ...always, sensors }),
          screenTower({ ...always, sensors: turned }),
        ];
        for (const id of ['a', 'b', 'dew']) expect(other.get(id)).toEqual(one.get(id));
      }),
      { numRuns: 40 },
    );
  });

  it('gives for a span with its context the result of the whole record', () => {
    fc.assert(
      fc.property(
        wild,
        wild,
        fc.integer({ min: 0, max: 300 }),
        fc.integer({ min: 1, max: 60 }),
        (a, b, start, length) => {
          const sensors = towerOf(expand(a), expand(b));
          const [from, to] = [start * S, (start + length) * S];
          const { beforeS, afterS } = screeningContext(sensors);
          const overrides = [
            { sensorId: 'a', from: 40 * S, to: 80 * S, quality: 'failed' as const, reason: '', at: 1 },
          ];
          const near = sensors.map((s) => ({
            ...s,
            readings: s.readings.filter((r) => r.tEnd >= from - beforeS && r.tEnd <= to + afterS),
          }));
          const [whole, part] = [
            screenTower({ sensors, from, to, overrides }),
            screenTower({ sensors: near, from, to, overrides }),
          ];
          for (const id of ['a', 'b', 'dew']) expect(part.get(id)).toEqual(whole.get(id));
        },
      ),
      { numRuns: 150 },
    );
  });

  it('states its context: 12 h of steadiness and change, and a little more', () => {
    const context = screeningContext([sensor('a', 2, [])]);
    expect(context).toEqual({ beforeS: 12 * H + 5 * S, afterS: 12 * H + 5 * S });
    expect(screeningContext([])).toEqual({ beforeS: 0, afterS: 0 });
  });
});
