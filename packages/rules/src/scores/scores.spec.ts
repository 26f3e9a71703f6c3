import fc from 'fast-check';
import { contingencyOf, type Contingency } from './contingency';
import { scoresOf, type Scores } from './scores';

const table = (hits: number, falseAlarms: number, misses: number, correctNegatives: number): Contingency => ({
  ...{ hits, falseAlarms, misses, correctNegatives },
});

/**
 * Finley's tornado forecasts of 1884 (28, 72, 23, 2680), as scored on the verification pages of the WWRP/WGNE Joint
 * Working Group: 96.6 % correct, twice as many warnings as tornadoes, 52 % by POD less POFD. Six decimals.
 */
const FINLEY: Scores = {
  proportionCorrect: 0.966108,
  pod: 0.54902,
  far: 0.72,
  pofd: 0.026163,
  csi: 0.227642,
  bias: 1.960784,
  ets: 0.216046,
  hss: 0.355325,
  pss: 0.522857,
};

/** A table whose scores follow from the definitions by hand: as good as chance. */
const CHANCE: Partial<Scores> = {
  pod: 0.25,
  far: 0.75,
  pofd: 0.25,
  csi: 1 / 7,
  bias: 1,
  ets: 0,
  hss: 0,
  pss: 0,
};

const TABLES: readonly [string, Contingency, Partial<Scores>][] = [
  ['Finley 1884', table(28, 72, 23, 2680), FINLEY],
  ['warnings no better than chance', table(10, 30, 30, 90), CHANCE],
];

test.each(TABLES)('%s', (_, counts, expected) => {
  const scores = scoresOf(counts);
  for (const [name, value] of Object.entries(expected)) {
    expect(Math.abs(scores[name as keyof Scores]! - value!)).toBeLessThan(5.1e-7);
  }
});

test('never warning is right 98 % of the time, and its false alarm ratio is undefined', () => {
  const scores = scoresOf(table(0, 0, 51, 2752));
  expect(scores).toMatchObject({ far: null, pod: 0, bias: 0 });
  expect(scores.proportionCorrect).toBeCloseTo(0.9818, 4);
});

test('of nothing at all every score is undefined', () => {
  expect(Object.values(scoresOf(table(0, 0, 0, 0))).every((score) => score === null)).toBe(true);
});

test('no score is ever NaN', () => {
  fc.assert(
    fc.property(fc.nat(3), fc.nat(3), fc.nat(3), fc.nat(3), (a, b, c, d) => {
      for (const score of Object.values(scoresOf(table(a, b, c, d)))) {
        expect(score === null || Number.isFinite(score)).toBe(true);
      }
    }),
  );
});

test('days of which something is not known are counted apart', () => {
  const cases = [
    { warned: true, happened: true },
    { warned: true, happened: false },
    { warned: false, happened: true },
    { warned: false, happened: false },
    { warned: null, happened: true },
    { warned: true, happened: null },
  ];
  expect(contingencyOf(cases)).toEqual({ ...table(1, 1, 1, 1), notKnown: 2 });
});
