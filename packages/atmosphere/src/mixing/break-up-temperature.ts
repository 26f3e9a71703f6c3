import { atLeast, exactly, notKnown, type Quantity } from '../bounds';
import type { SurfaceFinding } from '../inversions';
import { dryAdiabatTemperatureC } from '../temperature';

/**
 * Temperature the ground-level air must reach for the surface inversion to be gone: T(top) + Γd (z(top) − z(base)).
 *
 * Units: °C. Valid: a surface inversion is present; "at least" where its top or base is not seen; without one it is
 * not known, with the reason. Source: [AMSGlossary] convective temperature, at tower scale with a dry adiabat.
 */
export function breakUpTemperatureC(surface: SurfaceFinding): Quantity {
  const { inversion } = surface;
  if (inversion === null) return notKnown(surface.reason ?? 'there is no surface inversion to break up');
  const temperatureC = dryAdiabatTemperatureC(inversion.topTemperatureC, -inversion.depthWithinTowerM);
  const { reason } = inversion.strengthC;
  return inversion.strengthC.hi === Infinity ? atLeast(temperatureC, reason) : exactly(temperatureC);
}
