import { isMeasureName, MEASURE_NAMES, MEASURES } from './catalogue';
import { LANGUAGES } from './measure';

/** Every ending a name of a number may have, with the unit it stands for: units belong in names. */
const UNIT_ENDINGS: readonly [RegExp, string][] = [
  [/CPer100m$/, '°C/100 m'],
  [/MJPerM2$/, 'MJ/m²'],
  [/M2PerS$/, 'm²/s'],
  [/MPerS$/, 'm/s'],
  [/Minutes$/, 'min'],
  [/Pct$/, '%'],
  [/^pm25/, 'µg/m³'],
  [/^hourOfDay$/, 'h'],
  [/^(month|deltaTClass)$/, ''],
  [/C$/, '°C'],
  [/M$/, 'm'],
];

describe('measure catalogue', () => {
  test.each(MEASURE_NAMES)('%s carries its unit in its name', (name) => {
    const { kind, unit } = MEASURES[name];
    const expected = kind === 'yes-no' ? '' : UNIT_ENDINGS.find(([ending]) => ending.test(name))?.[1];
    expect(unit).toBe(expected);
  });

  test.each(MEASURE_NAMES)('%s has a label in each language and a sentence of documentation', (name) => {
    const { label, docs } = MEASURES[name];
    for (const language of LANGUAGES) expect(label[language]).toMatch(/^\p{Lu}.*[^.]$/u);
    expect(docs).toMatch(/^\p{Lu}.{10,}\.$/u);
  });

  test('no two measures share a label', () => {
    for (const language of LANGUAGES) {
      expect(new Set(MEASURE_NAMES.map((name) => MEASURES[name].label[language])).size).toBe(
        MEASURE_NAMES.length,
      );
    }
  });

  test('names of the language itself are no measures', () => {
    for (const name of ['constructor', '__proto__', 'toString', '', 7, null, undefined]) {
      expect(isMeasureName(name)).toBe(false);
    }
  });
});
