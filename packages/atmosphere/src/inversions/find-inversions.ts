import type { Profile } from '../profile';
import { elevatedLid, type ElevatedLid } from './elevated-lid';
import { describeInversion, type Inversion } from './inversion';
import { runsOf } from './runs';
import { scanRun } from './scan';
import { DEFAULT_INVERSION_SETTINGS, type InversionSettings } from './settings';
import { surfaceFinding, type SurfaceFinding } from './surface-finding';

/** All inversions of a profile, and what they mean at the ground and above it. */
export interface InversionFinding {
  /** The form and depths by which they were found: a number without its form compares with nothing. */
  readonly settings: InversionSettings;
  /** From the ground up. */
  readonly inversions: readonly Inversion[];
  readonly surface: SurfaceFinding;
  readonly lid: ElevatedLid;
}

/**
 * Finds the inversions of a profile.
 *
 * Units: m above ground, °C. Valid: any profile, also empty, of one level, or with missing levels, across which no
 * inversion is read. *Plain* with embed depth 0 is the unbroken run of strictly rising temperature and is what
 * comparisons with published statistics use; *sensor-aware* (the default) passes over decreases that the sensors
 * cannot tell, and equals *plain* where no uncertainty is known. Source: [Kahl1990].
 */
export function findInversions(
  profile: Profile,
  settings: Partial<InversionSettings> = {},
): InversionFinding {
  const used = { ...DEFAULT_INVERSION_SETTINGS, ...settings };
  const runs = runsOf(profile);
  const inversions = runs.flatMap((run, i) =>
    scanRun(run.levels, used, profile.matchedPairs).map((span) =>
      describeInversion(span, run, i === 0, profile.matchedPairs, used.sureFromProbability),
    ),
  );
  return {
    settings: used,
    inversions,
    surface: surfaceFinding(profile, runs, inversions, used.sureFromProbability),
    lid: elevatedLid(profile, inversions, used.lidMinimumC),
  };
}
