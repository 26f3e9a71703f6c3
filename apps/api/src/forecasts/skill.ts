/** Fewer pairs than this are too few to say how forecasts do. */
export const LEAST_PAIRS = 5;

/** A forecast value and what it turned out to be. */
export type Pair = readonly [forecast: number, outcome: number];

/** How forecasts of one quantity did; the means are null for too few pairs. */
export interface Skill {
  readonly n: number;
  readonly meanError: number | null;
  readonly meanAbsoluteError: number | null;
}

const mean = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0) / values.length;

/**
 * Mean error (forecast minus outcome: positive is too high) and mean absolute error. Source: WMO-No. 485, verification
 * measures; both by their definition.
 */
export function skillOf(pairs: readonly Pair[]): Skill {
  const errors = pairs.map(([forecast, outcome]) => forecast - outcome);
  if (errors.length < LEAST_PAIRS) return { n: errors.length, meanError: null, meanAbsoluteError: null };
  return { n: errors.length, meanError: mean(errors), meanAbsoluteError: mean(errors.map(Math.abs)) };
}
