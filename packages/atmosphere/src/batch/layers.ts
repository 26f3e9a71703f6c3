import {
  DRY_ADIABATIC_LAPSE_RATE_K_PER_KM,
  DRY_AIR_GAS_CONSTANT_J_PER_KG_K,
  GRAVITY_M_PER_S2,
  ZERO_CELSIUS_K,
} from '../constants';
import { SAME_LAPSE_RATE_K_PER_KM } from '../profile';
import { moistLapseRateKPerKm } from '../temperature';
import { isGiven, NO_CLASS, pressureOf, type BatchResult, type ProfileBatch } from './profiles';
import { shortExp } from './short-exp';

/** Constants held in this file: reading an imported one again and again costs more than the arithmetic. */
const KELVIN = ZERO_CELSIUS_K;
const SAME = SAME_LAPSE_RATE_K_PER_KM;
const DRY_BOUND = DRY_ADIABATIC_LAPSE_RATE_K_PER_KM + SAME;
const G_OVER_R = GRAVITY_M_PER_S2 / DRY_AIR_GAS_CONSTANT_J_PER_KG_K;
const NONE = NO_CLASS;
const [ABSOLUTELY_UNSTABLE, CONDITIONALLY_UNSTABLE, STABLE, ISOTHERMAL, INVERSION] = [0, 1, 2, 3, 4] as const;

/** Mean pressure of layer j, carried up from the lowest level past levels that gave nothing. */
const meanPressureHPa = (batch: ProfileBatch, row: number, j: number): number => {
  const { heightsM, temperatureC } = batch;
  const offset = row * heightsM.length;
  let belowM = heightsM[0]!;
  let belowC = NaN;
  let x = 0;
  let xLower = 0;
  for (let k = 0; k <= j + 1; k += 1) {
    const levelC = temperatureC[offset + k]!;
    if (!isGiven(levelC)) continue;
    if (Number.isNaN(belowC)) belowC = levelC;
    x -= (G_OVER_R * (heightsM[k]! - belowM)) / (0.5 * (belowC + levelC) + KELVIN);
    belowM = heightsM[k]!;
    belowC = levelC;
    if (k === j) xLower = x;
  }
  return 0.5 * pressureOf(batch, row) * (shortExp(xLower) + shortExp(x));
};

/** The class of a rate above the isothermal band, where Γm may decide. */
const unstableSide = (batch: ProfileBatch, row: number, j: number, rate: number): number => {
  const at = row * batch.heightsM.length + j;
  const meanC = (batch.temperatureC[at]! + batch.temperatureC[at + 1]!) / 2;
  const moist = moistLapseRateKPerKm(meanC, meanPressureHPa(batch, row, j));
  return rate <= moist + SAME ? STABLE : CONDITIONALLY_UNSTABLE;
};

/**
 * Lapse rates and textbook classes of all layers of a batch; Γm is computed only where it decides the class.
 *
 * Units: °C, m, hPa in; K/km out. Valid: a batch whose arrays fit; layers with a missing level get NaN and `NO_CLASS`.
 * Source: [AMSGlossary] lapse rate, static stability, moist-adiabatic lapse rate.
 */
export function batchLayers(batch: ProfileBatch, thicknessM: Float64Array, result: BatchResult): void {
  const { temperatureC, isothermalHalfWidthKPerKm: w } = batch;
  const { lapseRateKPerKm, stabilityClass } = result;
  const profiles = batch.pressureHPa.length;
  const layers = thicknessM.length;
  for (let row = 0, at = 0, level = 0; row < profiles; row += 1, level += 1) {
    let lower = temperatureC[level]!;
    for (let j = 0; j < layers; j += 1, at += 1) {
      level += 1;
      const upper = temperatureC[level]!;
      const rate = isGiven(lower) && isGiven(upper) ? 0 - (1000 * (upper - lower)) / thicknessM[j]! : NaN;
      lower = upper;
      lapseRateKPerKm[at] = rate;
      if (rate < -w - SAME) stabilityClass[at] = INVERSION;
      else if (rate <= w + SAME) stabilityClass[at] = ISOTHERMAL;
      else if (rate > DRY_BOUND) stabilityClass[at] = ABSOLUTELY_UNSTABLE;
      else stabilityClass[at] = Number.isNaN(rate) ? NONE : unstableSide(batch, row, j, rate);
    }
  }
}
