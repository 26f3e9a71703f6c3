import type { Truth } from '@lidwatch/atmosphere';

/** How a condition fared over the time it is asked to have held. All in seconds. */
export interface HeldSeconds {
  readonly neededSeconds: number;
  readonly toleratedSeconds: number;
  /** How much of the time asked for the record covers, gaps included: since the answering tower last changed. */
  readonly recordSeconds: number;
  readonly trueSeconds: number;
  readonly falseSeconds: number;
}

/**
 * Whether a condition has held: false if it was false at any time; else not known if the record is too short or more
 * of it is not known than is tolerated; else true. Silence alone never holds: some of the time must be known true.
 *
 * Units: seconds. Valid: true and false seconds together no more than the record's. Source: none (the project's own
 * rule language).
 */
export function heldTruth(held: HeldSeconds): Truth {
  const { neededSeconds, toleratedSeconds, recordSeconds, trueSeconds, falseSeconds } = held;
  if (falseSeconds > 0) return 'false';
  if (recordSeconds < neededSeconds || trueSeconds === 0) return 'not known';
  return recordSeconds - trueSeconds > toleratedSeconds ? 'not known' : 'true';
}
