import { exactly, isKnown, notKnown } from '../bounds';
import { isEnough, MINIMUM_SHARE, type BlockMean } from './block-mean';

const S_PER_HOUR = 3600;

/**
 * Mean of the hour that ends at `tEnd`, from its blocks.
 *
 * Units: those of the blocks. Valid: blocks in any order, other hours' passed over; not known with less than 75 % of
 * the hour's blocks. A block longer than an hour gives its own mean to the hour it ends.
 * Source: [EPA454] §5.3, §6 (labelled by its end); the share is a setting.
 */
export function hourMean(
  blocks: readonly BlockMean[],
  tEnd: number,
  blockS: number,
  minimumShare: number = MINIMUM_SHARE,
): BlockMean {
  const expected = Math.max(1, Math.round(S_PER_HOUR / blockS));
  const inside = blocks
    .filter((b) => b.tEnd > tEnd - S_PER_HOUR && b.tEnd <= tEnd && b.quality !== 'missing' && isKnown(b.mean))
    .sort((a, b) => a.tEnd - b.tEnd);
  const n = inside.length;
  if (!isEnough(n, expected, minimumShare)) {
    return { tEnd, mean: notKnown(`${n} of ${expected} blocks are valid`), n, expected, quality: 'missing' };
  }
  const mean = exactly(inside.reduce((sum, b) => sum + b.mean.lo, 0) / n);
  return {
    tEnd,
    mean,
    n,
    expected,
    quality: inside.some((b) => b.quality === 'suspect') ? 'suspect' : 'valid',
  };
}
