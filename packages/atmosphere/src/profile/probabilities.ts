import { DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';
import { normalProbabilityBelow } from '../uncertainty';

/** Probabilities, each containing the one before, that a layer is at least so stable. */
export interface NestedProbabilities {
  /** P(Γ < 0): the temperature rises with height. */
  readonly rises: number;
  /** P(Γ ≤ Γm): stable also to saturated motion. */
  readonly belowMoist: number;
  /** P(Γ ≤ Γd): stable to dry motion. */
  readonly belowDry: number;
}

/** From which probability a finding is called sure. Common practice (one-sided 95 %); a setting. */
export const SURE_FROM_PROBABILITY = 0.95;

/**
 * Probability that a normal quantity lies below a limit; with no spread it is 0 or 1.
 *
 * Units: all three in the same. Valid: σ at least 0. At σ = 0 the limit itself counts as below only when
 * `includingLimit`. Source: [GUM] annex G (normal distribution).
 */
export function probabilityBelow(mean: number, sigma: number, limit: number, includingLimit = false): number {
  if (sigma > 0) return normalProbabilityBelow((limit - mean) / sigma);
  return mean < limit || (includingLimit && mean === limit) ? 1 : 0;
}

/**
 * The nested probabilities of a layer under a normal lapse rate.
 *
 * Units: K/km in, probabilities out. Valid: σ known and at least 0; null σ gives null.
 * Source: [GUM] annex G (normal distribution); thresholds of [AMSGlossary].
 */
export function nestedProbabilities(
  lapseRateKPerKm: number,
  sigmaKPerKm: number | null,
  moistKPerKm: number,
): NestedProbabilities | null {
  if (sigmaKPerKm === null) return null;
  const below = (limit: number, including: boolean) =>
    probabilityBelow(lapseRateKPerKm, sigmaKPerKm, limit, including);
  return {
    rises: below(0, false),
    belowMoist: below(moistKPerKm, true),
    belowDry: below(DRY_ADIABATIC_LAPSE_RATE_K_PER_KM, true),
  };
}
