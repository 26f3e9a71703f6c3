import { addFlag, type FlagList } from './flag-list';
import { evidenceNear, type Series } from './series';
import { said } from './units';

/** What the sensors cannot tell, in standard deviations (one-sided 95 %). */
const CANNOT_TELL_SIGMAS = 1.645;

/**
 * Internal consistency: a dew point or wet bulb above the air temperature at its height, by more than the two sensors
 * can tell, is *suspect*. Dew point equal to temperature for hours is normal in fog and is not flagged.
 *
 * Units: °C. Valid: dew-point and wet-bulb sensors with an air-temperature sensor at the same height; others have no
 * answer. Source: [EPA454] table 8-4.
 */
export function checkInternal(series: Series, tower: readonly Series[], flags: FlagList): void {
  if (series.quantity !== 'dew point' && series.quantity !== 'wet bulb') return;
  const air = tower.find((s) => s.quantity === 'air temperature' && s.heightM === series.heightM);
  if (air === undefined) return;
  const cannotTell = CANNOT_TELL_SIGMAS * Math.hypot(series.sigma, air.sigma);
  for (let i = 0; i < series.t.length; i += 1) {
    if (series.evidence[i] === 0) continue;
    const above = series.value[i]! - evidenceNear(air, series.t[i]!);
    if (!(above > cannotTell)) continue;
    const reason = `the ${series.quantity} is ${said(above)} °C above the air temperature`;
    addFlag(flags, i, { check: 'internal', verdict: 'suspect', reason });
  }
}
