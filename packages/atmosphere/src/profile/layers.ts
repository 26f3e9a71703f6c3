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

/** How fast the air between two adjacent levels that have a temperature cools upward, and how fast it may. */
export interface LayerRate {
  readonly baseM: number;
  readonly topM: number;
  /** Γ = −dT/dz, K/km, positive where it cools upward. */
  readonly lapseRateKPerKm: number;
  /** Γm at the layer's mean temperature and pressure, K/km. */
  readonly moistLapseRateKPerKm: number;
  /** Declared levels between the two that gave no value, m: the layer is read across them. */
  readonly missingBetweenM: readonly number[];
}

/** The air between two adjacent levels that have a temperature. */
export interface Layer extends Displacement, LayerRate {
  readonly thicknessM: number;
  readonly meanTemperatureC: number;
  readonly meanPressureHPa: number;
  /** T(top) − T(base), °C. */
  readonly differenceC: number;
  readonly sigmaDifferenceC: number | null;
  readonly sigmaKPerKm: number | null;
  /** +dT/dz, °C/100 m. */
  readonly gradientCPer100M: number;
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

const NONE_MISSING: readonly number[] = [];

const missingBetweenM = (profile: Profile, lower: MeasuredLevel, upper: MeasuredLevel): readonly number[] => {
  const between = profile.levels.filter((l) => l.heightM > lower.heightM && l.heightM < upper.heightM);
  return between.length === 0 ? NONE_MISSING : between.map((l) => l.heightM);
};

const lapseRateKPerKm = (lower: MeasuredLevel, upper: MeasuredLevel): number =>
  0 - (1000 * (upper.temperatureC - lower.temperatureC)) / (upper.heightM - lower.heightM);

/**
 * The lapse rates of the layers between adjacent levels that have a temperature, from the ground up: of `layersOf`
 * what the stable depth needs, at a third of the cost.
 *
 * Units: m, K/km. Valid: any profile; fewer than two measured levels give none. Source: [AMSGlossary] lapse rate.
 */
export function layerRates(profile: Profile): readonly LayerRate[] {
  const levels = measuredLevels(profile);
  if (levels.length < 2) return [];
  const pressures = pressuresHPa(profile, levels);
  const rates: LayerRate[] = [];
  for (let i = 0; i + 1 < levels.length; i += 1) {
    const [lower, upper] = [levels[i]!, levels[i + 1]!];
    rates.push({
      baseM: lower.heightM,
      topM: upper.heightM,
      lapseRateKPerKm: lapseRateKPerKm(lower, upper),
      moistLapseRateKPerKm: moistLapseRateKPerKm(
        (lower.temperatureC + upper.temperatureC) / 2,
        (pressures[i]! + pressures[i + 1]!) / 2,
      ),
      missingBetweenM: missingBetweenM(profile, lower, upper),
    });
  }
  return rates;
}

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
    const rate = lapseRateKPerKm(lower, upper);
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
      missingBetweenM: missingBetweenM(profile, lower, upper),
      suspect,
    };
  });
}
