import { AIR_MEASURES } from './air-measures';
import { FORECAST_AND_TIME_MEASURES } from './forecast-and-time-measures';
import type { Measure } from './measure';
import { SMOKE_MEASURES } from './smoke-measures';

const ALL = { ...AIR_MEASURES, ...SMOKE_MEASURES, ...FORECAST_AND_TIME_MEASURES };

/** The name of a measure, with its unit in it. */
export type MeasureName = keyof typeof ALL;

/** Everything a rule may ask about, by name. The only list of measures in the house. */
export const MEASURES: Readonly<Record<MeasureName, Measure>> = ALL;

/** Every name, in the order in which a list of choices shows them. */
export const MEASURE_NAMES = Object.keys(ALL) as readonly MeasureName[];

/**
 * Whether a text is the name of a measure.
 *
 * Units: none. Valid: any input. Source: none (definition).
 */
export function isMeasureName(name: unknown): name is MeasureName {
  return typeof name === 'string' && Object.hasOwn(ALL, name);
}
