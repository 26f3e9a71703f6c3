import { addFlag, type FlagList } from './flag-list';
import type { Series } from './series';
import { said, UNIT_OF } from './units';

/**
 * Range check: outside the physical range *failed*; outside the plausible one (local records) *suspect*.
 *
 * Units: those of the sensor. Valid: any series; missing values are passed over.
 * Source: [Zahumensky2004] ranges; [EPA454] table 8-4 local records.
 */
export function checkRange(series: Series, flags: FlagList): void {
  const { physical, plausible } = series.limits;
  const unit = UNIT_OF[series.quantity];
  for (let i = 0; i < series.value.length; i += 1) {
    const value = series.value[i]!;
    if (value < physical.lowest || value > physical.highest) {
      const reason = `${said(value)} ${unit} is outside ${physical.lowest} to ${physical.highest} ${unit}, what is possible`;
      addFlag(flags, i, { check: 'range', verdict: 'failed', reason });
    } else if (plausible !== null && (value < plausible.lowest || value > plausible.highest)) {
      const reason = `${said(value)} ${unit} is outside ${plausible.lowest} to ${plausible.highest} ${unit}, what is expected here`;
      addFlag(flags, i, { check: 'range', verdict: 'suspect', reason });
    }
  }
}
