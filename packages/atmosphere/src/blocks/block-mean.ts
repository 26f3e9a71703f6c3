import { notKnown, exactly, type Quantity } from '../bounds';
import type { Quality } from '../profile';

/** A screened reading: the instant at which its interval ends, its value and its quality. */
export interface BlockReading {
  /** UTC epoch seconds of the END of the reading's interval. */
  readonly tEnd: number;
  readonly value: number | null;
  readonly quality: Quality;
}

/** How a block becomes valid. */
export interface BlockSettings {
  /** Length of a block, s: a whole multiple of the interval. */
  readonly blockS: number;
  /** Interval of the readings, s. */
  readonly intervalS: number;
  /** Smallest share of the expected readings. */
  readonly minimumShare: number;
}

/** Mean of one block, labelled by its END. */
export interface BlockMean {
  readonly tEnd: number;
  readonly mean: Quantity;
  /** Readings used, and expected. */
  readonly n: number;
  readonly expected: number;
  readonly quality: 'valid' | 'suspect' | 'missing';
}

/** A block or an hour needs this share of what is expected. Source: [EPA454] §5.3, §6. */
export const MINIMUM_SHARE = 0.75;
/** Default length of a block, s. */
export const DEFAULT_BLOCK_S = 900;

/**
 * Default block of a tower: 15 min where the interval divides it, else the interval.
 *
 * Units: s. Valid: an interval above 0; else a `RangeError`. Source: [EPA454] §6 (15-min means).
 */
export function defaultBlockS(intervalS: number): number {
  if (!(intervalS > 0)) throw new RangeError('The interval of a tower must be above 0 s.');
  return DEFAULT_BLOCK_S % intervalS === 0 ? DEFAULT_BLOCK_S : intervalS;
}

/**
 * END of the block a reading belongs to. Blocks are (start, end]: a reading on the boundary belongs to the block it
 * ends.
 *
 * Units: UTC epoch seconds and s. Valid: any instant; blocks count from 1970-01-01T00:00Z.
 * Source: [EPA454] §5.3 (labelled by its end).
 */
export const blockEnd = (tEnd: number, blockS: number): number => Math.ceil(tEnd / blockS) * blockS;

/**
 * Whether so many of the expected readings make a block valid: 75 % or more, or 2 of 3.
 *
 * Units: counts. Valid: expected at least 1; nothing is valid without a reading. Source: [EPA454] §5.3, §6.
 */
export const isEnough = (n: number, expected: number, minimumShare: number = MINIMUM_SHARE): boolean =>
  n > 0 && (n >= minimumShare * expected || (expected === 3 && n >= 2));

/** One value per instant, so that a reading that came twice counts once; then in order of time. */
const oncePerInstant = (readings: readonly BlockReading[]): BlockReading[] => {
  const byInstant = new Map<number, BlockReading>();
  for (const reading of readings) {
    const other = byInstant.get(reading.tEnd);
    if (other === undefined || reading.value! < other.value!) byInstant.set(reading.tEnd, reading);
  }
  return [...byInstant.values()].sort((a, b) => a.tEnd - b.tEnd);
};

/**
 * The readings that enter a mean: those with a finite value that are valid or suspect.
 *
 * Units: none. Valid: any readings. Source: none (definition).
 */
export const usable = (readings: readonly BlockReading[]): readonly BlockReading[] =>
  readings.filter((r) => Number.isFinite(r.value) && (r.quality === 'valid' || r.quality === 'suspect'));

/**
 * Mean of the block that ends at `tEnd`. Readings outside it are passed over; failed and missing ones are left out; a
 * suspect one makes the mean suspect.
 *
 * Units: those of the readings. Valid: readings in any order; two for one instant count once (the smaller value); not
 * known, and *missing*, with less than the share of the expected readings. Source: [EPA454] §5.3, §6.
 */
export function blockMean(
  readings: readonly BlockReading[],
  tEnd: number,
  settings: BlockSettings,
): BlockMean {
  const { blockS, intervalS, minimumShare } = settings;
  const expected = Math.max(1, Math.round(blockS / intervalS));
  const inside = readings.filter((r) => r.tEnd > tEnd - blockS && r.tEnd <= tEnd);
  const used = oncePerInstant(usable(inside));
  const n = used.length;
  if (!isEnough(n, expected, minimumShare)) {
    return {
      tEnd,
      mean: notKnown(`${n} of ${expected} readings are usable`),
      n,
      expected,
      quality: 'missing',
    };
  }
  const mean = exactly(used.reduce((sum, r) => sum + r.value!, 0) / n);
  return {
    tEnd,
    mean,
    n,
    expected,
    quality: used.some((r) => r.quality === 'suspect') ? 'suspect' : 'valid',
  };
}

/**
 * Means of all blocks that the readings fall into, ascending.
 *
 * Units: those of the readings. Valid: readings in any order; blocks without a reading are not listed.
 * Source: [EPA454] §5.3, §6.
 */
export function blockMeans(readings: readonly BlockReading[], settings: BlockSettings): readonly BlockMean[] {
  const byBlock = new Map<number, BlockReading[]>();
  for (const reading of readings) {
    const end = blockEnd(reading.tEnd, settings.blockS);
    const inside = byBlock.get(end);
    if (inside === undefined) byBlock.set(end, [reading]);
    else inside.push(reading);
  }
  return [...byBlock.keys()].sort((a, b) => a - b).map((end) => blockMean(byBlock.get(end)!, end, settings));
}
