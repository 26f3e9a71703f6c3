import { EPSILON, VAPOUR_GAS_CONSTANT_J_PER_KG_K, ZERO_CELSIUS_K } from '../constants';

/**
 * Mixing ratio of water vapour to dry air, r = ε e/(p − e).
 *
 * Units: hPa in; kg/kg out. Valid: 0 ≤ e < p; else NaN. Source: [AMSGlossary] mixing ratio.
 */
export const mixingRatio = (vapourHPa: number, pressureHPa: number): number =>
  vapourHPa >= 0 && vapourHPa < pressureHPa ? (EPSILON * vapourHPa) / (pressureHPa - vapourHPa) : NaN;

/**
 * Specific humidity, vapour to moist air, q = ε e/(p − (1 − ε) e).
 *
 * Units: hPa in; kg/kg out. Valid: 0 ≤ e < p; else NaN. Source: [AMSGlossary] specific humidity.
 */
export const specificHumidity = (vapourHPa: number, pressureHPa: number): number =>
  vapourHPa >= 0 && vapourHPa < pressureHPa
    ? (EPSILON * vapourHPa) / (pressureHPa - (1 - EPSILON) * vapourHPa)
    : NaN;

/**
 * Mixing ratio from specific humidity, r = q/(1 − q).
 *
 * Units: kg/kg in and out. Valid: 0 ≤ q < 1; else NaN. Source: [AMSGlossary] specific humidity.
 */
export const mixingRatioFromSpecificHumidity = (q: number): number => (q >= 0 && q < 1 ? q / (1 - q) : NaN);

/**
 * Vapour pressure from the mixing ratio, e = p r/(ε + r).
 *
 * Units: kg/kg and hPa in; hPa out. Valid: r ≥ 0; else NaN. Source: [AMSGlossary] mixing ratio, inverted.
 */
export const vapourPressureFromMixingRatioHPa = (ratio: number, pressureHPa: number): number =>
  ratio >= 0 ? (pressureHPa * ratio) / (EPSILON + ratio) : NaN;

/**
 * Absolute humidity (vapour density), ρv = e/(Rv T).
 *
 * Units: °C and hPa in; g/m³ out. Valid: temperatures above absolute zero. Source: [AMSGlossary] absolute humidity.
 */
export const absoluteHumidityGPerM3 = (temperatureC: number, vapourHPa: number): number =>
  (1000 * 100 * vapourHPa) / (VAPOUR_GAS_CONSTANT_J_PER_KG_K * (temperatureC + ZERO_CELSIUS_K));

/**
 * Virtual temperature: that of dry air of the same density and pressure, Tv = T (1 + r/ε)/(1 + r).
 *
 * Units: K and kg/kg in; K out. Valid: r ≥ 0. Source: [AMSGlossary] virtual temperature.
 */
export const virtualTemperatureK = (temperatureK: number, ratio: number): number =>
  (temperatureK * (1 + ratio / EPSILON)) / (1 + ratio);
