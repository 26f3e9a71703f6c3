import { saturationVapourPressureIceHPa, saturationVapourPressureWaterHPa } from '../temperature';

/**
 * Relative humidity over ice from that over water at the same temperature.
 *
 * Units: % and °C in; % out. Valid: −45 to 0 °C (both formulas); computed beyond as an extrapolation.
 * Source: [WMO8] annex 4.B; humidity is reported over water at all temperatures.
 */
export const iceFromWaterHumidityPercent = (overWaterPercent: number, temperatureC: number): number =>
  (overWaterPercent * saturationVapourPressureWaterHPa(temperatureC)) /
  saturationVapourPressureIceHPa(temperatureC);

/**
 * Relative humidity over water from that over ice at the same temperature.
 *
 * Units: % and °C in; % out. Valid: −45 to 0 °C (both formulas); computed beyond as an extrapolation.
 * Source: [WMO8] annex 4.B.
 */
export const waterFromIceHumidityPercent = (overIcePercent: number, temperatureC: number): number =>
  (overIcePercent * saturationVapourPressureIceHPa(temperatureC)) /
  saturationVapourPressureWaterHPa(temperatureC);
