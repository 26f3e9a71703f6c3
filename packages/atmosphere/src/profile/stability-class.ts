import { AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM, DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';

/** The textbook's static classes, from least to most stable. */
export const STABILITY_CLASSES = [
  'absolutely unstable',
  'conditionally unstable',
  'stable',
  'isothermal',
  'inversion',
] as const;
/** One of the textbook's static classes. */
export type StabilityClass = (typeof STABILITY_CLASSES)[number];

/** Half-width of the isothermal class, K/km. Common practice; a setting. */
export const ISOTHERMAL_HALF_WIDTH_K_PER_KM = 1;
/** Two lapse rates closer than this, K/km, are the same: it covers only the rounding of the arithmetic. */
export const SAME_LAPSE_RATE_K_PER_KM = 1e-9;

/**
 * The textbook class of a lapse rate; the classes partition the axis. A rate equal to a bound (within rounding)
 * belongs to the class on the stable side, except at ±w, which are isothermal.
 *
 * Units: K/km, lapse rate positive where it cools upward. Valid: any finite rate with Γm from the layer's own
 * temperature and pressure and w at least 0; NaN throws a `RangeError`.
 * Source: [AMSGlossary] static stability, conditional instability, inversion; half-width common practice.
 */
export function stabilityClass(
  lapseRateKPerKm: number,
  moistKPerKm: number,
  isothermalHalfWidthKPerKm: number = ISOTHERMAL_HALF_WIDTH_K_PER_KM,
): StabilityClass {
  if (Number.isNaN(lapseRateKPerKm) || Number.isNaN(moistKPerKm)) {
    throw new RangeError('A lapse rate that is not a number has no class: leave the layer out.');
  }
  const rate = lapseRateKPerKm;
  const same = SAME_LAPSE_RATE_K_PER_KM;
  if (rate < -isothermalHalfWidthKPerKm - same) return 'inversion';
  if (rate <= isothermalHalfWidthKPerKm + same) return 'isothermal';
  if (rate <= moistKPerKm + same) return 'stable';
  return rate <= DRY_ADIABATIC_LAPSE_RATE_K_PER_KM + same ? 'conditionally unstable' : 'absolutely unstable';
}

/**
 * Whether the layer cools upward faster than dry air that rises.
 *
 * Units: K/km. Valid: any rate. Source: [AMSGlossary] superadiabatic lapse rate.
 */
export const isSuperadiabatic = (lapseRateKPerKm: number): boolean =>
  lapseRateKPerKm > DRY_ADIABATIC_LAPSE_RATE_K_PER_KM + SAME_LAPSE_RATE_K_PER_KM;

/**
 * Whether density rises with height, so that the layer overturns of itself. Over sunlit ground the lowest metres
 * exceed this by day; it is no proof of a bad sensor.
 *
 * Units: K/km. Valid: any rate. Source: [AMSGlossary] autoconvective lapse rate.
 */
export const isAutoconvective = (lapseRateKPerKm: number): boolean =>
  lapseRateKPerKm > AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM + SAME_LAPSE_RATE_K_PER_KM;
