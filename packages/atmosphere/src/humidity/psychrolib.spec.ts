import psychrolib from 'psychrolib';
import { humidityOf, mixingRatio, specificHumidity, vapourPressureFromFrostPointHPa } from '.';

/** psychrolib follows ASHRAE 2017 (Hyland and Wexler), without the moist-air factor; below 0.01 °C it is over ice. */
psychrolib.SetUnitSystem(psychrolib.SI);

const range = (from: number, to: number, step: number): number[] =>
  Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, i) => from + i * step);
const warm = range(1, 40, 1).flatMap((t) =>
  range(10, 100, 5).flatMap((rh) => [700, 850, 1013.25].map((p) => [t, rh, p] as const)),
);
const cold = range(-40, -1, 1).flatMap((t) => range(20, 95, 5).map((rh) => [t, rh, 900] as const));

const worst = (
  points: readonly (readonly [number, number, number])[],
  apart: (t: number, rh: number, p: number) => number,
) => Math.max(...points.map(([t, rh, p]) => apart(t, rh, p)));
const airOf = (t: number, rh: number, p: number) =>
  humidityOf(t, { kind: 'relative humidity', overWaterPercent: rh }, p);

describe('against psychrolib over a grid', () => {
  it('has at least 2,000 points', () => {
    expect(warm.length + cold.length).toBeGreaterThanOrEqual(2000);
  });
  it('vapour pressure over water agrees within 0.5 %', () => {
    const apart = (t: number, rh: number, p: number) =>
      Math.abs(
        (100 * airOf(t, rh, p).vapourPressureHPa.lo) / psychrolib.GetVapPresFromRelHum(t, rh / 100) - 1,
      );
    expect(worst(warm, apart)).toBeLessThan(0.005);
  });
  it('dew point agrees within 0.05 °C above freezing', () => {
    const apart = (t: number, rh: number, p: number) => {
      const theirs = psychrolib.GetTDewPointFromRelHum(t, rh / 100);
      return theirs < 0.1 ? 0 : Math.abs(airOf(t, rh, p).dewPointC.lo - theirs);
    };
    expect(worst(warm, apart)).toBeLessThan(0.05);
  });
  it('wet bulb agrees within 0.25 °C where it is above freezing (ASHRAE takes adiabatic saturation)', () => {
    const apart = (t: number, rh: number, p: number) => {
      const theirs = psychrolib.GetTWetBulbFromRelHum(t, rh / 100, 100 * p);
      return theirs < 0.5 || rh >= 100 ? 0 : Math.abs(airOf(t, rh, p).wetBulbC.lo - theirs);
    };
    expect(worst(warm, apart)).toBeLessThan(0.25);
  });
  it('vapour pressure over ice agrees within 0.1 % from frost points', () => {
    const apart = (t: number) =>
      Math.abs((100 * vapourPressureFromFrostPointHPa(t).lo) / psychrolib.GetSatVapPres(t) - 1);
    expect(worst(cold, apart)).toBeLessThan(0.001);
  });
  it('frost point agrees within 0.02 °C below saturation (psychrolib stops at the air temperature)', () => {
    const apart = (t: number, rh: number, p: number) => {
      const air = airOf(t, rh, p);
      if (air.overIcePercent.lo > 100) return 0;
      const theirs = psychrolib.GetTDewPointFromVapPres(t, 100 * air.vapourPressureHPa.lo);
      return Math.abs(air.frostPointC.lo - theirs);
    };
    expect(worst(cold, apart)).toBeLessThan(0.02);
  });
  it('mixing ratio and specific humidity agree within 0.01 %', () => {
    const apart = (t: number, rh: number, p: number) => {
      const e = airOf(t, rh, p).vapourPressureHPa.lo;
      const ratio = psychrolib.GetHumRatioFromVapPres(100 * e, 100 * p);
      const q = psychrolib.GetSpecificHumFromHumRatio(ratio);
      return Math.max(Math.abs(mixingRatio(e, p) / ratio - 1), Math.abs(specificHumidity(e, p) / q - 1));
    };
    expect(worst([...warm, ...cold], apart)).toBeLessThan(1e-4);
  });
});
