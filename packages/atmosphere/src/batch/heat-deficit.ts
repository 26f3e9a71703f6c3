import {
  DRY_AIR_GAS_CONSTANT_J_PER_KG_K,
  DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K,
  GRAVITY_M_PER_S2,
  KAPPA,
  REFERENCE_PRESSURE_HPA,
  ZERO_CELSIUS_K,
} from '../constants';
import { shortExp as exp } from './short-exp';

/** Constants held in this file: reading an imported one again and again costs more than the arithmetic. */
const KELVIN = ZERO_CELSIUS_K;
const MINUS_KAPPA = -KAPPA;
const REFERENCE_HPA = REFERENCE_PRESSURE_HPA;
const G_OVER_R = GRAVITY_M_PER_S2 / DRY_AIR_GAS_CONSTANT_J_PER_KG_K;
const CP_OVER_6_R = (100 * DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K) / (6 * DRY_AIR_GAS_CONSTANT_J_PER_KG_K);
/**
 * Heat deficit of one row of a batch from its lowest level to its level `last`, in one pass: with x = ln(p/p₀),
 * ρ ∝ eˣ/T and θ ∝ T e^(−κx), so that Σ w ρ (θ(h) − θ) = θ(h) Σ w ρ − Σ w ρθ needs no second pass; and one division stands for the four of a layer.
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
  let temperatureK = temperatureC[offset]! + KELVIN;
  let density = 1 / temperatureK;
  let densityTheta = 1;
  let sumDensity = 0;
  let sumDensityTheta = 0;
  let thetaFactor = 1;
  for (let j = 0; j < last; j += 1) {
    const dz = thicknessM[j]!;
    const topK = temperatureC[offset + j + 1]! + KELVIN;
    const middleK = 0.5 * (temperatureK + topK);
    const lowerTwo = temperatureK + middleK;
    const upperTwo = middleK + topK;
    const one = 1 / (lowerTwo * upperTwo * middleK * topK);
    const perTwo = one * middleK * topK;
    const perPoint = one * lowerTwo * upperTwo;
    const half = G_OVER_R * dz;
    const xMiddle = x - half * perTwo * upperTwo;
    x = xMiddle - half * perTwo * lowerTwo;
    const pressureMiddle = exp(xMiddle);
    const pressureTop = exp(x);
    thetaFactor = exp(MINUS_KAPPA * x);
    const densityTop = pressureTop * perPoint * middleK;
    const densityThetaTop = pressureTop * thetaFactor;
    sumDensity += dz * (density + 4 * pressureMiddle * perPoint * topK + densityTop);
    sumDensityTheta +=
      dz * (densityTheta + 4 * pressureMiddle * exp(MINUS_KAPPA * xMiddle) + densityThetaTop);
    temperatureK = topK;
    density = densityTop;
    densityTheta = densityThetaTop;
  }
  const excess = temperatureK * thetaFactor * sumDensity - sumDensityTheta;
  const log = Math.log(pressureHPa / REFERENCE_HPA);
  return CP_OVER_6_R * REFERENCE_HPA * Math.exp((1 + MINUS_KAPPA) * log) * excess;
}
