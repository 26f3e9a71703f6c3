import { addFlag, type FlagList } from './flag-list';
import { evidenceNear, type Series } from './series';
import { SAME_WAY_SHARE, type ChangeLimit } from './settings';
import { said, UNIT_OF } from './units';

const S_PER_HOUR = 3600;

/** The first of the limits, shortest time first, that the change up to reading i exceeds; with the change. */
const exceeded = (series: Series, i: number): { limit: ChangeLimit; change: number } | undefined => {
  for (const limit of series.limits.steps) {
    const change = series.value[i]! - evidenceNear(series, series.t[i]! - limit.hours * S_PER_HOUR);
    if (Math.abs(change) > limit.limit) return { limit, change };
  }
  return undefined;
};

/**
 * Step check: a change beyond a limit within its hours makes the later reading *suspect*. It is withdrawn when another
 * level or a neighbouring tower moves the same way over the same time by half of it: break-ups and warm winds do that.
 *
 * Units: those of the sensor. Valid: the earlier reading is looked for within half an interval; without it no answer.
 * Source: [EPA454] table 8-4; [WMO1993] time consistency.
 */
export function checkStep(series: Series, others: readonly Series[], flags: FlagList): void {
  const unit = UNIT_OF[series.quantity];
  for (let i = 0; i < series.t.length; i += 1) {
    if (series.evidence[i] === 0) continue;
    const found = exceeded(series, i);
    if (found === undefined) continue;
    const { limit, change } = found;
    const t = series.t[i]!;
    const same = others.find((other) => {
      const moved = evidenceNear(other, t) - evidenceNear(other, t - limit.hours * S_PER_HOUR);
      return moved * Math.sign(change) >= SAME_WAY_SHARE * Math.abs(change);
    });
    const way = change > 0 ? 'rose' : 'fell';
    const reason = `${way} by ${said(Math.abs(change))} ${unit} in ${limit.hours} h (limit ${limit.limit} ${unit}, ${limit.source})`;
    const withdrawn = same === undefined ? {} : { withdrawn: `${same.sensorId} moves the same way` };
    addFlag(flags, i, { check: 'step', verdict: 'suspect', reason, ...withdrawn });
  }
}
