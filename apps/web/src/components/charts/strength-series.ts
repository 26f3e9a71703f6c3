import type { DistrictHistory, HistoryPoint } from '../../lib/api/types';

/** A point of the line: time in epoch ms, strength within the tower in °C, null where not known. */
export interface StrengthPoint {
  x: number;
  /** When it was measured: within the step that ends at `x`, where the point is the strongest of one. */
  at: number;
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
  points.map((point) => ({
    x: new Date(point.t).getTime(),
    at: new Date(point.strongestAt ?? point.t).getTime(),
    y: point.within,
    from: point,
  }));

/** Whether the points stand for steps of several blocks, each for its strongest. */
export const isInSteps = ({ points }: DistrictHistory): boolean =>
  points.some(({ strongestAt }) => strongestAt !== undefined);

/** A newest block this old is not yet a gap: it takes its time to be closed and worked out. */
const NEWEST_MS = 45 * 60_000;

/**
 * The stretches in which nothing is known: runs of unknown points, steps that are missing altogether, and what lies
 * before the first point or after the last. They are framed in the chart and never joined.
 *
 * @param now epoch ms; what lies ahead is no gap
 */
export function gapsOf(history: DistrictHistory, now: number): Gap[] {
  const stepMs = history.stepMinutes * 60_000;
  const end = Math.min(new Date(history.to).getTime(), now);
  const gaps: Gap[] = [];
  let known = new Date(history.from).getTime();
  let open: Gap | undefined;
  for (const { x, y, from } of strengthPoints(history)) {
    if (y === null) {
      open ??= { from: known, to: x, reason: from.reason };
      open.to = x;
      continue;
    }
    if (open) gaps.push({ ...open, to: x });
    else if (x - known > 1.5 * stepMs) gaps.push({ from: known, to: x - stepMs });
    open = undefined;
    known = x;
  }
  if (open) gaps.push({ ...open, to: Math.max(open.to, end) });
  else if (end - known > Math.max(NEWEST_MS, 1.5 * stepMs)) gaps.push({ from: known, to: end });
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
