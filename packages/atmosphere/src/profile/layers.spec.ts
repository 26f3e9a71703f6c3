import fc from 'fast-check';
import classes from '../../../../fixtures/golden/stability-classes.json';
import { AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM, DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';
import { moistLapseRateKPerKm } from '../temperature';
import { levelsOfATower, profileOf } from '../testing/profiles';
import { layersOf, makeProfile, STABILITY_CLASSES, stabilityClass } from '.';

describe('static classes', () => {
  it.each(classes.static.rows)('at %f °C, %f hPa a lapse rate of %f K/km is %s', (t, p, rate, expected) => {
    const moist = moistLapseRateKPerKm(Number(t), Number(p));
    expect(stabilityClass(Number(rate), moist)).toBe(expected);
  });

  it('partition the axis, from unstable to inversion', () => {
    const rate = fc.double({ min: -500, max: 100, noNaN: true });
    fc.assert(
      fc.property(rate, rate, fc.double({ min: 2.8, max: 9.7, noNaN: true }), (a, b, moist) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)].map((r) =>
          STABILITY_CLASSES.indexOf(stabilityClass(r, moist)),
        );
        expect(low).toBeGreaterThanOrEqual(high!);
        expect(high).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it.each([
    [1, 'isothermal'],
    [-1, 'isothermal'],
    [1.001, 'stable'],
    [-1.001, 'inversion'],
    [6, 'stable'],
    [6.001, 'conditionally unstable'],
    [DRY_ADIABATIC_LAPSE_RATE_K_PER_KM, 'conditionally unstable'],
    [DRY_ADIABATIC_LAPSE_RATE_K_PER_KM + 0.001, 'absolutely unstable'],
  ])('bound: %f K/km with Γm 6 is %s', (rate, expected) => {
    expect(stabilityClass(rate, 6)).toBe(expected);
    expect(() => stabilityClass(NaN, 6)).toThrow('no class');
  });
});

describe('layersOf', () => {
  it('says how sure it is that the temperature rises: 8 m, +0.2 °C, σ 0.1 each is 0.921, not sure', () => {
    const [layer] = layersOf(profileOf([2, 10], [-10, -9.8], 0.1));
    expect(layer!.probabilities!.rises).toBeCloseTo(0.921, 3);
    expect(layer!.riseSure).toBe('false');
  });

  it('uses the matched pair’s uncertainty where one is declared', () => {
    const air = { matchedPairs: [{ lowerM: 2, upperM: 10, sigmaC: 0.05 }] };
    const [layer] = layersOf(profileOf([2, 10], [-10, -9.8], 0.1, air));
    expect(layer!.sigmaDifferenceC).toBe(0.05);
    expect(layer!.riseSure).toBe('true');
  });

  it('marks superadiabatic and autoconvective layers', () => {
    const marks = [9, 10, 35].map((rate) => layersOf(profileOf([0, 100], [10, 10 - rate / 10]))[0]!);
    expect(marks.map((l) => [l.superadiabatic, l.autoconvective])).toEqual([
      [false, false],
      [true, false],
      [true, true],
    ]);
    expect(AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM).toBeCloseTo(34.16, 2);
  });

  it('reads across a missing level and says so', () => {
    const layers = layersOf(profileOf([2, 10, 30], [0, null, 1]));
    expect(layers.map((l) => [l.baseM, l.topM, l.missingBetweenM])).toEqual([[2, 30, [10]]]);
  });

  it.each([[[]], [[5]], [[null, null]]])('has no layer in %j', (temperatures) => {
    expect(layersOf(profileOf([2, 10].slice(0, temperatures.length), temperatures))).toEqual([]);
  });

  it('knows no probability without uncertainties', () => {
    const [layer] = layersOf(profileOf([2, 10], [0, 1]));
    expect([layer!.probabilities, layer!.sigmaKPerKm, layer!.riseSure]).toEqual([null, null, 'not known']);
  });

  it('takes Γm at the layer’s own temperature and pressure: 7 K/km is stable at −20 °C and conditional at 10 °C', () => {
    const of = (temperatureC: number) =>
      layersOf(profileOf([0, 100], [temperatureC, temperatureC - 0.7], 0.01, { pressureHPa: 1000 }))[0]!;
    expect([of(-20).stabilityClass, of(10).stabilityClass]).toEqual(['stable', 'conditionally unstable']);
    expect([of(10).stableToDry, of(10).stableToSaturated]).toEqual(['true', 'false']);
  });

  it.each([
    [98, 3, 'true', 'false'],
    [90, 3, 'false', 'true'],
  ])('lets Γm decide in saturated air: RH %f %% ± %f', (rh, sigma, saturated, stable) => {
    const air = {
      pressureHPa: 1000,
      humidity: [{ heightM: 2, relativeHumidityPercent: rh, sigmaPercent: sigma }],
    };
    const [layer] = layersOf(profileOf([2, 102], [10, 9.3], 0.01, air));
    expect([layer!.saturated, layer!.stable]).toEqual([saturated, stable]);
    expect(layer!.saturatedAtM).toBe(saturated === 'true' ? 2 : null);
  });

  it('counts saturation over ice below −30 °C: 70 % over water is 94 % over ice at −30 °C', () => {
    const of = (t: number) =>
      layersOf(
        profileOf([2, 10], [t, t], 0.1, {
          humidity: [{ heightM: 2, relativeHumidityPercent: 73, sigmaPercent: 1 }],
        }),
      )[0]!;
    expect([of(-29).saturated, of(-33).saturated]).toEqual(['false', 'true']);
  });

  it('changes no lapse rate when a constant is added to all temperatures', () => {
    fc.assert(
      fc.property(levelsOfATower, fc.double({ min: -10, max: 10, noNaN: true }), (levels, shift) => {
        const shifted = levels.map((l) =>
          l.temperatureC === 200 || l.temperatureC === null
            ? l
            : { ...l, temperatureC: l.temperatureC + shift },
        );
        const [before, after] = [layersOf(makeProfile(levels)), layersOf(makeProfile(shifted))];
        before.forEach((layer, i) => expect(after[i]!.lapseRateKPerKm).toBeCloseTo(layer.lapseRateKPerKm, 6));
      }),
    );
  });

  it('is never surer with a wider σ', () => {
    const sigma = fc.double({ min: 0.01, max: 2, noNaN: true });
    fc.assert(
      fc.property(fc.integer({ min: -50, max: 50 }), sigma, sigma, (rise, a, b) => {
        const sureness = (s: number) =>
          Math.abs(layersOf(profileOf([2, 10], [0, rise / 10], s))[0]!.probabilities!.rises - 0.5);
        expect(sureness(Math.max(a, b))).toBeLessThanOrEqual(sureness(Math.min(a, b)) + 1e-12);
      }),
    );
  });

  it('nests its probabilities', () => {
    fc.assert(
      fc.property(levelsOfATower, (levels) => {
        for (const { probabilities } of layersOf(makeProfile(levels))) {
          if (probabilities === null) continue;
          expect(probabilities.rises).toBeLessThanOrEqual(probabilities.belowMoist);
          expect(probabilities.belowMoist).toBeLessThanOrEqual(probabilities.belowDry);
        }
      }),
    );
  });
});
