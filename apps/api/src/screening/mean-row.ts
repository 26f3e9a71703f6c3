import { billionths } from '../common/exact-decimal';
import type { BlockMean } from './block-means';

/** A block mean as the rows of the statements that write means have it; the value itself where it is not exact. */
export function meanRow({ sensorId, tEnd, mean, n, quality }: BlockMean): unknown[] {
  const whole = mean === null ? null : billionths(mean);
  return [sensorId, tEnd, whole, n, quality, whole === null ? mean : null];
}
