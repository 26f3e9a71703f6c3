import { addFlag, type FlagList } from './flag-list';
import { evidenceNear, type Series } from './series';
import { said, UNIT_OF } from './units';

const medianOf = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  const half = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2;
};

/**
 * Neighbour check: a reading that differs from the median of the declared neighbours by more than the limit is
 * *suspect*. Off unless the limit is set: under a lid a valley and its bench differ for good reason.
 *
 * Units: those of the sensor. Valid: neighbours of the same kind, read within half an interval; none, no answer.
 * Source: [Zahumensky2004] spatial consistency; the limit is the site's.
 */
export function checkNeighbours(series: Series, neighbours: readonly Series[], flags: FlagList): void {
  const limit = series.limits.neighbourDifference;
  if (limit === null) return;
  const unit = UNIT_OF[series.quantity];
  for (let i = 0; i < series.t.length; i += 1) {
    if (series.evidence[i] === 0) continue;
    const there = neighbours.map((n) => evidenceNear(n, series.t[i]!)).filter((v) => !Number.isNaN(v));
    if (there.length === 0) continue;
    const apart = Math.abs(series.value[i]! - medianOf(there));
    if (!(apart > limit)) continue;
    const reason = `${said(apart)} ${unit} from the median of its neighbours (limit ${limit} ${unit})`;
    addFlag(flags, i, { check: 'neighbours', verdict: 'suspect', reason });
  }
}
