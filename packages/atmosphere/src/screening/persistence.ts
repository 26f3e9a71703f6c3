import { addFlag, type FlagList } from './flag-list';
import { type Series } from './series';
import { UNIT_OF } from './units';
import { steadyWindows, variationBetween } from './windows';

const S_PER_HOUR = 3600;

/**
 * Persistence check: no more than a small variation for hours makes the readings *suspect*, never failed: fog, melting
 * snow and a quiet upper level are steady. It is withdrawn when another level is as steady over the same time.
 *
 * Units: those of the sensor. Valid: stretches without a gap longer than 2.5 intervals.
 * Source: [EPA454] table 8-4.
 */
export function checkPersistence(series: Series, others: readonly Series[], flags: FlagList): void {
  const unit = UNIT_OF[series.quantity];
  for (const { hours, limit, source } of series.limits.steadiness) {
    for (const [first, last] of steadyWindows(series, hours * S_PER_HOUR, limit)) {
      const [from, to] = [series.t[first]!, series.t[last]!];
      const same = others.find((other) => variationBetween(other, from, to) <= limit);
      const reason = `varied by no more than ${limit} ${unit} in ${hours} h (${source})`;
      const withdrawn = same === undefined ? {} : { withdrawn: `${same.sensorId} is as steady` };
      for (let i = first; i <= last; i += 1) {
        if (series.evidence[i] === 1)
          addFlag(flags, i, { check: 'persistence', verdict: 'suspect', reason, ...withdrawn });
      }
    }
  }
}

/**
 * Stuck check: the very same value for hours *fails* when another level of the tower moves meanwhile.
 *
 * Units: those of the sensor. Valid: stretches without a gap longer than 2.5 intervals; a tower without another level
 * of the same kind has no answer. Gives the indices of what is stuck. Source: [Zahumensky2004] persistence; hours and
 * movement are settings.
 */
export function checkStuck(series: Series, levels: readonly Series[], flags: FlagList): readonly number[] {
  const { stuckHours, movesBy } = series.limits;
  const stuck: number[] = [];
  if (stuckHours === null) return stuck;
  for (const [first, last] of steadyWindows(series, stuckHours * S_PER_HOUR, 0)) {
    const [from, to] = [series.t[first]!, series.t[last]!];
    const moving = levels.find((level) => variationBetween(level, from, to) > movesBy);
    if (moving === undefined) continue;
    const reason = `the same value for ${stuckHours} h or more while another level of the tower moves`;
    for (let i = first; i <= last; i += 1) {
      if (series.evidence[i] === 0) continue;
      addFlag(flags, i, { check: 'stuck', verdict: 'failed', reason });
      stuck.push(i);
    }
  }
  return stuck;
}
