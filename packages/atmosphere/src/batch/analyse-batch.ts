import {
  DRY_ADIABATIC_LAPSE_RATE_K_PER_KM,
  DRY_AIR_GAS_CONSTANT_J_PER_KG_K,
  GRAVITY_M_PER_S2,
  ZERO_CELSIUS_K,
} from '../constants';
import { ACCEPTED_PRESSURE_HPA, ACCEPTED_TEMPERATURE_C, SAME_LAPSE_RATE_K_PER_KM } from '../profile';
import { moistLapseRateKPerKm } from '../temperature';
import { batchHeatDeficit } from './heat-deficit';
import {
  batchResult,
  NO_CLASS,
  OPEN_CODES,
  SURFACE_CODES,
  type BatchResult,
  type ProfileBatch,
} from './profiles';
import { smallExp } from './small-exp';

const { lowest: COLDEST_C, highest: WARMEST_C } = ACCEPTED_TEMPERATURE_C;
const { lowest: LOWEST_HPA, highest: HIGHEST_HPA } = ACCEPTED_PRESSURE_HPA;
const G_OVER_R = GRAVITY_M_PER_S2 / DRY_AIR_GAS_CONSTANT_J_PER_KG_K;
const DRY_BOUND = DRY_ADIABATIC_LAPSE_RATE_K_PER_KM + SAME_LAPSE_RATE_K_PER_KM;
const ABSOLUTELY_UNSTABLE = 0;
const CONDITIONALLY_UNSTABLE = 1;
const STABLE = 2;
const ISOTHERMAL = 3;
const INVERSION = 4;

const given = (temperatureC: number): boolean => temperatureC >= COLDEST_C && temperatureC <= WARMEST_C;

/** Checks what the loops rely on, once for the whole batch. */
const refuseUnusable = (batch: ProfileBatch, result: BatchResult): void => {
  const levels = batch.heightsM.length;
  const ascending = batch.heightsM.every(
    (h, j) => Number.isFinite(h) && (j === 0 || h > batch.heightsM[j - 1]!),
  );
  if (levels < 2 || levels > 64 || !ascending)
    throw new RangeError('A batch needs 2 to 64 heights, ascending.');
  const profiles = batch.pressureHPa.length;
  if (batch.temperatureC.length !== profiles * levels) {
    throw new RangeError(`${profiles} profiles of ${levels} levels need ${profiles * levels} temperatures.`);
  }
  if (result.surface.length < profiles || result.lapseRateKPerKm.length < profiles * (levels - 1)) {
    throw new RangeError('The result has too little room: make it with batchResult(profiles, levels).');
  }
};

/** Pressure at the middle of layer j, carried up from the lowest level past levels that gave nothing. */
const meanPressureHPa = (
  t: Float64Array,
  offset: number,
  j: number,
  heightsM: readonly number[],
  baseHPa: number,
): number => {
  let belowM = heightsM[0]!;
  let belowC = NaN;
  let x = 0;
  let lowerHPa = baseHPa;
  for (let k = 0; k <= j + 1; k += 1) {
    const temperatureC = t[offset + k]!;
    if (!given(temperatureC)) continue;
    if (belowC !== belowC) belowC = temperatureC;
    const meanK = 0.5 * (belowC + temperatureC) + ZERO_CELSIUS_K;
    x -= (G_OVER_R * (heightsM[k]! - belowM)) / meanK;
    belowM = heightsM[k]!;
    belowC = temperatureC;
    if (k === j) lowerHPa = baseHPa * smallExp(x);
  }
  return 0.5 * (lowerHPa + baseHPa * smallExp(x));
};

/**
 * Layers, textbook classes, surface inversion (plain form, embed depth 0) and heat deficit of many profiles of one
 * tower. It gives what `layersOf`, `findInversions` and `heatDeficitJPerM2` give for each alone (layers read across a
 * missing level apart, which are left out); Γm is computed only where it decides the class.
 *
 * Units: °C, m, hPa in; K/km, m, °C, J/m² out. Valid: any temperatures: NaN and values beyond
 * `ACCEPTED_TEMPERATURE_C` are missing levels. Heights that do not ascend, and arrays of unfitting length, throw a
 * `RangeError`. Source: [Kahl1990]; [AMSGlossary] lapse rate, static stability; [Whiteman2014] heat deficit.
 */
export function analyseBatch(
  batch: ProfileBatch,
  result: BatchResult = batchResult(batch.pressureHPa.length, batch.heightsM.length),
): BatchResult {
  refuseUnusable(batch, result);
  const { heightsM, temperatureC: t, isothermalHalfWidthKPerKm: w, assumedPressureHPa } = batch;
  const { lapseRateKPerKm, stabilityClass, surface, open, topM, strengthC, heatDeficitJPerM2, heatAtLeast } =
    result;
  const levels = heightsM.length;
  const layers = levels - 1;
  const thicknessM = Float64Array.from({ length: layers }, (_, j) => heightsM[j + 1]! - heightsM[j]!);
  const inversionBound = -w - SAME_LAPSE_RATE_K_PER_KM;
  const isothermalBound = w + SAME_LAPSE_RATE_K_PER_KM;

  for (let i = 0; i < batch.pressureHPa.length; i += 1) {
    const offset = i * levels;
    const measured = batch.pressureHPa[i]!;
    const baseHPa = measured >= LOWEST_HPA && measured <= HIGHEST_HPA ? measured : assumedPressureHPa;

    let lower = t[offset]!;
    let lowerGiven = given(lower);
    for (let j = 0; j < layers; j += 1) {
      const upper = t[offset + j + 1]!;
      const upperGiven = given(upper);
      const at = i * layers + j;
      if (lowerGiven && upperGiven) {
        const rate = 0 - (1000 * (upper - lower)) / thicknessM[j]!;
        lapseRateKPerKm[at] = rate;
        let found = INVERSION;
        if (rate > DRY_BOUND) found = ABSOLUTELY_UNSTABLE;
        else if (rate > isothermalBound) {
          const pressure = meanPressureHPa(t, offset, j, heightsM, baseHPa);
          const moist = moistLapseRateKPerKm((lower + upper) / 2, pressure);
          found = rate <= moist + SAME_LAPSE_RATE_K_PER_KM ? STABLE : CONDITIONALLY_UNSTABLE;
        } else if (rate >= inversionBound) found = ISOTHERMAL;
        stabilityClass[at] = found;
      } else {
        lapseRateKPerKm[at] = NaN;
        stabilityClass[at] = NO_CLASS;
      }
      lower = upper;
      lowerGiven = upperGiven;
    }

    let base = 0;
    while (base < levels && !given(t[offset + base]!)) base += 1;
    let runEnd = base;
    while (runEnd < layers && given(t[offset + runEnd + 1]!)) runEnd += 1;
    let top = base;
    while (top < runEnd && t[offset + top + 1]! > t[offset + top]!) top += 1;

    const present = base < levels && top > base;
    const lowestGiven = base === 0;
    surface[i] = present
      ? SURFACE_CODES.present
      : lowestGiven && runEnd > 0
        ? SURFACE_CODES.absent
        : SURFACE_CODES['not known'];
    open[i] =
      !present || top < runEnd
        ? OPEN_CODES.no
        : runEnd < layers
          ? OPEN_CODES['cut by a missing level']
          : OPEN_CODES['at the top'];
    topM[i] = present ? heightsM[top]! : NaN;
    strengthC[i] = present
      ? t[offset + top]! - t[offset + base]!
      : surface[i] === SURFACE_CODES.absent
        ? 0
        : NaN;
    const heatKnown = lowestGiven && runEnd > 0;
    heatDeficitJPerM2[i] = heatKnown ? batchHeatDeficit(t, offset, runEnd, thicknessM, baseHPa) : NaN;
    heatAtLeast[i] = heatKnown && (runEnd < layers || open[i] !== OPEN_CODES.no) ? 1 : 0;
  }
  return result;
}
