import type { Quantity, Truth } from '../bounds';

/** Limits of an episode: hysteresis between on and off, and how long each must last. */
export interface EpisodeSettings {
  /** Begins when the strength stays at or above this, °C, … */
  readonly onC: number;
  /** … for this long, s. */
  readonly onForS: number;
  /** Ends when the strength stays below this, °C, … */
  readonly offC: number;
  /** … for this long, s. */
  readonly offForS: number;
  /** Not known for no longer than this, s, it is bridged. */
  readonly gapLimitS: number;
  /** Length of a block, s. */
  readonly blockS: number;
}

/** One block of a tower, or of a district. */
export interface EpisodeBlock {
  /** UTC epoch seconds of its END. */
  readonly tEnd: number;
  readonly strengthC: Quantity;
  readonly gradientCPer100M?: Quantity;
  readonly pm25UgM3?: number | null;
  /** Whether a warm wind was breaking up the cold air in this block. */
  readonly warmWind?: Truth;
}

/**
 * Whether episode settings hang together, as messages for a person; none when they do.
 *
 * Units: °C, s. Valid: any settings. Source: none (definition).
 */
export function episodeSettingsProblems(settings: EpisodeSettings): readonly string[] {
  const problems: string[] = [];
  if (!(settings.blockS > 0)) problems.push('The block must be longer than 0 s.');
  if (!(settings.offC <= settings.onC)) problems.push('The off-limit must not lie above the on-limit.');
  if (!(settings.onForS >= 0 && settings.offForS >= 0))
    problems.push('On-time and off-time must not be negative.');
  if (!(settings.gapLimitS >= 0)) problems.push('The gap limit must not be negative.');
  return problems;
}
