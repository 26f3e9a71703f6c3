import type { Quantity } from '@lidwatch/atmosphere';
import type { MeasureName } from '../measures/catalogue';
import { measuredIn, type MeasuredBlock } from '../evaluation/measured-block';

/** Both ends of one measure over a series; NaN never: a value that is not known is −∞ to ∞. */
export interface Bounds {
  readonly lo: Float64Array;
  readonly hi: Float64Array;
}

/**
 * A district's blocks as columns, for judging many years at once. All arrays have one entry per block, oldest first.
 */
export interface BlockColumns {
  /** Ends of the blocks, UTC epoch seconds, ascending. */
  readonly tEnd: Float64Array;
  /** Start of the time each block adds to the series: where blocks overlap, the earlier keeps the time. */
  readonly coversFrom: Float64Array;
  /** Start of the run each block belongs to: since when no other tower has answered. */
  readonly runFrom: Float64Array;
  readonly measures: ReadonlyMap<MeasureName, Bounds>;
}

/**
 * Puts a district's blocks into columns, with the measures a rule needs.
 *
 * Units: UTC epoch seconds; each measure's own. Valid: blocks in order of time with distinct ends and lengths above 0;
 * others throw a `RangeError`. Source: none (definition).
 */
export function blockColumns(
  blocks: readonly MeasuredBlock[],
  measures: Iterable<MeasureName>,
): BlockColumns {
  const n = blocks.length;
  const columns = new Map<MeasureName, Bounds>();
  for (const measure of measures) {
    const bounds = { lo: new Float64Array(n), hi: new Float64Array(n) };
    blocks.forEach((block, i) => put(bounds, i, measuredIn(block, measure)));
    columns.set(measure, bounds);
  }
  return { ...times(blocks), measures: columns };
}

function put(bounds: Bounds, i: number, { lo, hi }: Quantity): void {
  bounds.lo[i] = lo;
  bounds.hi[i] = hi;
}

function times(blocks: readonly MeasuredBlock[]): Pick<BlockColumns, 'tEnd' | 'coversFrom' | 'runFrom'> {
  const n = blocks.length;
  const [tEnd, coversFrom, runFrom] = [new Float64Array(n), new Float64Array(n), new Float64Array(n)];
  let previousEnd = -Infinity;
  let speaker: string | null = null;
  blocks.forEach((block, i) => {
    if (!(block.blockSeconds > 0) || !(block.tEnd > previousEnd)) {
      throw new RangeError(`Give blocks in order of time; the one that ends at ${block.tEnd} is out of it.`);
    }
    tEnd[i] = block.tEnd;
    coversFrom[i] = Math.max(block.tEnd - block.blockSeconds, previousEnd);
    const changed = block.speaker !== null && speaker !== null && block.speaker !== speaker;
    runFrom[i] = i === 0 || changed ? coversFrom[i]! : runFrom[i - 1]!;
    speaker = block.speaker ?? speaker;
    previousEnd = block.tEnd;
  });
  return { tEnd, coversFrom, runFrom };
}
