import type { Truth } from '../bounds';
import { saturationVapourPressureIceHPa, saturationVapourPressureWaterHPa } from '../temperature';
import type { HumidityLevel } from './level';

/** Below this temperature, °C, a layer counts as saturated over ice. Common practice: ice fog is usual from here. */
export const SATURATED_OVER_ICE_BELOW_C = -30;

/** Whether a layer is saturated, and the height of the reading that said so. */
export interface SaturationFinding {
  readonly saturated: Truth;
  readonly atM: number | null;
}

/**
 * Whether a reading of relative humidity means saturation: at least 100 % less its own standard deviation, over
 * water, and over ice below −30 °C.
 *
 * Units: % over water, °C. Valid: humidity 0 % or more; an unknown σ counts as 0.
 * Source: [WMO8] (RH over water at all temperatures; annex 4.B for ice).
 */
export function isSaturated(
  relativeHumidityPercent: number,
  sigmaPercent: number,
  temperatureC: number,
): boolean {
  const overIce = temperatureC < SATURATED_OVER_ICE_BELOW_C;
  const factor = overIce
    ? saturationVapourPressureWaterHPa(temperatureC) / saturationVapourPressureIceHPa(temperatureC)
    : 1;
  return relativeHumidityPercent * factor >= 100 - sigmaPercent * factor;
}

/**
 * Whether a layer is saturated, from the humidity sensors within it: any that says so decides, and its height is
 * said; a layer without a humidity sensor is *not known*.
 *
 * Units: m, °C, %. Valid: any layer. Source: [WMO8] (RH over water at all temperatures).
 */
export function layerSaturation(
  baseM: number,
  topM: number,
  meanTemperatureC: number,
  humidity: readonly HumidityLevel[],
): SaturationFinding {
  const inside = humidity.filter(
    (h) => h.heightM >= baseM && h.heightM <= topM && Number.isFinite(h.relativeHumidityPercent),
  );
  const wet = inside.find((h) =>
    isSaturated(h.relativeHumidityPercent!, h.sigmaPercent ?? 0, meanTemperatureC),
  );
  if (wet !== undefined) return { saturated: 'true', atM: wet.heightM };
  return { saturated: inside.length > 0 ? 'false' : 'not known', atM: null };
}
