import { notKnown, type Quantity } from '@lidwatch/atmosphere';
import type { MeasureName } from '../measures/catalogue';

/** What was measured in one block, for one district. A measure that is left out is not known. */
export type MeasuredValues = { readonly [Name in MeasureName]?: Quantity };

/** One block (tEnd − blockSeconds, tEnd] of a district's series. */
export interface MeasuredBlock {
  /** End of the block, UTC epoch seconds. */
  readonly tEnd: number;
  /** Length of the block in seconds. */
  readonly blockSeconds: number;
  /** Which tower (or combination of towers) answered; null when none did. */
  readonly speaker: string | null;
  /** Yes-no measures are 1 or 0. */
  readonly values: MeasuredValues;
}

const NOT_MEASURED = notKnown('nothing was measured');
const NO_BLOCK = notKnown('no block ends at this time');

/**
 * What a block says of one measure.
 *
 * Units: the measure's. Valid: any block or none; a value that is missing, or has an end that is not a number, is
 * *not known*. Source: none (definition).
 */
export function measuredIn(block: MeasuredBlock | undefined, measure: MeasureName): Quantity {
  if (block === undefined) return NO_BLOCK;
  const value = block.values[measure];
  if (value === undefined) return NOT_MEASURED;
  return Number.isNaN(value.lo) || Number.isNaN(value.hi) ? NOT_MEASURED : value;
}
