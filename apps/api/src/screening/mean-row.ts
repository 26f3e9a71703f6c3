import { billionths } from '../common/exact-decimal';
import type { BlockMean } from './block-means';

/**
 * A block mean as a JSON row for the statements that write means: sensor, end, billionths, readings, quality, and the
 * mean itself where it is no whole number of billionths.
 */
export function meanRow({ sensorId, tEnd, mean, n, quality }: BlockMean): string {
  const whole = mean === null ? null : billionths(mean);
  return `[${sensorId},${tEnd},${whole},${n},${quality},${whole === null ? mean : null}]`;
}
