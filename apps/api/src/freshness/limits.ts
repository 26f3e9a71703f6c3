const LEAST_LATE_S = 45 * 60;
const LATE_INTERVALS = 2.5;

/** A tower that was not heard for a day is silent, no longer late, s. */
export const SILENT_S = 86_400;

/** What of a tower's settings its limits follow from. */
export interface Limited {
  readonly intervalS: number;
  /** The tower's own limit, s; null for the usual one. */
  readonly staleLimitS: number | null;
}

/** How long after its newest reading a tower counts as late, s: its own limit, or 45 min or 2.5 intervals. */
export const lateAfterS = ({ staleLimitS, intervalS }: Limited): number =>
  staleLimitS ?? Math.max(LEAST_LATE_S, LATE_INTERVALS * intervalS);
