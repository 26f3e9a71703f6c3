import { truthOf, type Truth } from '../bounds';
import { ZERO_CELSIUS_K } from '../constants';
import { moistLapseRateKPerKm, potentialTemperatureK, pressureAboveHPa } from '../temperature';
import { gradientCPer100MFromLapseRate } from '../units';
import { sigmaBetween } from './difference';
import { measuredLevels, type MeasuredLevel, type Profile } from './level';
import { nestedProbabilities, SURE_FROM_PROBABILITY, type NestedProbabilities } from './probabilities';
import { layerSaturation } from './saturated';
import {
  isAutoconvective,
  isSuperadiabatic,
  ISOTHERMAL_HALF_WIDTH_K_PER_KM,
  stabilityClass,
  type StabilityClass,
} from './stability-class';
import { displacement, type Displacement } from './stable-to-motion';

/** What may be set about layers. */
export interface LayerSettings {
  readonly isothermalHalfWidthKPerKm: number;
  readonly sureFromProbability: number;
}

/** Isothermal half-width 1 K/km, sure from 0.95. */
export const DEFAULT_LAYER_SETTINGS: LayerSettings = {
  isothermalHalfWidthKPerKm: ISOTHERMAL_HALF_WIDTH_K_PER_KM,
  sureFromProbability: SURE_FROM_PROBABILITY,
};

/** The air between two adjacent levels that have a temperature. */
export interface Layer extends Displacement {
  readonly baseM: number;
  readonly topM: number;
  readonly thicknessM: number;
  readonly meanTemperatureC: number;
  readonly meanPressureHPa: number;
  /** T(top) − T(base), °C. */
  readonly differenceC: number;
  readonly sigmaDifferenceC: number | null;
  /** Γ = −dT/dz, K/km, positive where it cools upward. */
  readonly lapseRateKPerKm: number;
  readonly sigmaKPerKm: number | null;
  /** +dT/dz, °C/100 m. */
  readonly gradientCPer100M: number;
  /** Γm at the layer's mean temperature and pressure, K/km. */
  readonly moistLapseRateKPerKm: number;
  readonly potentialTemperatureDifferenceK: number;
  readonly meanPotentialTemperatureK: number;
  /** Textbook class of the estimate. */
  readonly stabilityClass: StabilityClass;
  readonly superadiabatic: boolean;
  readonly autoconvective: boolean;
  readonly probabilities: NestedProbabilities | null;
  /** Whether it is sure that the temperature rises, or sure that it does not. */
  readonly riseSure: Truth;
  readonly saturated: Truth;
  /** Height of the humidity reading that says saturated, m. */
  readonly saturatedAtM: number | null;
  /** Declared levels between the two that gave no value, m: the layer is read across them. */
  readonly missingBetweenM: readonly number[];
  readonly suspect: boolean;
}

/** Pressures at the measured levels, hPa, carried up hydrostatically from the lowest declared level. */
const pressuresHPa = (profile: Profile, levels: readonly MeasuredLevel[]): number[] => {
  let below = { heightM: profile.levels[0]!.heightM, temperatureC: levels[0]!.temperatureC };
  let pressureHPa = profile.pressureHPa;
  return levels.map((level) => {
    const meanK = (below.temperatureC + level.temperatureC) / 2 + ZERO_CELSIUS_K;
    pressureHPa = pressureAboveHPa(pressureHPa, level.heightM - below.heightM, meanK);
    below = level;
    return pressureHPa;
  });
};

const riseSure = (probability: number | undefined, suspect: boolean, from: number): Truth => {
  if (probability === undefined) return 'not known';
  return truthOf(!suspect && (probability >= from || probability <= 1 - from));
};

/**
 * The layers between adjacent levels that have a temperature, from the ground up, with all that is derived from
 * each alone.
 *
 * Units: as each field names. Valid: any profile; fewer than two measured levels give no layer; a layer that is read
 * across a missing level says so in `missingBetweenM`. Without a σ the probabilities are null and nothing is sure.
 * Source: [AMSGlossary] lapse rate, static stability, moist-adiabatic lapse rate; [GUM] 5.1.2 for σ.
 */
export function layersOf(profile: Profile, settings: Partial<LayerSettings> = {}): readonly Layer[] {
  const { isothermalHalfWidthKPerKm, sureFromProbability } = { ...DEFAULT_LAYER_SETTINGS, ...settings };
  const levels = measuredLevels(profile);
  if (levels.length < 2) return [];
  const pressures = pressuresHPa(profile, levels);
  return levels.slice(1).map((upper, i) => {
    const lower = levels[i]!;
    const thicknessM = upper.heightM - lower.heightM;
    const meanTemperatureC = (lower.temperatureC + upper.temperatureC) / 2;
    const meanPressureHPa = (pressures[i]! + pressures[i + 1]!) / 2;
    const differenceC = upper.temperatureC - lower.temperatureC;
    const sigmaDifferenceC = sigmaBetween(lower, upper, profile.matchedPairs);
    const rate = 0 - (1000 * differenceC) / thicknessM;
    const sigmaKPerKm = sigmaDifferenceC === null ? null : (1000 * sigmaDifferenceC) / thicknessM;
    const moist = moistLapseRateKPerKm(meanTemperatureC, meanPressureHPa);
    const thetaLower = potentialTemperatureK(lower.temperatureC + ZERO_CELSIUS_K, pressures[i]!);
    const thetaUpper = potentialTemperatureK(upper.temperatureC + ZERO_CELSIUS_K, pressures[i + 1]!);
    const wet = layerSaturation(lower.heightM, upper.heightM, meanTemperatureC, profile.humidity);
    const probabilities = nestedProbabilities(rate, sigmaKPerKm, moist);
    const suspect = lower.suspect || upper.suspect;
    return {
      baseM: lower.heightM,
      topM: upper.heightM,
      thicknessM,
      meanTemperatureC,
      meanPressureHPa,
      differenceC,
      sigmaDifferenceC,
      lapseRateKPerKm: rate,
      sigmaKPerKm,
      gradientCPer100M: gradientCPer100MFromLapseRate(rate),
      moistLapseRateKPerKm: moist,
      potentialTemperatureDifferenceK: thetaUpper - thetaLower,
      meanPotentialTemperatureK: (thetaLower + thetaUpper) / 2,
      stabilityClass: stabilityClass(rate, moist, isothermalHalfWidthKPerKm),
      superadiabatic: isSuperadiabatic(rate),
      autoconvective: isAutoconvective(rate),
      probabilities,
      riseSure: riseSure(probabilities?.rises, suspect, sureFromProbability),
      saturated: wet.saturated,
      saturatedAtM: wet.atM,
      ...displacement(rate, sigmaKPerKm, moist, wet.saturated),
      missingBetweenM: profile.levels
        .filter((l) => l.heightM > lower.heightM && l.heightM < upper.heightM)
        .map((l) => l.heightM),
      suspect,
    };
  });
}
