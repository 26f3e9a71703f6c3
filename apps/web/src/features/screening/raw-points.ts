import type { RawReading, RawSeries } from './types';

/** A point of the chart: time in epoch ms, value at which it is drawn; null breaks the line. */
export interface RawPoint {
  x: number;
  y: number | null;
  /** What was read; left out where the line breaks. */
  reading?: RawReading;
}

/** Lowest and highest value the chart reaches. */
export interface Reach {
  lowest: number;
  highest: number;
}

/** Readings further apart than so many intervals are not joined. */
const JOINED_INTERVALS = 2.5;
/** Parts of the time whose extremes a thinned series keeps. */
const THINNED_PARTS = 500;

/** A failed reading is within sight when it lies no further from those that are used than so many times their span. */
const SIGHT_SPANS = 1;
const LEAST_SIGHT = 10;

const boundsOf = (readings: readonly RawReading[]): Reach => {
  let [lowest, highest] = [Infinity, -Infinity];
  for (const { value, corrected } of readings) {
    lowest = Math.min(lowest, value, corrected ?? value);
    highest = Math.max(highest, value, corrected ?? value);
  }
  return { lowest, highest };
};

/**
 * What the chart reaches: every value that is used and what failed near them, with a little room. A failed one may be
 * anything, such as 1e5 °C, and would leave nothing of the others to see.
 */
export function reachOf(series: readonly RawSeries[]): Reach {
  const all = series.flatMap(({ points }) => points);
  const used = all.filter(({ quality }) => quality !== 'failed');
  if (all.length === 0) return { lowest: 0, highest: 1 };
  const core = boundsOf(used.length > 0 ? used : all);
  const sight = Math.max(LEAST_SIGHT, SIGHT_SPANS * (core.highest - core.lowest));
  const { lowest, highest } = boundsOf(
    all.filter(({ value }) => value >= core.lowest - sight && value <= core.highest + sight),
  );
  const room = Math.max(0.5, 0.08 * (highest - lowest));
  return { lowest: lowest - room, highest: highest + room };
}

/** The longest gap of a series that is still joined, ms. */
export const joinedMs = (thinned: boolean, intervalMinutes: number, spanMs: number): number =>
  Math.max(JOINED_INTERVALS * intervalMinutes * 60_000, thinned ? (4 * spanMs) / THINNED_PARTS : 0);

/** A series as points: values beyond the chart stand at its edge, and the line breaks at gaps. */
export function rawPoints(
  points: readonly RawReading[],
  { lowest, highest }: Reach,
  gapMs: number,
  valueOf = (reading: RawReading): number => reading.value,
): RawPoint[] {
  const drawn: RawPoint[] = [];
  for (const reading of points) {
    const x = Date.parse(reading.t);
    const before = drawn.at(-1);
    if (before && x - before.x > gapMs) drawn.push({ x: before.x + 1, y: null });
    drawn.push({ x, y: Math.min(highest, Math.max(lowest, valueOf(reading))), reading });
  }
  return drawn;
}
