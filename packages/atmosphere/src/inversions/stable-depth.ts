import { atLeast, exactly, notKnown, type Quantity } from '../bounds';
import { DRY_ADIABATIC_LAPSE_RATE_K_PER_KM } from '../constants';
import { isMeasured, layerRates, SAME_LAPSE_RATE_K_PER_KM, type LayerRate, type Profile } from '../profile';

/** Over what depth, from the lowest level up, air that is lifted comes back. */
export interface StableDepth {
  /** Every layer has Γ ≤ Γm: stable to saturated motion too. */
  readonly moistM: Quantity;
  /** Every layer has Γ < Γd: stable to dry motion. */
  readonly dryM: Quantity;
}

const depth = (
  profile: Profile,
  layers: readonly LayerRate[],
  stable: (layer: LayerRate) => boolean,
): Quantity => {
  const lowest = profile.levels[0];
  if (lowest === undefined) return notKnown('the tower gave no temperature level');
  if (!isMeasured(lowest)) return notKnown(`the lowest level, at ${lowest.heightM} m, gave nothing`);
  if (profile.levels.length < 2) return notKnown('a profile needs two levels or more');
  let topM = lowest.heightM;
  const soFar = (why: string) =>
    topM > lowest.heightM ? atLeast(topM - lowest.heightM, why) : notKnown(why);
  for (const layer of layers) {
    const missing = layer.missingBetweenM[0];
    if (missing !== undefined) return soFar(`the level at ${missing} m gave nothing`);
    if (!stable(layer)) return exactly(topM - lowest.heightM);
    topM = layer.topM;
  }
  const highest = profile.levels.at(-1)!;
  return soFar(
    isMeasured(highest) ? 'it reaches the highest level' : `the level at ${highest.heightM} m gave nothing`,
  );
};

/**
 * The stable depth of a profile, to saturated and to dry motion, by the estimates of the lapse rates.
 *
 * Units: m, counted from the lowest level. Valid: any profile; "at least" when the stable layers reach the highest
 * level or a missing one; not known without the lowest level. Source: [AMSGlossary] static stability.
 */
export function stableDepth(
  profile: Profile,
  layers: readonly LayerRate[] = layerRates(profile),
): StableDepth {
  const same = SAME_LAPSE_RATE_K_PER_KM;
  return {
    moistM: depth(profile, layers, (l) => l.lapseRateKPerKm <= l.moistLapseRateKPerKm + same),
    dryM: depth(profile, layers, (l) => l.lapseRateKPerKm < DRY_ADIABATIC_LAPSE_RATE_K_PER_KM - same),
  };
}
