import fc from 'fast-check';
import golden from '../../../../fixtures/golden/humidity.json';
import { isKnown, isNotKnown } from '../bounds';
import { saturationVapourPressureBoltonHPa } from '../temperature';
import {
  dewPointBoltonC,
  dewPointC,
  frostPointC,
  humidityOf,
  iceFromWaterHumidityPercent,
  mixingRatioFromSpecificHumidity,
  specificHumidity,
  vapourPressureFromFrostPointHPa,
  vapourPressureFromMixingRatioHPa,
  virtualTemperatureK,
  waterFromIceHumidityPercent,
  wetBulbC,
  wetBulbStullC,
} from '.';

const close = (value: number, expected: number, relative: number) =>
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(relative * Math.max(1, Math.abs(expected)));

describe('from relative humidity (WMO-No. 8)', () => {
  const { rows, relativeTolerance } = golden.derived;
  it.each(rows)('$t_C °C, $rh_water_pct %', (row) => {
    const air = humidityOf(
      row.t_C,
      { kind: 'relative humidity', overWaterPercent: row.rh_water_pct },
      row.p_hPa,
    );
    close(air.vapourPressureHPa.lo, row.e_hPa, relativeTolerance);
    expect(Math.abs(air.dewPointC.lo - row.td_C)).toBeLessThan(1e-3);
    close(air.mixingRatioGPerKg.lo, row.mixing_ratio_g_kg, relativeTolerance);
    close(air.specificHumidityGPerKg.lo, row.specific_humidity_g_kg, relativeTolerance);
    close(air.absoluteHumidityGPerM3.lo, row.abs_humidity_g_m3, relativeTolerance);
    close(air.virtualTemperatureC.lo + 273.15, row.Tv_K, 1e-6);
    close(air.overWaterPercent.lo, row.rh_water_pct, 1e-9);
    if (row.tf_C === null) expect(isNotKnown(air.frostPointC)).toBe(true);
    else close(air.frostPointC.lo, row.tf_C, relativeTolerance);
    if (row.t_C > 0) expect(isNotKnown(air.overIcePercent)).toBe(true);
    else close(air.overIcePercent.lo, row.rh_ice_pct!, relativeTolerance);
  });
});

describe('psychrometer (WMO-No. 8)', () => {
  const { rows, relativeTolerance } = golden.psychrometer;
  it.each(rows)('$t_C / $tw_C °C over $surface', (row) => {
    const air = humidityOf(row.t_C, { kind: 'wet bulb', wetBulbC: row.tw_C }, row.p_hPa);
    close(air.vapourPressureHPa.lo, row.e_hPa, relativeTolerance);
    close(air.overWaterPercent.lo, row.rh_pct, relativeTolerance);
    expect(Math.abs(air.dewPointC.lo - row.td_C)).toBeLessThan(1e-3);
  });
  it('goes back to the wet bulb', () => {
    const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(number(-30, 40), number(0, 8), number(700, 1050), (t, depression, p) => {
        const vapour = humidityOf(t, { kind: 'wet bulb', wetBulbC: t - depression }, p).vapourPressureHPa;
        fc.pre(isKnown(vapour) && vapour.lo > 1e-3 && Math.abs(t - depression) > 0.5);
        expect(wetBulbC(t, vapour.lo, p).lo).toBeCloseTo(t - depression, 6);
      }),
    );
  });
});

describe('common practice', () => {
  it.each([
    [20, 53],
    [10, 100],
  ])('12.3 mb is %f °C: %f %%', (t, expected) => {
    const air = humidityOf(t, { kind: 'dew point', dewPointC: dewPointC(12.3).lo }, 1013.25);
    expect(Math.round(air.overWaterPercent.lo)).toBe(expected);
  });
});

describe('published values', () => {
  it('MetPy tests: 25 °C with dew point 15 °C is 53.80 %, 70 °F with 55 °F 58.935 % (Bolton)', () => {
    const ratio = (t: number, td: number) =>
      (100 * saturationVapourPressureBoltonHPa(td)) / saturationVapourPressureBoltonHPa(t);
    expect(ratio(25, 15)).toBeCloseTo(53.8, 2);
    expect(ratio((70 - 32) / 1.8, (55 - 32) / 1.8)).toBeCloseTo(58.935, 3);
  });
  it('MetPy tests: dew point of 15.8256 hPa is 13.8564 °C (Bolton)', () => {
    expect(dewPointBoltonC(15.8256)).toBeCloseTo(13.8564, 4);
  });
  it('MetPy tests: vapour pressure of r 0.04963 at 998 hPa is 73.75179 hPa', () => {
    expect(vapourPressureFromMixingRatioHPa(0.04963, 998)).toBeCloseTo(73.75, 2);
  });
  it('earthkit tests: q 0.008 is r 0.0080645161; 286.4 K with q 0.0196078431 has Tv 289.813 K', () => {
    expect(mixingRatioFromSpecificHumidity(0.008)).toBeCloseTo(0.0080645161, 10);
    expect(virtualTemperatureK(286.4, mixingRatioFromSpecificHumidity(0.0196078431))).toBeCloseTo(289.813, 2);
  });
  /** WMO-No. 8: humidity over water at which ice is saturated. */
  it.each([
    [-5, 95.16],
    [-10, 90.54],
    [-20, 81.98],
    [-30, 74.31],
    [-40, 67.56],
  ])('ice is saturated at %f °C from %f %% over water', (t, percent) => {
    expect(waterFromIceHumidityPercent(100, t)).toBeCloseTo(percent, 1.9);
    expect(iceFromWaterHumidityPercent(waterFromIceHumidityPercent(42, t), t)).toBeCloseTo(42, 9);
  });
  it('Stull 2011: 20 °C and 50 % have a wet bulb of 13.7 °C', () => {
    expect(wetBulbStullC(20, 50).lo).toBeCloseTo(13.6993, 4);
    expect(isNotKnown(wetBulbStullC(-30, 50))).toBe(true);
  });
  it('MetPy tests: wet bulb of 25 °C with dew point 15 °C at 1000 hPa is 18.3 °C (a service’s calculator gives 18.59)', () => {
    const air = humidityOf(25, { kind: 'dew point', dewPointC: 15 }, 1000);
    expect(Math.abs(air.wetBulbC.lo - 18.46)).toBeLessThan(0.2);
  });
});

describe('outside the formulas', () => {
  it.each([
    [70, 50, 'outside'],
    [-50, 50, 'outside'],
    [20, -1, 'no humidity'],
    [20, 150, 'no humidity'],
    [20, NaN, 'no humidity'],
    [null, 50, 'air temperature'],
  ])('%s °C and %f %%: not known, with the reason', (t, rh, reason) => {
    const air = humidityOf(t, { kind: 'relative humidity', overWaterPercent: rh }, 1000);
    expect(isNotKnown(air.dewPointC)).toBe(true);
    expect(air.dewPointC.reason).toContain(reason);
  });
  it('refuses a wet bulb above the air, and one too cold to be one', () => {
    expect(humidityOf(10, { kind: 'wet bulb', wetBulbC: 11 }, 1000).dewPointC.reason).toContain('above');
    expect(humidityOf(40, { kind: 'wet bulb', wetBulbC: 5 }, 1000).dewPointC.reason).toContain('too cold');
    expect(humidityOf(10, { kind: 'wet bulb', wetBulbC: 5 }, NaN).dewPointC.reason).toContain('pressure');
  });
  it('has no dew point without vapour, no frost point above 0 °C and no wet bulb above saturation', () => {
    expect(
      [dewPointC(0), frostPointC(7), wetBulbC(10, 20, 1000), vapourPressureFromFrostPointHPa(5)].every(
        isNotKnown,
      ),
    ).toBe(true);
    expect(specificHumidity(1000, 900)).toBeNaN();
  });
  it('round-trips dew and frost points', () => {
    fc.assert(
      fc.property(fc.double({ min: -40, max: -1, noNaN: true }), (point) => {
        const dew = humidityOf(0, { kind: 'dew point', dewPointC: point }, 1000);
        expect(dew.dewPointC.lo).toBeCloseTo(point, 9);
        expect(vapourPressureFromFrostPointHPa(dew.frostPointC.lo).lo).toBeCloseTo(
          dew.vapourPressureHPa.lo,
          9,
        );
      }),
    );
  });
});
