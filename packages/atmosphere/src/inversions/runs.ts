import { isMeasured, type MeasuredLevel, type Profile } from '../profile';

/** A run of neighbouring levels that all have their temperature: nothing is read across a missing level. */
export interface Run {
  readonly levels: readonly MeasuredLevel[];
  /** Whether a declared level without a value lies just below, or just above. */
  readonly cutBelow: boolean;
  readonly cutAbove: boolean;
}

/**
 * The runs of a profile from the ground up, each without a missing level.
 *
 * Units: none. Valid: any profile; one without a temperature has no run. Source: none (definition).
 */
export function runsOf(profile: Profile): readonly Run[] {
  const runs: Run[] = [];
  let levels: MeasuredLevel[] = [];
  let cutBelow = false;
  const close = (cutAbove: boolean) => {
    if (levels.length > 0) runs.push({ levels, cutBelow, cutAbove });
    levels = [];
  };
  for (const level of profile.levels) {
    if (isMeasured(level)) {
      levels.push(level);
    } else {
      close(true);
      cutBelow = true;
    }
  }
  close(false);
  return runs;
}
