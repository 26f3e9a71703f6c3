import { exactly, notKnown, type Quantity } from '@lidwatch/atmosphere';
import { blockSeries, type BlockSeries } from '../evaluation/block-series';
import type { MeasuredBlock } from '../evaluation/measured-block';

/** Length of the blocks that `strengths` makes. */
export const BLOCK_MINUTES = 15;

/** End of the nth block (from 1) that `strengths` makes, in epoch seconds. */
export const endOf = (n: number): number => n * BLOCK_MINUTES * 60;

/**
 * A series of 15-min blocks of inversion strength, written shortly: a number, a quantity, `null` for a block that is
 * not known, `undefined` for no block at all. The tower is "mill" unless `speakers` names another (or null) per block.
 */
export function strengths(
  values: readonly (number | Quantity | null | undefined)[],
  speakers: readonly (string | null)[] = [],
): BlockSeries {
  const blocks = values.flatMap((value, i): MeasuredBlock[] => {
    if (value === undefined) return [];
    const quantity = value === null ? notKnown('silent') : typeof value === 'number' ? exactly(value) : value;
    const speaker = speakers[i] === undefined ? 'mill' : speakers[i];
    const tEnd = endOf(i + 1);
    return [{ tEnd, blockSeconds: BLOCK_MINUTES * 60, speaker, values: { inversionStrengthC: quantity } }];
  });
  return blockSeries(blocks);
}
