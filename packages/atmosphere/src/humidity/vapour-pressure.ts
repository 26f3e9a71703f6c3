import { exactly, notKnown, type Quantity } from '../bounds';
import {
  moistAirFactor,
  saturationVapourPressureIceHPa,
  saturationVapourPressureWaterHPa,
} from '../temperature';

/** Temperatures within which the formula over water holds, °C. Source: [WMO8] annex 4.B. */
export const WATER_FORMULA_C = { lowest: -45, highest: 60 } as const;
/** Temperatures within which the formula over ice holds, °C. Source: [WMO8] annex 4.B. */
export const ICE_FORMULA_C = { lowest: -65, highest: 0 } as const;

type FormulaRange = { readonly lowest: number; readonly highest: number };
const holds = (temperatureC: number, range: FormulaRange): boolean =>
  temperatureC >= range.lowest && temperatureC <= range.highest;

/** One of the three ways in which humidity is measured. */
export type MeasuredHumidity =
  | { readonly kind: 'relative humidity'; readonly overWaterPercent: number }
  | { readonly kind: 'dew point'; readonly dewPointC: number }
  | { readonly kind: 'wet bulb'; readonly wetBulbC: number };

const outside = (what: string, temperatureC: number, { lowest, highest }: FormulaRange): Quantity =>
  notKnown(`${what} ${temperatureC} °C is outside ${lowest} to ${highest} °C, where the formula holds`);

/**
 * Vapour pressure from relative humidity over water (the custom at all temperatures).
 *
 * Units: °C and % in; hPa out. Valid: −45 to 60 °C, humidity 0 to 110 % (more is no humidity); else not known.
 * Source: [WMO8] annex 4.B.
 */
export function vapourPressureFromRelativeHumidityHPa(
  temperatureC: number,
  overWaterPercent: number,
): Quantity {
  if (!holds(temperatureC, WATER_FORMULA_C)) return outside('air at', temperatureC, WATER_FORMULA_C);
  if (!(overWaterPercent >= 0 && overWaterPercent <= 110))
    return notKnown(`${overWaterPercent} % is no humidity`);
  return exactly((overWaterPercent / 100) * saturationVapourPressureWaterHPa(temperatureC));
}

/**
 * Vapour pressure from a dew point (over water).
 *
 * Units: °C in; hPa out. Valid: −45 to 60 °C; else not known. Source: [WMO8] annex 4.B.
 */
export function vapourPressureFromDewPointHPa(dewPointC: number): Quantity {
  if (!holds(dewPointC, WATER_FORMULA_C)) return outside('a dew point of', dewPointC, WATER_FORMULA_C);
  return exactly(saturationVapourPressureWaterHPa(dewPointC));
}

/**
 * Vapour pressure from a frost point (over ice).
 *
 * Units: °C in; hPa out. Valid: −65 to 0 °C; else not known. Source: [WMO8] annex 4.B.
 */
export function vapourPressureFromFrostPointHPa(frostPointC: number): Quantity {
  if (!holds(frostPointC, ICE_FORMULA_C)) return outside('a frost point of', frostPointC, ICE_FORMULA_C);
  return exactly(saturationVapourPressureIceHPa(frostPointC));
}

/**
 * Vapour pressure from an aspirated psychrometer (Assmann type): over ice when the wet bulb is below 0 °C.
 *
 * Units: °C and hPa in; hPa out. Valid: wet bulb at or below the air temperature, −45 to 60 °C (ice −65 to 0 °C),
 * pressure above 0; a bulb so cold that no vapour is left gives not known.
 * Source: [WMO8] annex 4.B, psychrometer coefficients from memory.
 */
export function vapourPressureFromWetBulbHPa(
  temperatureC: number,
  wetBulbC: number,
  pressureHPa: number,
): Quantity {
  if (!(pressureHPa > 0)) return notKnown('the pressure is not known');
  if (!(wetBulbC <= temperatureC)) return notKnown('the wet bulb is above the air temperature');
  const ice = wetBulbC < 0;
  const range = ice ? ICE_FORMULA_C : WATER_FORMULA_C;
  if (!holds(wetBulbC, range)) return outside('a wet bulb of', wetBulbC, range);
  if (!(temperatureC <= WATER_FORMULA_C.highest)) return outside('air at', temperatureC, WATER_FORMULA_C);
  const saturated = ice
    ? saturationVapourPressureIceHPa(wetBulbC)
    : saturationVapourPressureWaterHPa(wetBulbC);
  const coefficient = ice ? 5.75e-4 : 6.53e-4 * (1 + 0.000944 * wetBulbC);
  const vapour =
    moistAirFactor(pressureHPa) * saturated - coefficient * pressureHPa * (temperatureC - wetBulbC);
  return vapour >= 0
    ? exactly(vapour)
    : notKnown('the wet bulb is too cold for this air: is it wet and aspirated?');
}

/**
 * Vapour pressure from whichever of the three was measured.
 *
 * Units: °C, hPa in; hPa out. Valid: as for each kind; a wet bulb needs the pressure, measured or assumed.
 * Source: [WMO8] annex 4.B.
 */
export function vapourPressureHPa(
  temperatureC: number,
  measured: MeasuredHumidity,
  pressureHPa: number,
): Quantity {
  switch (measured.kind) {
    case 'relative humidity':
      return vapourPressureFromRelativeHumidityHPa(temperatureC, measured.overWaterPercent);
    case 'dew point':
      return vapourPressureFromDewPointHPa(measured.dewPointC);
    case 'wet bulb':
      return vapourPressureFromWetBulbHPa(temperatureC, measured.wetBulbC, pressureHPa);
  }
}
