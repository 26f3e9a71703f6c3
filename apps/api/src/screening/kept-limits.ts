import { DEFAULT_LIMITS, type SensorLimits } from '@lidwatch/atmosphere';
import { invalid } from '../common/validation';
import type { LayoutSensor } from '../towers/tower-layout';
import type { CheckLimitsDto } from './dto/limits.dto';
import { measuredQuantity } from './measured-quantity';

/** The limits of a sensor as its checks take them: the usual ones with its own over them. */
export const limitsOf = (sensor: LayoutSensor): SensorLimits => ({
  ...DEFAULT_LIMITS[measuredQuantity[sensor.quantity]],
  ...(sensor.limits as Partial<SensorLimits>),
});

/** Limits as people see them. */
export const shownLimits = ({
  plausible,
  spike,
  stuckHours,
  steps,
  steadiness,
}: SensorLimits): CheckLimitsDto => ({
  plausible: plausible && { lowest: plausible.lowest, highest: plausible.highest },
  ...{ spike, stuckHours, fastChanges: steps.length > 0, steadiness: steadiness.length > 0 },
});

/** What of some limits differs from the usual ones, to be kept; empty where nothing does. */
export function keptLimits(sensor: LayoutSensor, wanted: CheckLimitsDto): Partial<SensorLimits> {
  const usual = DEFAULT_LIMITS[measuredQuantity[sensor.quantity]];
  const { plausible, spike, stuckHours, fastChanges, steadiness } = wanted;
  refuse(usual, plausible);
  const isUsual =
    plausible?.lowest === usual.plausible?.lowest && plausible?.highest === usual.plausible?.highest;
  return {
    ...(!isUsual && { plausible: plausible && { lowest: plausible.lowest, highest: plausible.highest } }),
    ...(spike !== usual.spike && { spike }),
    ...(stuckHours !== usual.stuckHours && { stuckHours }),
    ...(!fastChanges && usual.steps.length > 0 && { steps: [] }),
    ...(!steadiness && usual.steadiness.length > 0 && { steadiness: [] }),
  };
}

function refuse({ physical }: SensorLimits, plausible: CheckLimitsDto['plausible']): void {
  if (!plausible) return;
  if (plausible.lowest >= plausible.highest)
    throw invalid([{ field: 'plausible', text: 'The lowest must lie below the highest: exchange the two.' }]);
  if (plausible.lowest < physical.lowest || plausible.highest > physical.highest) {
    const [lowest, highest] = [physical.lowest, physical.highest].map((each) =>
      String(each).replace('-', '−'),
    );
    const text = `Stay within what is possible, ${lowest} to ${highest}.`;
    throw invalid([{ field: 'plausible', text }]);
  }
}
