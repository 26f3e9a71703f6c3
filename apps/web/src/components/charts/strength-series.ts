import type { DistrictHistory, HistoryPoint } from '../../lib/api/types';

/** A point of the line: time in epoch ms, strength within the tower in °C, null where not known. */
export interface StrengthPoint {
  x: number;
  y: number | null;
  from: HistoryPoint;
}

/** A stretch of time that is not known, epoch ms. */
export interface Gap {
  from: number;
  to: number;
  reason?: string | undefined;
}

/** The points as the chart draws them; 0 where no inversion was found, null where nothing is known. */
export const strengthPoints = ({ points }: DistrictHistory): StrengthPoint[] =>
  points.map((point) => ({ x: new Date(point.t).getTime(), y: point.within, from: point }));

/**
 * The stretches in which nothing is known: runs of unknown points, and steps that are missing altogether. They are
 * framed in the chart and never joined.
 */
export function gapsOf(points: readonly StrengthPoint[], stepMinutes: number): Gap[] {
  const stepMs = stepMinutes * 60_000;
  const gaps: Gap[] = [];
  let known: number | undefined = points[0] && points[0].x - stepMs;
  let open: Gap | undefined;
  for (const { x, y, from } of points) {
    if (y === null) {
      open ??= { from: known ?? x - stepMs, to: x, reason: from.reason };
      open.to = x;
      continue;
    }
    if (open) gaps.push({ ...open, to: x });
    else if (known !== undefined && x - known > 1.5 * stepMs) gaps.push({ from: known, to: x });
    open = undefined;
    known = x;
  }
  if (open) gaps.push(open);
  return gaps;
}

/** The points with a null put into every missing stretch, so that a line library breaks the line there. */
export function withBreaks(
  points: readonly StrengthPoint[],
  stepMinutes: number,
): { x: number; y: number | null }[] {
  const stepMs = stepMinutes * 60_000;
  return points.flatMap(({ x, y }, index) => {
    const before = points[index - 1];
    const missing = before && x - before.x > 1.5 * stepMs;
    return missing
      ? [
          { x: before.x + 1, y: null },
          { x, y },
        ]
      : [{ x, y }];
  });
}
