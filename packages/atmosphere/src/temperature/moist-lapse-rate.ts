import {
  DRY_AIR_GAS_CONSTANT_J_PER_KG_K,
  DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K,
  EPSILON,
  GRAVITY_M_PER_S2,
  ZERO_CELSIUS_K,
} from '../constants/constants';
import { saturationVapourPressureBoltonHPa } from './saturation';

/**
 * Latent heat of vaporisation.
 *
 * Units: °C in, J/kg out. Valid: about −40 to 40 °C. Source: [Bolton1980] equation 2.
 */
export const latentHeatOfVaporisationJPerKg = (temperatureC: number): number => 2.501e6 - 2370 * temperatureC;

/**
 * Moist-adiabatic lapse rate Γm of saturated air at its own temperature and pressure (6.5 K/km at 0 °C and
 * 1000 hPa, 9.2 K/km at −30 °C: never a constant).
 *
 * Units: °C and hPa in (latent heat in J/kg, by default that of the temperature), K/km out. Valid: about −60 to 50 °C with pressure well above the vapour pressure; NaN where
 * the pressure does not exceed it. Source: [AMSGlossary] moist-adiabatic lapse rate, with [Bolton1980] vapour
 * pressure over water and latent heat.
 */
export function moistLapseRateKPerKm(
  temperatureC: number,
  pressureHPa: number,
  latentHeatJPerKg: number = latentHeatOfVaporisationJPerKg(temperatureC),
): number {
  const vapourHPa = saturationVapourPressureBoltonHPa(temperatureC);
  if (!(pressureHPa > vapourHPa)) return NaN;
  const temperatureK = temperatureC + ZERO_CELSIUS_K;
  const mixingRatio = (EPSILON * vapourHPa) / (pressureHPa - vapourHPa);
  const latent = latentHeatJPerKg;
  const warmed = (latent * mixingRatio) / (DRY_AIR_GAS_CONSTANT_J_PER_KG_K * temperatureK);
  const held = (warmed * latent * EPSILON) / temperatureK;
  return (1000 * GRAVITY_M_PER_S2 * (1 + warmed)) / (DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K + held);
}
