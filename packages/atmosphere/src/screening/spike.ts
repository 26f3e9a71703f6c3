import { addFlag, type FlagList } from './flag-list';
import { evidenceNear, longestGapS, type Series } from './series';
import { SAME_WAY_SHARE } from './settings';
import { said, UNIT_OF } from './units';

/** How far a reading stands out from both its neighbours in time; 0 when it does not. */
const standsOut = (before: number, value: number, after: number): number => {
  const [fromBefore, fromAfter] = [value - before, value - after];
  if (Math.sign(fromBefore) !== Math.sign(fromAfter)) return 0;
  return Math.sign(fromBefore) * Math.min(Math.abs(fromBefore), Math.abs(fromAfter));
};

const standsOutAt = (series: Series, t: number, before: number, after: number): number => {
  const out = standsOut(evidenceNear(series, before), evidenceNear(series, t), evidenceNear(series, after));
  return Number.isNaN(out) ? 0 : out;
};

/**
 * Spike check: a single reading that both its neighbours in time contradict by more than the limit, in the same
 * direction, *fails*, and is no evidence for other checks. It is withdrawn when another level stands out the same way
 * by half of it. A reading whose next one is not in yet is not judged.
 *
 * Units: those of the sensor. Valid: neighbours in time no further than 2.5 intervals.
 * Source: [Zahumensky2004] (a jump that does not last); the limit is common practice.
 */
export function checkSpike(series: Series, others: readonly Series[], flags: FlagList): readonly number[] {
  const { spike } = series.limits;
  const failed: number[] = [];
  if (spike === null) return failed;
  const gapS = longestGapS(series);
  const { t, value, evidence } = series;
  for (let i = 1; i < t.length - 1; i += 1) {
    if (evidence[i - 1] === 0 || evidence[i] === 0 || evidence[i + 1] === 0) continue;
    if (t[i]! - t[i - 1]! > gapS || t[i + 1]! - t[i]! > gapS) continue;
    const out = standsOut(value[i - 1]!, value[i]!, value[i + 1]!);
    if (!(Math.abs(out) > spike)) continue;
    const same = others.find(
      (o) => standsOutAt(o, t[i]!, t[i - 1]!, t[i + 1]!) * Math.sign(out) >= SAME_WAY_SHARE * Math.abs(out),
    );
    const reason = `stands out by ${said(Math.abs(out))} ${UNIT_OF[series.quantity]} from the readings before and after it`;
    const withdrawn = same === undefined ? {} : { withdrawn: `${same.sensorId} does so too` };
    addFlag(flags, i, { check: 'spike', verdict: 'failed', reason, ...withdrawn });
    if (same === undefined) failed.push(i);
  }
  return failed;
}
