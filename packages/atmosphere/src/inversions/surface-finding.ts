import { exactly, notKnown, truthOf, type NotKnownReason, type Quantity, type Truth } from '../bounds';
import { isMeasured, probabilityBelow, sigmaBetween, type Profile } from '../profile';
import type { Inversion } from './inversion';
import type { Run } from './runs';

/** Whether the temperature rises from the ground up. "Absent" is never "clear": the lid may be above the mast. */
export interface SurfaceFinding {
  readonly finding: 'present' | 'absent' | 'not known';
  readonly reason?: NotKnownReason;
  /** Height of the tower's lowest level, m; always said. Null without levels. */
  readonly lowestLevelM: number | null;
  readonly lowestLevelMissing: boolean;
  readonly inversion: Inversion | null;
  /** Rule measure *inversion strength*, °C: 0 when absent, "at least" when open. */
  readonly strengthC: Quantity;
  /** Rule measure *strength within the tower*, °C: a number, or not known. */
  readonly strengthWithinTowerC: Quantity;
  readonly depthM: Quantity;
  readonly gradientCPer100M: Quantity;
  /** P(the temperature rises from the ground): of the strength when present, of the lowest layer when absent. */
  readonly probability: number | null;
  /** Whether the finding, present or absent, is sure. */
  readonly sure: Truth;
}

type Ground = Pick<SurfaceFinding, 'lowestLevelM' | 'lowestLevelMissing'>;

const unknown = (reason: string, ground: Ground): SurfaceFinding => ({
  finding: 'not known',
  reason,
  ...ground,
  inversion: null,
  strengthC: notKnown(reason),
  strengthWithinTowerC: notKnown(reason),
  depthM: notKnown(reason),
  gradientCPer100M: notKnown(reason),
  probability: null,
  sure: 'not known',
});

const present = (inversion: Inversion, ground: Ground): SurfaceFinding => ({
  finding: 'present',
  ...ground,
  inversion,
  strengthC: inversion.strengthC,
  strengthWithinTowerC: exactly(inversion.strengthWithinTowerC),
  depthM: inversion.depthM,
  gradientCPer100M: exactly(inversion.gradientCPer100M),
  probability: inversion.probability,
  sure: inversion.sure,
});

const absent = (profile: Profile, run: Run, ground: Ground, sureFrom: number): SurfaceFinding => {
  const [lower, upper] = [run.levels[0]!, run.levels[1]!];
  const sigma = sigmaBetween(lower, upper, profile.matchedPairs);
  const rise = upper.temperatureC - lower.temperatureC;
  const probability = sigma === null ? null : 1 - probabilityBelow(rise, sigma, 0, true);
  const suspect = lower.suspect || upper.suspect;
  return {
    finding: 'absent',
    ...ground,
    inversion: null,
    strengthC: exactly(0),
    strengthWithinTowerC: exactly(0),
    depthM: exactly(0),
    gradientCPer100M: exactly((100 * rise) / (upper.heightM - lower.heightM)),
    probability,
    sure: suspect ? 'false' : truthOf(probability === null ? null : probability <= 1 - sureFrom),
  };
};

/**
 * The surface finding of a profile: present, absent, or not known with its reason.
 *
 * Units: m, °C, °C/100 m (when absent, the gradient of the lowest layer). Valid: any profile. Where the lowest level
 * is missing an inversion can still be shown from above ("base at or below"), its absence cannot; where the level
 * next to the lowest is missing neither can. Source: [Kahl1990] surface-based inversion; [GUM] for σ.
 */
export function surfaceFinding(
  profile: Profile,
  runs: readonly Run[],
  inversions: readonly Inversion[],
  sureFromProbability: number,
): SurfaceFinding {
  const lowest = profile.levels[0];
  const ground: Ground = {
    lowestLevelM: lowest?.heightM ?? null,
    lowestLevelMissing: lowest !== undefined && !isMeasured(lowest),
  };
  if (lowest === undefined) return unknown('the tower gave no temperature level', ground);
  const surface = inversions.find((inversion) => inversion.kind === 'surface-based');
  if (surface !== undefined) return present(surface, ground);
  if (ground.lowestLevelMissing)
    return unknown(`the lowest level, at ${lowest.heightM} m, gave nothing`, ground);
  if (profile.levels.length < 2) return unknown('a profile needs two levels or more', ground);
  if (runs[0]!.levels.length < 2) {
    return unknown(`the level at ${profile.levels[1]!.heightM} m, next to the lowest, gave nothing`, ground);
  }
  return absent(profile, runs[0]!, ground, sureFromProbability);
}
