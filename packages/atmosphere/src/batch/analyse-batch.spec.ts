import fc from 'fast-check';
import { findInversions } from '../inversions';
import { heatDeficitJPerM2 } from '../mixing';
import { layersOf, makeProfile, STABILITY_CLASSES } from '../profile';
import { analyseBatch, batchResult, NO_CLASS, OPEN_CODES, SURFACE_CODES } from '.';

const tower = fc
  .uniqueArray(fc.integer({ min: 1, max: 400 }), { minLength: 2, maxLength: 7 })
  .map((heights) => heights.sort((a, b) => a - b));
const temperature = fc.oneof(
  { weight: 8, arbitrary: fc.double({ min: -45, max: 35, noNaN: true }) },
  { weight: 3, arbitrary: fc.integer({ min: -4, max: 4 }) },
  { weight: 1, arbitrary: fc.constantFrom(NaN, 200, Infinity) },
);
const pressure = fc.constantFrom(1000, 850, 720, NaN, 5);
const batch = tower.chain((heights) =>
  fc.record({
    heights: fc.constant(heights),
    rows: fc.array(
      fc.record({
        temperatures: fc.array(temperature, { minLength: heights.length, maxLength: heights.length }),
        pressureHPa: pressure,
      }),
      { minLength: 1, maxLength: 6 },
    ),
  }),
);

describe('analyseBatch', () => {
  it('equals the single-profile path', () => {
    fc.assert(
      fc.property(batch, ({ heights, rows }) => {
        const result = analyseBatch({
          heightsM: heights,
          temperatureC: Float64Array.from(rows.flatMap((row) => row.temperatures)),
          pressureHPa: Float64Array.from(rows, (row) => row.pressureHPa),
          assumedPressureHPa: 1013.25,
          isothermalHalfWidthKPerKm: 1,
        });
        rows.forEach(({ temperatures, pressureHPa }, i) => {
          const levels = heights.map((heightM, j) => ({ heightM, temperatureC: temperatures[j]! }));
          const profile = makeProfile(levels, { pressureHPa });
          const layers = layersOf(profile).filter((layer) => layer.missingBetweenM.length === 0);
          heights.slice(1).forEach((topM, j) => {
            const at = i * (heights.length - 1) + j;
            const layer = layers.find((l) => l.topM === topM);
            expect(result.lapseRateKPerKm[at]).toBe(layer?.lapseRateKPerKm ?? NaN);
            const code = layer === undefined ? NO_CLASS : STABILITY_CLASSES.indexOf(layer.stabilityClass);
            expect(result.stabilityClass[at]).toBe(code);
          });
          const { surface } = findInversions(profile, { form: 'plain' });
          expect(result.surface[i]).toBe(SURFACE_CODES[surface.finding]);
          expect(result.open[i]).toBe(OPEN_CODES[surface.inversion?.open ?? 'no']);
          expect(result.topM[i]).toBe(surface.inversion?.topM ?? NaN);
          const strength = surface.strengthWithinTowerC;
          expect(result.strengthC[i]).toBe(strength.lo === -Infinity ? NaN : strength.lo);
          const heat = heatDeficitJPerM2(profile, undefined, findInversions(profile, { form: 'plain' }));
          if (heat.lo === -Infinity) expect(result.heatDeficitJPerM2[i]).toBeNaN();
          else
            expect(Math.abs(result.heatDeficitJPerM2[i]! - heat.lo)).toBeLessThan(
              1e-9 * Math.abs(heat.lo) + 1e-3,
            );
          expect(result.heatAtLeast[i]).toBe(heat.lo !== -Infinity && heat.hi === Infinity ? 1 : 0);
        });
      }),
      { numRuns: 500 },
    );
  });

  const good = {
    heightsM: [2, 10],
    temperatureC: new Float64Array(4),
    pressureHPa: new Float64Array(2),
    assumedPressureHPa: 1000,
    isothermalHalfWidthKPerKm: 1,
  };
  it.each([
    ['one level', { ...good, heightsM: [2] }, 'ascending'],
    ['heights that fall', { ...good, heightsM: [10, 2] }, 'ascending'],
    ['equal heights', { ...good, heightsM: [2, 2] }, 'ascending'],
    ['too few temperatures', { ...good, temperatureC: new Float64Array(3) }, 'need 4 temperatures'],
  ])('refuses %s', (_, unusable, message) => {
    expect(() => analyseBatch(unusable)).toThrow(message);
  });
  it('refuses a result with too little room, and takes no profile at all', () => {
    expect(() => analyseBatch(good, batchResult(1, 2))).toThrow('batchResult');
    expect(
      analyseBatch({ ...good, temperatureC: new Float64Array(0), pressureHPa: new Float64Array(0) }).surface,
    ).toHaveLength(0);
  });
});
