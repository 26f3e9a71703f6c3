/** How a data sheet states the uncertainty of a sensor. */
export type StatedUncertainty =
  | { readonly kind: 'limits'; readonly value: number }
  | { readonly kind: 'k = 2'; readonly value: number }
  | { readonly kind: 'standard deviation'; readonly value: number };

/** Where a standard uncertainty comes from, by the way it was stated. */
export const STATED_UNCERTAINTY_DIVISORS: Readonly<Record<StatedUncertainty['kind'], number>> = {
  limits: Math.sqrt(3),
  'k = 2': 2,
  'standard deviation': 1,
};

/**
 * One standard deviation from what the data sheet states: limits ±a are a/√3 (a rectangular distribution), an
 * expanded uncertainty is halved. It is mostly a fixed offset, so averaging and holding do not make it smaller.
 *
 * Units: those of the sensor. Valid: a value of 0 or more; else a `RangeError`.
 * Source: [GUM] 4.3.7 (limits) and 6.2 (expanded).
 */
export function standardDeviationOf(stated: StatedUncertainty): number {
  if (!(stated.value >= 0 && Number.isFinite(stated.value))) {
    throw new RangeError(`An uncertainty of ${stated.value} is impossible: give a number of 0 or more.`);
  }
  return stated.value / STATED_UNCERTAINTY_DIVISORS[stated.kind];
}

/**
 * Standard deviation of a difference between two sensors whose errors are independent.
 *
 * Units: those of the sensors. Valid: both known and 0 or more; null when either is not known.
 * Source: [GUM] 5.1.2.
 */
export function sigmaOfDifference(a: number | null | undefined, b: number | null | undefined): number | null {
  if (a === null || a === undefined || b === null || b === undefined) return null;
  return a >= 0 && b >= 0 ? Math.hypot(a, b) : null;
}
