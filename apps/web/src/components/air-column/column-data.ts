import type { Open } from '../../lib/api/types';

/** One sensor's height and block mean; a level without a temperature is a gap that is not joined. */
export interface ColumnLevel {
  heightM: number;
  temperatureC: number | null;
  /** Standard uncertainty of the mean, °C. */
  sigmaC?: number;
}

/** The lid over cold air at the ground: where it is, and whether the tower reaches it. */
export interface ColumnLid {
  topM: number;
  open: Open;
}

/** The temperatures between which a column is drawn, °C. */
export interface TemperatureScale {
  lo: number;
  hi: number;
}

/** A level whose temperature is known. */
export type KnownLevel = ColumnLevel & { temperatureC: number };

/** The levels that can be drawn, from the ground up. */
export function knownLevels(levels: readonly ColumnLevel[]): KnownLevel[] {
  return levels
    .filter((level): level is KnownLevel => level.temperatureC !== null)
    .sort((a, b) => a.heightM - b.heightM);
}

/** Neighbouring known levels in runs; a level that is missing between two ends a run. */
export function unbrokenRuns(levels: readonly ColumnLevel[]): KnownLevel[][] {
  const runs: KnownLevel[][] = [[]];
  for (const level of [...levels].sort((a, b) => a.heightM - b.heightM)) {
    if (level.temperatureC === null) runs.push([]);
    else runs.at(-1)?.push(level as KnownLevel);
  }
  return runs.filter((run) => run.length > 0);
}

const SMALLEST_SPAN_C = 6;
const MARGIN_C = 0.8;

/**
 * One scale for all columns of a list, so that they can be compared: from the coldest to the warmest of all levels with
 * a margin, at least six degrees wide so that sensor noise does not look like weather.
 */
export function sharedScale(columns: readonly (readonly ColumnLevel[])[]): TemperatureScale {
  const all = columns.flatMap((levels) => knownLevels(levels).map(({ temperatureC }) => temperatureC));
  if (all.length === 0) return { lo: -SMALLEST_SPAN_C / 2, hi: SMALLEST_SPAN_C / 2 };
  const [lo, hi] = [Math.min(...all) - MARGIN_C, Math.max(...all) + MARGIN_C];
  const missing = Math.max(0, SMALLEST_SPAN_C - (hi - lo)) / 2;
  return { lo: lo - missing, hi: hi + missing };
}

/**
 * The lid of a finding that says only whether cold air lies at the ground: the top is the highest level up to which
 * it grew warmer, or the tower's top where it is open there.
 */
export function lidFromLevels(levels: readonly ColumnLevel[], open: Open, topM?: number): ColumnLid | null {
  const known = knownLevels(levels);
  const highest = known.at(-1);
  if (!highest) return null;
  if (topM !== undefined) return { topM, open };
  if (open === 'at the top') return { topM: highest.heightM, open };
  const warmest = known.reduce((best, level) => (level.temperatureC > best.temperatureC ? level : best));
  return { topM: warmest.heightM, open };
}
