import { atLeast, between, exactly, notKnown } from '@lidwatch/atmosphere';
import type { Condition } from '../definition/rule-definition';
import { blockSeries } from '../evaluation/block-series';
import { evaluate } from '../evaluation/evaluate';
import type { MeasuredValues } from '../evaluation/measured-block';
import { describeCondition } from './describe';
import { explain, sentencesOf } from './explain';

const HOUR = 3600;

function explained(
  condition: Condition,
  values: readonly MeasuredValues[],
  language: 'en' | 'es',
  speakers?: string[],
) {
  const blocks = values.map((value, i) => ({
    tEnd: (i + 1) * HOUR,
    blockSeconds: HOUR,
    speaker: speakers?.[i] ?? 'mill',
    values: value,
  }));
  return sentencesOf(
    explain(evaluate(condition, blockSeries(blocks), values.length * HOUR, 'begin'), language),
  );
}

const strong = { measure: 'inversionStrengthC', op: '>=', value: 2, heldMinutes: 120 } as const;
const at = (inversionStrengthC: MeasuredValues['inversionStrengthC']): MeasuredValues => ({
  inversionStrengthC,
});

const CASES: readonly [string, Condition, MeasuredValues[], string, string, string[]?][] = [
  [
    'a bound',
    strong,
    [at(exactly(3)), at(atLeast(5.1))],
    'Inversion at least 2 °C for 2 h: met, at least 5.1 °C.',
    'Inversión de al menos 2 °C durante 2 h: se cumple, al menos 5,1 °C.',
  ],
  [
    'a false in the time asked',
    strong,
    [at(exactly(1)), at(exactly(3))],
    'Inversion at least 2 °C for 2 h: not met, 3 °C, met for 1 h of the last 2 h.',
    'Inversión de al menos 2 °C durante 2 h: no se cumple, 3 °C, se cumplió 1 h de los últimos 2 h.',
  ],
  [
    'a change of tower',
    strong,
    [at(exactly(3)), at(exactly(3))],
    'Inversion at least 2 °C for 2 h: not known, 3 °C, met for 1 h of the last 2 h, another tower answered until 1 h ago.',
    'Inversión de al menos 2 °C durante 2 h: no se sabe, 3 °C, se cumplió 1 h de los últimos 2 h, hasta hace 1 h respondía otra torre.',
    ['mill', 'bench'],
  ],
  [
    'a reason',
    { measure: 'pm25NowCast', op: '>', value: 12.5 },
    [{ pm25NowCast: notKnown('the monitor was silent') }],
    'PM2.5 NowCast above 12.5 µg/m³: not known (the monitor was silent).',
    'PM2.5 NowCast por encima de 12,5 µg/m³: no se sabe (the monitor was silent).',
  ],
  [
    'a range',
    { measure: 'mixingHeightM', op: '<', value: 200 },
    [{ mixingHeightM: between(120, 260) }],
    'Mixing height below 200 m: not known, between 120 and 260 m.',
    'Altura de mezcla por debajo de 200 m: no se sabe, entre 120 y 260 m.',
  ],
  [
    'a yes',
    { measure: 'inversionSure', op: '=', value: true },
    [{ inversionSure: exactly(1) }],
    'Inversion sure: yes: met, yes.',
    'Inversión segura: sí: se cumple, sí.',
  ],
  [
    'a class by its letter',
    { measure: 'deltaTClass', op: '>=', value: 6 },
    [{ deltaTClass: exactly(4) }],
    'Stability class at least F: not met, D.',
    'Clase de estabilidad de al menos F: no se cumple, D.',
  ],
];

for (const [name, condition, values, english, spanish, speakers] of CASES) {
  test(`${name} is said in both languages`, () => {
    expect(explained(condition, values, 'en', speakers)).toEqual([english]);
    expect(explained(condition, values, 'es', speakers)).toEqual([spanish]);
  });
}

test('parts stand below their group', () => {
  const condition: Condition = {
    all: [{ not: { measure: 'windSpeedMPerS', op: '>', value: 3 } }, strong],
    heldMinutes: 60,
  };
  expect(explained(condition, [{ windSpeedMPerS: exactly(1.25) }], 'en')).toEqual([
    'All of these for 1 h: not known, met for 0 min of the last 1 h, 1 h of it not known.',
    '  Not so: met.',
    '    Wind above 3 m/s: not met, 1.3 m/s.',
    '  Inversion at least 2 °C for 2 h: not known (nothing was measured), met for 0 min of the last 2 h, 1 h of it not known, only 1 h on record.',
  ]);
});

test('a condition is described before anything is measured', () => {
  const condition: Condition = { any: [strong, { not: { measure: 'hourOfDay', op: '<', value: 13 } }] };
  expect(describeCondition(condition, 'en')).toEqual([
    'Any of these:',
    '  Inversion at least 2 °C for 2 h',
    '  Not so:',
    '    Hour of the day below 13 h',
  ]);
});
