import { qualityCodes } from '@lidwatch/contracts';
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

const DEGREES_PER_RADIAN = 180 / Math.PI;

/** Mean that does not overflow, whatever the size of the values. */
const plainMean = (values: readonly number[]): number =>
  values.reduce((mean, value, i) => mean + value / (i + 1) - mean / (i + 1), 0);

const meanDirection = (degrees: readonly number[]): number => {
  if (degrees.length === 1) return degrees[0]!;
  const [x, y] = degrees.reduce(
    ([sx, sy], d) => [sx! + Math.cos(d / DEGREES_PER_RADIAN), sy! + Math.sin(d / DEGREES_PER_RADIAN)],
    [0, 0],
  ) as [number, number];
  return (Math.atan2(y, x) * DEGREES_PER_RADIAN + 360) % 360;
};

/** Whether `n` of the expected readings make a valid block: 75 %, or 2 of 3 (EPA-454/R-99-005 §6). */
export const enoughReadings = (n: number, expected: number): boolean =>
  n > 0 && (n >= 0.75 * expected || (expected === 3 && n === 2));

/**
 * The mean of one sensor over the block that ends at `tEnd`: readings in (start, end] that have not failed, each
 * corrected by the version that measured it; directions are averaged as vectors. Undefined where it has no reading.
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
  const used: number[] = [];
  let quality: number = qualityCodes.valid;
  for (let i = from; i < to; i += 1) {
    const version = versionAt(sensor, series.tEnd[i]!);
    if (flags.quality[i]! >= qualityCodes.failed || version === undefined) continue;
    used.push(version.gain * series.value[i]! + version.offset);
    quality = Math.max(quality, flags.quality[i]!);
  }
  const { id: sensorId } = sensor;
  const n = used.length;
  const mean = sensor.quantity === 'wind direction' ? meanDirection(used) : plainMean(used);
  if (!enoughReadings(n, expectedReadings(tower)) || !Number.isFinite(mean)) {
    return { sensorId, tEnd, mean: null, n, quality: qualityCodes.missing };
  }
  return { sensorId, tEnd, mean, n, quality };
}
