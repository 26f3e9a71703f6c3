import { addFlag, type FlagList } from './flag-list';
import type { Series } from './series';

/** A span over which a logger's clock is proved wrong, both ends included. */
export interface WrongClock {
  /** The sensors concerned; left out, all of the tower. */
  readonly sensorIds?: readonly string[];
  readonly from: number;
  readonly to: number;
  readonly reason: string;
}

/**
 * Clock check: readings stamped by a clock that is proved wrong *fail*, since nobody can say when they were taken.
 *
 * Units: UTC epoch seconds. Valid: spans in any order. Source: [EPA454] §8.6 (time of a record must be right).
 */
export function checkClock(series: Series, wrong: readonly WrongClock[], flags: FlagList): void {
  for (const { sensorIds, from, to, reason } of wrong) {
    if (sensorIds !== undefined && !sensorIds.includes(series.sensorId)) continue;
    series.t.forEach((t, i) => {
      if (t >= from && t <= to) addFlag(flags, i, { check: 'clock', verdict: 'failed', reason });
    });
  }
}
