/** A source that fails is tried again after this long at the latest, s. */
const LONGEST_WAIT_S = 15 * 60;
/** What is only not there yet is looked for this often, s: a look costs nothing, and coming late loses findings. */
const LOOK_AGAIN_S = 60;
const MOST_DOUBLINGS = 6;

/** How a collection of a source went. */
export interface Collected {
  /** What it gave, or why it failed, in a sentence. */
  readonly result: string;
  readonly failed: boolean;
  /** Where the other end asked for a pause, its length, s. */
  readonly retryAfterS?: number | undefined;
  /** Whether the place is only not there yet, so that it is soon looked for again. */
  readonly notThereYet?: boolean | undefined;
}

/**
 * How long a source waits from the begin of one collection to the next, s. Each failure in a row doubles the wait, to a
 * quarter of an hour at most, also where the source's own interval is longer: a source that works again is noticed soon.
 *
 * @param failures in a row, the last one included; 0 after a success
 */
export function waitUntilNextTurnS(
  intervalS: number,
  failures: number,
  { retryAfterS = 0, notThereYet = false }: Partial<Collected> = {},
): number {
  if (failures === 0) return intervalS;
  if (notThereYet) return Math.min(intervalS, LOOK_AGAIN_S);
  const doubled = intervalS * 2 ** Math.min(failures, MOST_DOUBLINGS);
  return Math.min(Math.max(doubled, retryAfterS), LONGEST_WAIT_S);
}
