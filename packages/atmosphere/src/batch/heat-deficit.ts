import {
  DRY_AIR_GAS_CONSTANT_J_PER_KG_K,
  DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K,
  GRAVITY_M_PER_S2,
  KAPPA,
  ZERO_CELSIUS_K,
} from '../constants';
import { exner } from '../temperature';
import { smallExp } from './small-exp';

const G_OVER_R = GRAVITY_M_PER_S2 / DRY_AIR_GAS_CONSTANT_J_PER_KG_K;
const CP_OVER_R = (100 * DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K) / DRY_AIR_GAS_CONSTANT_J_PER_KG_K;

/**
 * Heat deficit of one row of a batch from its lowest level to its level `last`, in one pass: with x = ln(p/p₀),
 * ρ ∝ eˣ/T and θ ∝ T e^(−κx), so that Σ w ρ (θ(h) − θ) = θ(h) Σ w ρ − Σ w ρθ needs no second pass.
 *
 * Units: °C, m, hPa in; J/m² out. Valid: levels from `offset` up to `last` all finite. Equal to the single-profile
 * path within rounding. Source: [Whiteman2014] heat deficit, by Simpson's rule.
 */
export function batchHeatDeficit(
  temperatureC: Float64Array,
  offset: number,
  last: number,
  thicknessM: Float64Array,
  pressureHPa: number,
): number {
  let x = 0;
  let temperatureK = temperatureC[offset]! + ZERO_CELSIUS_K;
  let density = 1 / temperatureK;
  let densityTheta = 1;
  let sumDensity = 0;
  let sumDensityTheta = 0;
  for (let j = 0; j < last; j += 1) {
    const dz = thicknessM[j]!;
    const topK = temperatureC[offset + j + 1]! + ZERO_CELSIUS_K;
    const middleK = 0.5 * (temperatureK + topK);
    const half = G_OVER_R * dz;
    const xMiddle = x - half / (temperatureK + middleK);
    const xTop = xMiddle - half / (middleK + topK);
    const densityMiddle = smallExp(xMiddle) / middleK;
    const thetaMiddle = smallExp((1 - KAPPA) * xMiddle);
    const densityTop = smallExp(xTop) / topK;
    const thetaTop = smallExp((1 - KAPPA) * xTop);
    sumDensity += dz * (density + 4 * densityMiddle + densityTop);
    sumDensityTheta += dz * (densityTheta + 4 * thetaMiddle + thetaTop);
    x = xTop;
    temperatureK = topK;
    density = densityTop;
    densityTheta = thetaTop;
  }
  const thetaLast = temperatureK * smallExp(-KAPPA * x);
  const atBase = (CP_OVER_R * pressureHPa) / exner(pressureHPa);
  return (atBase * (thetaLast * sumDensity - sumDensityTheta)) / 6;
}
