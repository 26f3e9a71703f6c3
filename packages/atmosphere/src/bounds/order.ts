import { between, exactly, notKnown, type Quantity } from './quantity';

const NONE = 'nothing was given to choose from';

const ends = (lo: number, hi: number, from: readonly Quantity[]): Quantity => {
  if (lo === hi) return exactly(lo);
  const reasons = [...new Set(from.flatMap((q) => (q.reason === undefined ? [] : [q.reason])))];
  return between(lo, hi, reasons.length > 0 ? reasons.join('; ') : undefined);
};

/**
 * The greatest: at least the greatest lower end. One value of 5 and one not known give "at least 5".
 *
 * Units: all in the same. Valid: any number of quantities; none at all gives *not known*.
 * Source: [IEEE1788] maximum.
 */
export function maximum(...quantities: readonly Quantity[]): Quantity {
  if (quantities.length === 0) return notKnown(NONE);
  return ends(Math.max(...quantities.map((q) => q.lo)), Math.max(...quantities.map((q) => q.hi)), quantities);
}

/**
 * The least: at most the least upper end. One value of 5 and one not known give "at most 5".
 *
 * Units: all in the same. Valid: any number of quantities; none at all gives *not known*.
 * Source: [IEEE1788] minimum.
 */
export function minimum(...quantities: readonly Quantity[]): Quantity {
  if (quantities.length === 0) return notKnown(NONE);
  return ends(Math.min(...quantities.map((q) => q.lo)), Math.min(...quantities.map((q) => q.hi)), quantities);
}

const middle = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  const upper = sorted[sorted.length >> 1]!;
  if (sorted.length % 2 === 1) return upper;
  const lower = sorted[(sorted.length >> 1) - 1]!;
  if (lower === upper) return upper;
  return lower === -Infinity || upper === Infinity
    ? lower === -Infinity
      ? lower
      : upper
    : (lower + upper) / 2;
};

/**
 * The median (of an even number, the mean of the middle two), bounded by the medians of the ends: 1, 5 and one not
 * known give [1, 5].
 *
 * Units: all in the same. Valid: any number of quantities; none at all gives *not known*.
 * Source: none (definition; the median never falls when one of its values rises).
 */
export function median(...quantities: readonly Quantity[]): Quantity {
  if (quantities.length === 0) return notKnown(NONE);
  return ends(middle(quantities.map((q) => q.lo)), middle(quantities.map((q) => q.hi)), quantities);
}
