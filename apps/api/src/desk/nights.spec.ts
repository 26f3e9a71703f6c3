import { nightsBetween, sunTimes } from './nights';

const at = (iso: string): number => Date.parse(iso) / 1000;

/** Worked example: Meeus, Astronomical Algorithms, 2nd ed., ch. 15 (equinox and solstice day lengths, from memory). */
const DAY_LENGTHS: readonly [string, string, number, number][] = [
  ['the equator at the equinox', '2026-03-20T12:00:00Z', 0, 12.12],
  ['45 N at the December solstice', '2026-12-21T12:00:00Z', 45, 8.77],
  ['45 N at the June solstice', '2026-06-21T12:00:00Z', 45, 15.62],
];

test.each(DAY_LENGTHS)('the day at %s has its length within five minutes', (_, iso, latitude, hours) => {
  const { rise, set } = sunTimes(at(iso), latitude, 0)!;
  expect(Math.abs((set - rise) / 3600 - hours)).toBeLessThan(5 / 60);
});

test('there is no sunrise in the polar night', () => {
  expect(sunTimes(at('2026-12-21T12:00:00Z'), 75, 0)).toBeNull();
});

test('a week has its eight nights, each from an evening to the next morning', () => {
  const nights = nightsBetween(at('2026-01-10T07:00:00Z'), at('2026-01-17T07:00:00Z'), 43.6, -116.2);
  expect(nights).toHaveLength(8);
  for (const { from, to } of nights) expect((to - from) / 3600).toBeCloseTo(14.6, 0);
});
