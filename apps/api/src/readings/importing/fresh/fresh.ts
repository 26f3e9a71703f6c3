/**
 * What an import's rows come to where nothing else lies near them: readings with their flags, block means and
 * profiles, worked out in one pass. It may be written only while the store holds, around them, exactly the readings
 * that the import brought itself (`near`); else the rows go the usual way.
 */
export interface Fresh {
  /** Counts how often it was begun anew: after rows that went the usual way only a later one may be written. */
  readonly epoch: number;
  /** Rows that say the one before once more. */
  readonly repeated: number;
  /** Readings as JSON rows [sensor, end, millionths, quality, checks, row number], by sensor and time. */
  readonly readings: string;
  /** Flags, as JSON rows [sensor, end, quality, checks], of readings that were written before; those not 0. */
  readonly earlierFlags: string | undefined;
  /** Block means as JSON rows. */
  readonly means: string;
  /** Profiles as JSON rows. */
  readonly profiles: string;
  /** Ends of the blocks that have a profile. */
  readonly profileEnds: readonly number[];
  /** Ends of the blocks whose profile could not be worked out; they stay marked. */
  readonly failedEnds: readonly number[];
  /** Blocks that end in (afterT, untilT] are worked out for good. */
  readonly done: { readonly afterT: number; readonly untilT: number };
  /** Ends of blocks that hold new readings and wait for later ones. */
  readonly waitingEnds: readonly number[];
  /** Blocks that end in (afterT, untilT] are kept from stage 1 until all of the import is written. */
  readonly held: { readonly afterT: number; readonly untilT: number };
  /** What the store must hold when this is written. */
  readonly near: Near;
}

/** The surroundings of new rows in the store. */
export interface Near {
  /** In (afterT, untilT] there are `count` readings of the tower's sensors, all of this import. */
  readonly afterT: number;
  readonly untilT: number;
  readonly count: number;
  /** In (unmarkedAfterT, untilT] nothing waits to be screened. */
  readonly unmarkedAfterT: number;
}
