import fc from 'fast-check';
import moist from '../../../../fixtures/golden/moist-lapse-rate.json';
import atmosphere from '../../../../fixtures/golden/standard-atmosphere.json';
import saturation from '../../../../fixtures/golden/saturation-vapour-pressure.json';
import { DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';
import {
  dryAdiabatTemperatureK,
  exner,
  geopotentialHeightM,
  latentHeatOfVaporisationJPerKg,
  moistAirFactor,
  moistLapseRateKPerKm,
  potentialTemperatureK,
  pressureAboveHPa,
  saturationVapourPressureBoltonHPa,
  saturationVapourPressureIceHPa,
  saturationVapourPressureWaterHPa,
  standardAtmosphere,
  standardPressureHPa,
  thicknessM,
} from '.';

const formula = {
  bolton: saturationVapourPressureBoltonHPa,
  water: saturationVapourPressureWaterHPa,
  ice: saturationVapourPressureIceHPa,
} as const;
type Formula = keyof typeof formula;

describe.each(saturation.tables)('saturation vapour pressure: $name', ({ of, relativeTolerance, rows }) => {
  it.each(rows)('at %f °C', (temperatureC, expected) => {
    const value = formula[of as Formula](temperatureC!);
    expect(Math.abs(value / expected! - 1)).toBeLessThanOrEqual(relativeTolerance);
  });
});

describe('moist-adiabatic lapse rate', () => {
  it.each(moist.rows)('at %f °C and %f hPa', (temperatureC, pressureHPa, expected) => {
    const rate = moistLapseRateKPerKm(temperatureC!, pressureHPa!);
    expect(Math.abs(rate - expected!)).toBeLessThan(moist.absoluteToleranceKPerKm);
  });

  /** Follows the moist adiabat upward: dT/dp = Γm/(ρ g), Runge-Kutta; MetPy held the latent heat at its 0 °C value. */
  const ascended = (startC: number, fromHPa: number, toHPa: number): number => {
    const steps = 400;
    const step = (toHPa - fromHPa) / steps;
    const slope = (tC: number, p: number) =>
      ((moistLapseRateKPerKm(tC, p, 2.50084e6) / 1000) * 287.0474 * (tC + 273.15)) / (9.80665 * p);
    let [tC, p] = [startC, fromHPa];
    for (let i = 0; i < steps; i += 1) {
      const k1 = slope(tC, p);
      const k2 = slope(tC + (step / 2) * k1, p + step / 2);
      const k3 = slope(tC + (step / 2) * k2, p + step / 2);
      const k4 = slope(tC + step * k3, p + step);
      tC += (step / 6) * (k1 + 2 * k2 + 2 * k3 + k4);
      p += step;
    }
    return tC + 273.15;
  };
  const ascents = moist.ascents.cases.flatMap(({ startC, rows }) =>
    rows.map(([p, k]) => [startC, p!, k!] as const),
  );
  it.each(ascents)(
    'from %f °C at 1000 hPa to %f hPa as MetPy published',
    (startC, pressureHPa, expectedK) => {
      expect(Math.abs(ascended(startC, 1000, pressureHPa) - expectedK)).toBeLessThan(
        moist.ascents.absoluteToleranceK,
      );
    },
  );

  it('is about 6 K/km near freezing and nears the dry rate in great cold (common practice; AMS Glossary)', () => {
    expect(Math.round(moistLapseRateKPerKm(0, 925))).toBe(6);
    expect(moistLapseRateKPerKm(-60, 1000)).toBeGreaterThan(0.98 * DRY_ADIABATIC_LAPSE_RATE_K_PER_KM);
    expect(moistLapseRateKPerKm(100, 1000)).toBeNaN();
  });
  it('is below the dry rate everywhere, and falls with warmth', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -60, max: 45, noNaN: true }),
        fc.double({ min: 500, max: 1050, noNaN: true }),
        (t, p) => {
          expect(moistLapseRateKPerKm(t, p)).toBeLessThan(DRY_ADIABATIC_LAPSE_RATE_K_PER_KM);
          expect(moistLapseRateKPerKm(t + 1, p)).toBeLessThan(moistLapseRateKPerKm(t, p));
        },
      ),
    );
  });
  it('uses the latent heat of Bolton eq. 2 (2,453,600 J/kg at 20 °C)', () => {
    expect(latentHeatOfVaporisationJPerKg(20)).toBeCloseTo(2453600, 6);
  });
});

describe('potential temperature', () => {
  /** MetPy tests, potential_temperature and exner_function; ecCodes-based earthkit uses 0.285691 for κ. */
  it.each([
    [278, 900, 286.496],
    [283, 500, 344.981],
    [291, 300, 410.475],
    [298, 100, 575.348],
    [293, 800, 312.2886],
  ])('%f K at %f hPa', (temperatureK, pressureHPa, expected) => {
    expect(potentialTemperatureK(temperatureK, pressureHPa)).toBeCloseTo(expected, 2.9);
  });
  it.each([
    [900, 0.97034558],
    [500, 0.82033536],
    [300, 0.70893444],
    [100, 0.51794747],
  ])('Exner function at %f hPa', (pressureHPa, expected) => {
    expect(exner(pressureHPa)).toBeCloseTo(expected, 7);
  });
  it.each([
    [900, 294.16],
    [864.89, 290.83],
  ])('303.15 K brought from 1000 to %f hPa (MetPy tests, dry_lapse)', (pressureHPa, expected) => {
    expect(dryAdiabatTemperatureK(303.15, 1000, pressureHPa)).toBeCloseTo(expected, 2);
  });
  it('has no value without pressure', () => {
    expect([exner(0), exner(-1), exner(NaN)].every(Number.isNaN)).toBe(true);
  });
});

describe('hydrostatics', () => {
  it('gives the thickness 1000 to 500 hPa at 0 °C (MetPy tests: 5542.12 m, with R 287.058)', () => {
    expect(Math.abs(thicknessM(1000, 500, 273.15) / 5542.12 - 1)).toBeLessThan(4e-5);
    expect(pressureAboveHPa(1000, thicknessM(1000, 500, 273.15), 273.15)).toBeCloseTo(500, 9);
  });
  it('gives the moist-air factor of WMO-No. 8', () => {
    expect(moistAirFactor(1013.25)).toBeCloseTo(1.004719, 6);
    expect(moistAirFactor(1000)).toBeCloseTo(1.004676, 6);
  });
});

describe('standard atmosphere', () => {
  it.each(atmosphere.rows)('at %f m', (heightM, temperatureK, pressureHPa, density) => {
    const air = standardAtmosphere(heightM!)!;
    const near = (value: number, expected: number) =>
      expect(Math.abs(value / expected - 1)).toBeLessThan(atmosphere.relativeTolerance);
    near(air.temperatureK, temperatureK!);
    near(air.pressureHPa, pressureHPa!);
    near(air.densityKgPerM3, density!);
  });
  it.each(atmosphere.ashrae.rows)('ASHRAE at %f m', (heightM, pressureHPa) => {
    expect(Math.abs(standardPressureHPa(heightM!)! - pressureHPa!)).toBeLessThan(
      atmosphere.ashrae.absoluteToleranceHPa,
    );
  });
  it('ends at the tropopause and says so', () => {
    expect([standardAtmosphere(11001), standardAtmosphere(NaN), standardPressureHPa(-5001)]).toEqual([
      null,
      null,
      null,
    ]);
  });
  it('knows geopotential from geometric height (ICAO Doc 7488: 11,019 m are 11,000 m)', () => {
    expect(geopotentialHeightM(11019)).toBeCloseTo(11000, 0);
  });
});
