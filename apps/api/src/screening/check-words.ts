import type { SensorLimits } from '@lidwatch/atmosphere';
import type { Check, Quality } from '@lidwatch/contracts';
import { unitsByQuantity } from '../towers/quantities';
import type { LayoutSensor } from '../towers/tower-layout';
import { limitsOf } from './kept-limits';

const amount = (value: number, unit: string): string => `${String(value).replace('-', '−')} ${unit}`;
const range = ({ lowest, highest }: { lowest: number; highest: number }, unit: string): string =>
  `${String(lowest).replace('-', '−')} to ${amount(highest, unit)}`;

function rangeWords({ physical, plausible }: SensorLimits, unit: string, quality: Quality): string {
  if (quality !== 'failed' && plausible) return `Outside ${range(plausible, unit)}, what is expected here`;
  return `Outside ${range(physical, unit)}, what is possible`;
}

/** What a check found, in plain words with the limits that hold for the sensor. */
export function checkWords(check: Check, sensor: LayoutSensor, quality: Quality): string {
  const limits = limitsOf(sensor);
  const unit = unitsByQuantity[sensor.quantity];
  const [step] = limits.steps;
  const [steady] = limits.steadiness;
  const words: Readonly<Record<Check, string>> = {
    clock: 'Stamped by a clock that is proved wrong',
    range: rangeWords(limits, unit, quality),
    spike: `A single reading more than ${amount(limits.spike ?? 0, unit)} from those before and after it`,
    step: `Changed faster than usual${step ? ` (such as ${amount(step.limit, unit)} in ${step.hours} h)` : ''} while no other level or neighbouring tower moved the same way`,
    stuck: `The very same value for ${limits.stuckHours ?? 0} h or more while another level moved`,
    persistence: `Hardly varied${steady ? ` (${amount(steady.limit, unit)} in ${steady.hours} h)` : ''} while no other level or neighbouring tower was as steady`,
    'internal consistency': `Above the air temperature at its height by more than the two sensors can tell`,
    'vertical consistency':
      'An unusual difference to the next level, as the limits of the upper one have it, while no other pair of levels went the same way',
    neighbours: `Differs from the neighbouring towers by more than ${amount(limits.neighbourDifference ?? 0, unit)}`,
    override: 'A person’s word holds',
  };
  return words[check];
}
