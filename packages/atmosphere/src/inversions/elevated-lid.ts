import { and, compare, exactly, notKnown, type Quantity, type Truth } from '../bounds';
import { isMeasured, type Profile } from '../profile';
import type { Inversion } from './inversion';

/** Whether a lid above the ground lies within the tower's height. It says nothing of the air above the top. */
export interface ElevatedLid {
  readonly present: Truth;
  readonly inversion: Inversion | null;
  readonly baseM: Quantity;
  readonly strengthC: Quantity;
}

const counts = (inversion: Inversion, minimumC: number): Truth =>
  and(compare(inversion.strengthC, '>=', minimumC), inversion.suspect ? 'not known' : inversion.sure);

/**
 * The lowest elevated inversion that counts: from the minimum strength, and sure.
 *
 * Units: m, °C. Valid: any profile. Without one it is false only when no level is missing and none of the elevated
 * inversions might count; with fewer than two levels, or a missing one, it is not known.
 * Source: [Kahl1990] elevated inversion; the minimum is common practice.
 */
export function elevatedLid(
  profile: Profile,
  inversions: readonly Inversion[],
  minimumC: number,
): ElevatedLid {
  const elevated = inversions.filter((inversion) => inversion.kind === 'elevated');
  const lid = elevated.find((inversion) => counts(inversion, minimumC) === 'true');
  if (lid !== undefined) {
    return { present: 'true', inversion: lid, baseM: exactly(lid.baseM), strengthC: lid.strengthC };
  }
  const none = (present: Truth, reason: string): ElevatedLid => ({
    present,
    inversion: null,
    baseM: notKnown(reason),
    strengthC: present === 'false' ? exactly(0) : notKnown(reason),
  });
  const missing = profile.levels.find((level) => !isMeasured(level));
  if (missing !== undefined) return none('not known', `the level at ${missing.heightM} m gave nothing`);
  if (profile.levels.length < 2) return none('not known', 'a profile needs two levels or more');
  const doubtful = elevated.find((inversion) => counts(inversion, minimumC) === 'not known');
  if (doubtful !== undefined) return none('not known', `the one from ${doubtful.baseM} m up is not sure`);
  return none('false', 'no lid within the height of the tower');
}
