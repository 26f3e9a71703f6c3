import { GRAVITY_M_PER_S2 } from '../constants';

/**
 * Square of the Brunt–Väisälä frequency, N² = (g/θ) Δθ/Δz; negative where the layer is unstable.
 *
 * Units: K, K, m in; s⁻² out. Valid: θ and thickness above 0; else null. Source: [AMSGlossary] Brunt–Väisälä frequency.
 */
export function bruntVaisalaSquaredPerS2(
  thetaK: number,
  deltaThetaK: number,
  thicknessM: number,
): number | null {
  if (!(thetaK > 0 && thicknessM > 0) || Number.isNaN(deltaThetaK)) return null;
  return (GRAVITY_M_PER_S2 * deltaThetaK) / (thetaK * thicknessM);
}

/**
 * Brunt–Väisälä frequency N.
 *
 * Units: K, K, m in; s⁻¹ out. Valid: stable layers only; null for a neutral or unstable one.
 * Source: [AMSGlossary] Brunt–Väisälä frequency.
 */
export function bruntVaisalaPerS(thetaK: number, deltaThetaK: number, thicknessM: number): number | null {
  const squared = bruntVaisalaSquaredPerS2(thetaK, deltaThetaK, thicknessM);
  return squared !== null && squared > 0 ? Math.sqrt(squared) : null;
}

/**
 * Period of buoyancy oscillation, 2π/N.
 *
 * Units: K, K, m in; s out. Valid: stable layers only; else null. Source: [AMSGlossary] Brunt–Väisälä frequency.
 */
export function bruntVaisalaPeriodS(thetaK: number, deltaThetaK: number, thicknessM: number): number | null {
  const frequency = bruntVaisalaPerS(thetaK, deltaThetaK, thicknessM);
  return frequency === null ? null : (2 * Math.PI) / frequency;
}

/** Critical Richardson number, bulk and gradient alike. Source: [Vogelezang1996]; common practice. */
export const CRITICAL_RICHARDSON = 0.25;

/**
 * Gradient Richardson number (g/θ)(∂θ/∂z)/[(∂u/∂z)² + (∂v/∂z)²].
 *
 * Units: K, K/m, s⁻¹, s⁻¹ in; no unit out. Valid: θ above 0 and some shear; null at zero shear.
 * Source: [AMSGlossary] gradient Richardson number.
 */
export function gradientRichardson(
  thetaK: number,
  thetaPerMetreK: number,
  shearUPerS: number,
  shearVPerS: number,
): number | null {
  const shearSquared = shearUPerS ** 2 + shearVPerS ** 2;
  if (!(thetaK > 0 && shearSquared > 0) || Number.isNaN(thetaPerMetreK)) return null;
  return (GRAVITY_M_PER_S2 * thetaPerMetreK) / (thetaK * shearSquared);
}

/**
 * Bulk Richardson number of a layer, (g/θ) Δθ Δz/(Δu² + Δv²), θ that of its base.
 *
 * Units: K, K, m, m/s, m/s in; no unit out. Valid: θ and thickness above 0 and some shear; null at zero shear, where
 * it has no value. Source: [Vogelezang1996] equation 3 without the friction-velocity term.
 */
export function bulkRichardson(
  thetaK: number,
  deltaThetaK: number,
  thicknessM: number,
  deltaUMPerS: number,
  deltaVMPerS: number,
): number | null {
  const shearSquared = deltaUMPerS ** 2 + deltaVMPerS ** 2;
  if (!(thetaK > 0 && thicknessM > 0 && shearSquared > 0) || Number.isNaN(deltaThetaK)) return null;
  return (GRAVITY_M_PER_S2 * deltaThetaK * thicknessM) / (thetaK * shearSquared);
}
