import { exactly, notKnown, type Quantity } from '../bounds';
import { ICE_FORMULA_C, WATER_FORMULA_C } from './vapour-pressure';

const SATURATION_AT_0_C_HPA = 6.112;
/** Past the end of a formula's range by less than this, °C, an inverted value is on it: it covers only rounding. */
const ROUNDING_C = 1e-6;

/**
 * Dew point, over water also below 0 °C.
 *
 * Units: hPa in; °C out. Valid: vapour pressures whose dew point lies within −45 to 60 °C; else not known (no vapour
 * has no dew point). Source: [WMO8] annex 4.B, inverted.
 */
export function dewPointC(vapourPressureHPa: number): Quantity {
  if (!(vapourPressureHPa > 0)) return notKnown('air without vapour has no dew point');
  const x = Math.log(vapourPressureHPa / SATURATION_AT_0_C_HPA);
  const point = (243.12 * x) / (17.62 - x);
  const inRange =
    x < 17.62 &&
    point >= WATER_FORMULA_C.lowest - ROUNDING_C &&
    point <= WATER_FORMULA_C.highest + ROUNDING_C;
  return inRange
    ? exactly(point)
    : notKnown('the dew point is outside −45 to 60 °C, where the formula holds');
}

/**
 * Frost point, over ice.
 *
 * Units: hPa in; °C out. Valid: vapour pressures up to 6.112 hPa whose frost point is not below −65 °C; else not known.
 * Source: [WMO8] annex 4.B, inverted.
 */
export function frostPointC(vapourPressureHPa: number): Quantity {
  if (!(vapourPressureHPa > 0)) return notKnown('air without vapour has no frost point');
  const x = Math.log(vapourPressureHPa / SATURATION_AT_0_C_HPA);
  const point = (272.62 * x) / (22.46 - x);
  if (point > ICE_FORMULA_C.highest + ROUNDING_C || x >= 22.46)
    return notKnown('there is no frost point above 0 °C');
  return point >= ICE_FORMULA_C.lowest - ROUNDING_C
    ? exactly(point)
    : notKnown('the frost point is below −65 °C, where the formula ends');
}

/**
 * Dew point from vapour pressure by Bolton's formula, for comparison with published values.
 *
 * Units: hPa in; °C out. Valid: −35 to 35 °C; NaN for no vapour. Source: [Bolton1980] equation 11.
 */
export function dewPointBoltonC(vapourPressureHPa: number): number {
  const x = Math.log(vapourPressureHPa / SATURATION_AT_0_C_HPA);
  return (243.5 * x) / (17.67 - x);
}
