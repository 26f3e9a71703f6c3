/** Readings of one sensor in order of time, with the flags they carry. The arrays run in parallel. */
export interface Series {
  readonly sensorId: number;
  /** Ends of the intervals, UTC epoch seconds, ascending. */
  readonly tEnd: readonly number[];
  /** As they came, uncorrected, in the sensor's unit. */
  readonly value: readonly number[];
  /** Quality codes as stored. */
  readonly quality: readonly number[];
  /** Bits of the checks as stored. */
  readonly checks: readonly number[];
}

/** What screening says of one reading. */
export interface Flag {
  readonly quality: number;
  readonly checks: number;
}

/** A reading whose flags have changed. */
export interface ChangedFlag extends Flag {
  readonly sensorId: number;
  readonly tEnd: number;
}

/** Screening of a stretch of a series; the arrays run in parallel. */
export interface Flags {
  readonly tEnd: readonly number[];
  readonly quality: readonly number[];
  readonly checks: readonly number[];
}

/** A stretch of time (t0, t1], UTC epoch seconds. */
export interface Stretch {
  readonly t0: number;
  readonly t1: number;
}

/** A span that a person has set, of one sensor: readings whose interval ends in [t0, t1]. */
export interface SetSpan extends Stretch {
  readonly sensorId: number;
  readonly quality: 'valid' | 'failed';
  /** When it was set, UTC epoch seconds: the newest of several holds. */
  readonly at: number;
}

/** Index of the first entry above `t` in ascending instants. */
export function firstAfter(instants: readonly number[], t: number): number {
  let [low, high] = [0, instants.length];
  while (low < high) {
    const middle = (low + high) >> 1;
    if (instants[middle]! > t) high = middle;
    else low = middle + 1;
  }
  return low;
}
