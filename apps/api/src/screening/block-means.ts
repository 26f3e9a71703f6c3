import { isEnough, isKnown, meanDirectionDeg } from '@lidwatch/atmosphere';
import { checkBits, qualityCodes } from '@lidwatch/contracts';
import { atBillionth } from '../common/exact-decimal';
import { expectedReadings, versionAt, type LayoutSensor, type TowerLayout } from '../towers/tower-layout';
import { firstAfter, type Flags, type Series } from './series';

/** One sensor's mean over one block. */
export interface BlockMean {
  readonly sensorId: number;
  readonly tEnd: number;
  /** Corrected, in the sensor's unit; null where the block is not valid. */
  readonly mean: number | null;
  /** Readings in the mean. */
  readonly n: number;
  /** Worst quality of the readings in it, or *missing* (3) where the block is not valid. */
  readonly quality: number;
}

/** Mean that does not overflow, whatever the size of the values. */
export const plainMean = (values: readonly number[]): number =>
  values.reduce((mean, value, i) => mean + value / (i + 1) - mean / (i + 1), 0);

const directionOf = (degrees: readonly number[]): number => {
  const mean = meanDirectionDeg(degrees);
  return isKnown(mean) ? mean.lo : NaN;
};

/**
 * The quality by which a reading enters a mean. A tower whose screening only reports leaves out what a person has set
 * failed and nothing else: what the checks call failed is used as suspect.
 */
const usedAs = (quality: number, checks: number, reportOnly: boolean): number =>
  reportOnly && (checks & checkBits.override) === 0 ? Math.min(quality, qualityCodes.suspect) : quality;

/**
 * The mean of one sensor over the block that ends at `tEnd`: readings in (start, end] that have not failed, each
 * corrected by the version that measured it; directions are averaged as vectors. Valid with 75 % of the expected
 * readings, or 2 of 3 (EPA-454/R-99-005 §6); at the nearest 10⁻⁹, which the store keeps exactly. Undefined where the sensor has no reading.
 */
export function blockMean(
  tower: TowerLayout,
  sensor: LayoutSensor,
  series: Series,
  flags: Flags,
  tEnd: number,
): BlockMean | undefined {
  const from = firstAfter(series.tEnd, tEnd - tower.blockS);
  const to = firstAfter(series.tEnd, tEnd);
  if (from === to) return undefined;
  const shift = from - firstAfter(flags.tEnd, tEnd - tower.blockS);
  const used: number[] = [];
  let worst: number = qualityCodes.valid;
  for (let i = from; i < to; i += 1) {
    const version = versionAt(sensor, series.tEnd[i]!);
    const quality = usedAs(flags.quality[i - shift]!, flags.checks[i - shift]!, tower.reportOnly);
    if (quality >= qualityCodes.failed || version === undefined) continue;
    used.push(version.gain * series.value[i]! + version.offset);
    worst = Math.max(worst, quality);
  }
  const { id: sensorId } = sensor;
  const n = used.length;
  const mean = sensor.quantity === 'wind direction' ? directionOf(used) : plainMean(used);
  if (!isEnough(n, expectedReadings(tower)) || !Number.isFinite(mean)) {
    return { sensorId, tEnd, mean: null, n, quality: qualityCodes.missing };
  }
  return { sensorId, tEnd, mean: atBillionth(mean), n, quality: worst };
}
