import { firstFrom, longestGapS, type Series } from './series';

/** First and last index of a stretch of readings without a longer gap. */
export type Window = readonly [number, number];

const halfTurn = (degrees: number): number => ((((degrees + 180) % 360) + 360) % 360) - 180;

/**
 * Values whose spread is their largest difference: wind directions are carried on past north.
 *
 * Units: those of the sensor. Valid: any series; values that are no evidence stay as they are.
 * Source: none (definition).
 */
export function unwrapped(series: Series): Float64Array {
  if (series.quantity !== 'wind direction') return series.value;
  const values = Float64Array.from(series.value);
  let before = NaN;
  for (let i = 0; i < values.length; i += 1) {
    if (series.evidence[i] === 0) continue;
    if (!Number.isNaN(before)) values[i] = before + halfTurn(values[i]! - before);
    before = values[i]!;
  }
  return values;
}

/**
 * Difference between the largest and smallest evidence between two instants, both included; NaN with fewer than two.
 *
 * Units: those of the sensor; UTC epoch seconds. Valid: any instants. Source: none (definition).
 */
export function variationBetween(series: Series, from: number, to: number): number {
  const values = unwrapped(series);
  let [lowest, highest, n] = [Infinity, -Infinity, 0];
  for (let i = firstFrom(series.t, from); i < series.t.length && series.t[i]! <= to; i += 1) {
    if (series.evidence[i] === 0) continue;
    lowest = Math.min(lowest, values[i]!);
    highest = Math.max(highest, values[i]!);
    n += 1;
  }
  return n < 2 ? NaN : highest - lowest;
}

/**
 * Every shortest stretch of at least `lengthS`, without a gap, in which the series varies by no more than `limit`.
 * Whether a reading lies in one depends only on readings within `lengthS` and one gap of it.
 *
 * Units: s, and those of the sensor. Valid: any series; values that are no evidence are passed over.
 * Source: none (definition).
 */
export function steadyWindows(series: Series, lengthS: number, limit: number): readonly Window[] {
  const values = unwrapped(series);
  const usable: number[] = [];
  for (let i = 0; i < series.t.length; i += 1) if (series.evidence[i] === 1) usable.push(i);
  const gapS = longestGapS(series);
  const found: Window[] = [];
  const lows: number[] = [];
  const highs: number[] = [];
  let start = 0;
  let lowAt = 0;
  let highAt = 0;
  usable.forEach((index, end) => {
    const value = values[index]!;
    if (end > 0 && series.t[index]! - series.t[usable[end - 1]!]! > gapS) start = end;
    while (lows.length > lowAt && values[usable[lows.at(-1)!]!]! >= value) lows.pop();
    while (highs.length > highAt && values[usable[highs.at(-1)!]!]! <= value) highs.pop();
    lows.push(end);
    highs.push(end);
    const long = (from: number) => series.t[index]! - series.t[usable[from]!]! >= lengthS;
    while (start < end && long(start + 1)) start += 1;
    while (lows[lowAt]! < start) lowAt += 1;
    while (highs[highAt]! < start) highAt += 1;
    if (!long(start)) return;
    const variation = values[usable[highs[highAt]!]!]! - values[usable[lows[lowAt]!]!]!;
    if (variation <= limit) found.push([usable[start]!, index]);
  });
  return found;
}
