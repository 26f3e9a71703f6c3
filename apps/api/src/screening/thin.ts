import type { Series } from './series';

/**
 * Which readings of a series to draw, as ascending indices: all, where they are no more than `most`; else of each part
 * of the time the lowest and the highest, apart for what is flagged, and all of that where it is few.
 */
export function thin({ tEnd, value, checks }: Series, most: number): number[] {
  if (tEnd.length <= most) return [...tEnd.keys()];
  const flagged = checks.filter((bits) => bits !== 0).length;
  const parts = most / 4;
  const first = tEnd[0]!;
  const partS = (tEnd.at(-1)! - first + 1) / parts;
  const kept = new Set<number>();
  const extremes = new Map<number, { lowest: number; highest: number }>();
  for (const [i, t] of tEnd.entries()) {
    const isFlagged = checks[i] !== 0;
    if (isFlagged && flagged <= most / 2) {
      kept.add(i);
      continue;
    }
    const part = 2 * Math.floor((t - first) / partS) + Number(isFlagged);
    const found = extremes.get(part) ?? { lowest: i, highest: i };
    if (value[i]! < value[found.lowest]!) found.lowest = i;
    if (value[i]! > value[found.highest]!) found.highest = i;
    extremes.set(part, found);
  }
  for (const { lowest, highest } of extremes.values()) kept.add(lowest).add(highest);
  return [...kept].sort((a, b) => a - b);
}
