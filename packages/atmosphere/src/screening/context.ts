import { DEFAULT_LIMITS } from './settings';
import { longestGapS, type SensorSeries } from './series';

const S_PER_HOUR = 3600;

/** How much before and after a span its screening looks at, and how far a changed reading can reach. */
export interface ScreeningContext {
  readonly beforeS: number;
  readonly afterS: number;
}

const longestHours = (limits: readonly { readonly hours: number }[]): number =>
  Math.max(0, ...limits.map((l) => l.hours));

/**
 * The context that screening a span of these sensors needs: hand in readings from (from − beforeS) to (to + afterS)
 * and the result is that of the whole record. Turned round: a reading at t can change flags from (t − afterS) to
 * (t + beforeS), and no others.
 *
 * Units: s. Valid: any sensors, without their readings; give all of the tower and its neighbours.
 * Source: none (follows from the limits).
 */
export function screeningContext(sensors: readonly Omit<SensorSeries, 'readings'>[]): ScreeningContext {
  let beforeS = 0;
  let afterS = 0;
  for (const sensor of sensors) {
    const limits = { ...DEFAULT_LIMITS[sensor.quantity], ...sensor.limits };
    const gapS = longestGapS(sensor);
    const steadyS = Math.max(longestHours(limits.steadiness), limits.stuckHours ?? 0) * S_PER_HOUR;
    const stepS = longestHours(limits.steps) * S_PER_HOUR;
    beforeS = Math.max(beforeS, Math.max(steadyS, stepS) + 2 * gapS);
    afterS = Math.max(afterS, steadyS + 2 * gapS);
  }
  return { beforeS, afterS };
}
