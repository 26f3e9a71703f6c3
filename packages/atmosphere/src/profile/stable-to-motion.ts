import type { Truth } from '../bounds';
import { DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';

/** How a layer answers to air that is displaced in it. */
export interface Displacement {
  /** Stable to dry motion: Γ < Γd beyond its σ. */
  readonly stableToDry: Truth;
  /** Stable to saturated motion: Γ < Γm beyond its σ. */
  readonly stableToSaturated: Truth;
  /** What decides in this layer: dry motion unless it is saturated. */
  readonly stable: Truth;
}

const clearOf = (rate: number, sigma: number, limit: number): Truth => {
  if (rate + sigma < limit) return 'true';
  return rate - sigma > limit ? 'false' : 'not known';
};

/**
 * Whether displaced air returns, dry and saturated, each beyond one standard deviation of the lapse rate. Dry motion
 * decides in unsaturated air, saturated motion in saturated air; where saturation is not known both must agree.
 *
 * Units: K/km. Valid: any rate; an unknown σ counts as 0. Source: [AMSGlossary] parcel method, static stability.
 */
export function displacement(
  lapseRateKPerKm: number,
  sigmaKPerKm: number | null,
  moistKPerKm: number,
  saturated: Truth,
): Displacement {
  const sigma = sigmaKPerKm ?? 0;
  const stableToDry = clearOf(lapseRateKPerKm, sigma, DRY_ADIABATIC_LAPSE_RATE_K_PER_KM);
  const stableToSaturated = clearOf(lapseRateKPerKm, sigma, moistKPerKm);
  const agreed = stableToDry === stableToSaturated ? stableToDry : 'not known';
  const stable = saturated === 'true' ? stableToSaturated : saturated === 'false' ? stableToDry : agreed;
  return { stableToDry, stableToSaturated, stable };
}
