import { truthOf, type Truth } from '../bounds';

/** One level's temperature in time. */
export interface TemperatureAt {
  /** UTC epoch seconds. */
  readonly tEnd: number;
  readonly temperatureC: number | null;
}

const firstRise = (series: readonly TemperatureAt[], riseC: number): number | null | undefined => {
  const given = series.filter((s) => s.temperatureC !== null).sort((a, b) => a.tEnd - b.tEnd);
  const start = given[0];
  if (start === undefined) return undefined;
  return given.find((s) => s.temperatureC! - start.temperatureC! >= riseC)?.tEnd ?? null;
};

/**
 * Whether the upper level warmed before the lower one, as when a warm wind comes down from above: the upper has risen
 * by `riseC` since the beginning of the series, and the lower had not by then.
 *
 * Units: °C, s. Valid: two series over the same time, in any order; not known when either has no value.
 * Source: [Speirs2010] (foehn reaches upper levels first), from memory; the rise is a setting.
 */
export function upperWarmedFirst(
  lower: readonly TemperatureAt[],
  upper: readonly TemperatureAt[],
  riseC = 1,
): Truth {
  const upperAt = firstRise(upper, riseC);
  const lowerAt = firstRise(lower, riseC);
  if (upperAt === undefined || lowerAt === undefined) return 'not known';
  return truthOf(upperAt !== null && (lowerAt === null || upperAt < lowerAt));
}
