import { DRY_AIR_GAS_CONSTANT_J_PER_KG_K, GRAVITY_M_PER_S2 } from '../constants';

/**
 * Pressure at the upper end of a layer, hydrostatic, from its mean temperature (hypsometric equation, dry air).
 *
 * Units: hPa, m, K in; hPa out. Valid: mean temperature above 0 K; layers of up to about 1 km (the mean stands for
 * the layer). Source: [AMSGlossary] hypsometric equation.
 */
export const pressureAboveHPa = (pressureHPa: number, thicknessM: number, meanTemperatureK: number): number =>
  pressureHPa *
  Math.exp((-GRAVITY_M_PER_S2 * thicknessM) / (DRY_AIR_GAS_CONSTANT_J_PER_KG_K * meanTemperatureK));

/**
 * Thickness of a layer of dry air between two pressures (hypsometric equation).
 *
 * Units: hPa and K in, m out. Valid: pressures and temperature above 0; else NaN.
 * Source: [AMSGlossary] hypsometric equation.
 */
export const thicknessM = (lowerHPa: number, upperHPa: number, meanTemperatureK: number): number =>
  ((DRY_AIR_GAS_CONSTANT_J_PER_KG_K * meanTemperatureK) / GRAVITY_M_PER_S2) * Math.log(lowerHPa / upperHPa);
