import { DRY_ADIABATIC_LAPSE_RATE_K_PER_KM, KAPPA, REFERENCE_PRESSURE_HPA } from '../constants';

/**
 * Exner function (p/1000 hPa)^κ.
 *
 * Units: hPa in, no unit out. Valid: pressure above 0; else NaN. Source: [AMSGlossary] Exner function.
 */
export const exner = (pressureHPa: number): number =>
  pressureHPa > 0 ? Math.pow(pressureHPa / REFERENCE_PRESSURE_HPA, KAPPA) : NaN;

/**
 * Potential temperature θ = T (1000/p)^κ of dry air.
 *
 * Units: K and hPa in, K out. Valid: pressure above 0; else NaN. Source: [AMSGlossary] potential temperature.
 */
export const potentialTemperatureK = (temperatureK: number, pressureHPa: number): number =>
  temperatureK / exner(pressureHPa);

/**
 * Temperature of dry air brought to another pressure without heat.
 *
 * Units: K and hPa in, K out. Valid: both pressures above 0; else NaN. Source: [AMSGlossary] dry adiabat.
 */
export const dryAdiabatTemperatureK = (temperatureK: number, fromHPa: number, toHPa: number): number =>
  (temperatureK * exner(toHPa)) / exner(fromHPa);

/**
 * Temperature of dry air lifted without heat, by the constant rate Γd: over a mast this differs from the exact
 * adiabat by less than 0.3 % of the change.
 *
 * Units: °C and m in, °C out. Valid: rises of up to a few hundred metres. Source: [AMSGlossary] dry-adiabatic lapse rate.
 */
export const dryAdiabatTemperatureC = (temperatureC: number, riseM: number): number =>
  temperatureC - (DRY_ADIABATIC_LAPSE_RATE_K_PER_KM * riseM) / 1000;
