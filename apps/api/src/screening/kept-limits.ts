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
  neighbourDifference,
  levelDifference,
}: SensorLimits): CheckLimitsDto => ({
  plausible: plausible && { lowest: plausible.lowest, highest: plausible.highest },
  ...{ neighbourDifference, levelDifference: levelDifference && { ...levelDifference } },
  ...{ spike, stuckHours, fastChanges: steps.length > 0, steadiness: steadiness.length > 0 },
});

/** What of some limits differs from the usual ones, to be kept; empty where nothing does. */
export function keptLimits(sensor: LayoutSensor, wanted: CheckLimitsDto): Partial<SensorLimits> {
  const usual = DEFAULT_LIMITS[measuredQuantity[sensor.quantity]];
  const { plausible, spike, stuckHours, fastChanges, steadiness, neighbourDifference } = wanted;
  refuse(usual, wanted);
  const isUsual =
    plausible?.lowest === usual.plausible?.lowest && plausible?.highest === usual.plausible?.highest;
  return {
    ...(!isUsual && { plausible: plausible && { lowest: plausible.lowest, highest: plausible.highest } }),
    ...(spike !== usual.spike && { spike }),
    ...(neighbourDifference !== usual.neighbourDifference && { neighbourDifference }),
    ...levelsOf(usual, wanted),
    ...(stuckHours !== usual.stuckHours && { stuckHours }),
    ...(!fastChanges && usual.steps.length > 0 && { steps: [] }),
    ...(!steadiness && usual.steadiness.length > 0 && { steadiness: [] }),
  };
}

/** Limits of the difference to the level below, where they are not the usual ones. */
function levelsOf(
  { levelDifference: usual }: SensorLimits,
  { levelDifference: wanted }: CheckLimitsDto,
): Partial<SensorLimits> {
  if (wanted === null || usual === null) return usual === wanted ? {} : { levelDifference: null };
  const { riseC, fallC, risePerMetreByDayC, fallPerMetreAtNightC } = wanted;
  const isUsual =
    riseC === usual.riseC &&
    fallC === usual.fallC &&
    risePerMetreByDayC === usual.risePerMetreByDayC &&
    fallPerMetreAtNightC === usual.fallPerMetreAtNightC;
  return isUsual ? {} : { levelDifference: { riseC, fallC, risePerMetreByDayC, fallPerMetreAtNightC } };
}

function refuse({ physical, levelDifference }: SensorLimits, { plausible, ...wanted }: CheckLimitsDto): void {
  if (wanted.levelDifference && !levelDifference)
    throw invalid([
      { field: 'levelDifference', text: 'Only levels of air temperature are held against one another.' },
    ]);
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
