import { between, exactly, isNotKnown, notKnown, type NotKnownReason, type Quantity } from './quantity';

/** The reasons that several quantities carry, each once, in the order given; undefined when there is none. */
const reasonsOf = (quantities: readonly Quantity[]): NotKnownReason | undefined => {
  const reasons = [...new Set(quantities.flatMap((q) => (q.reason === undefined ? [] : [q.reason])))];
  return reasons.length > 0 ? reasons.join('; ') : undefined;
};

const ranged = (lo: number, hi: number, from: readonly Quantity[]): Quantity =>
  lo === hi ? exactly(lo) : between(lo, hi, reasonsOf(from));

/**
 * The sum, end by end.
 *
 * Units: both in the same. Valid: any quantities; open ends stay open and reasons are kept.
 * Source: [IEEE1788] interval addition.
 */
export function add(a: Quantity, b: Quantity): Quantity {
  return ranged(a.lo + b.lo, a.hi + b.hi, [a, b]);
}

/**
 * The difference a − b, for quantities that do not depend on one another.
 *
 * Units: both in the same. Valid: any quantities. Source: [IEEE1788] interval subtraction.
 */
export function subtract(a: Quantity, b: Quantity): Quantity {
  return ranged(a.lo - b.hi, a.hi - b.lo, [a, b]);
}

/** A product in which an open end times nought is nought: every number of the range times nought is. */
const product = (x: number, y: number): number => (x === 0 || y === 0 ? 0 : x * y);

/**
 * The quantity times a number; a negative one turns the range round.
 *
 * Units: the product's. Valid: a finite factor (NaN or infinite throws `NotANumberError`).
 * Source: [IEEE1788] interval multiplication.
 */
export function scale(quantity: Quantity, factor: number): Quantity {
  return multiply(quantity, exactly(factor));
}

/**
 * The product of two quantities that do not depend on one another.
 *
 * Units: the product's. Valid: any quantities. Source: [IEEE1788] interval multiplication.
 */
export function multiply(a: Quantity, b: Quantity): Quantity {
  const ends = [product(a.lo, b.lo), product(a.lo, b.hi), product(a.hi, b.lo), product(a.hi, b.hi)];
  return ranged(Math.min(...ends), Math.max(...ends), [a, b]);
}

/**
 * The quantity over a number.
 *
 * Units: the quotient's. Valid: a finite divisor other than nought, which gives *not known*.
 * Source: [IEEE1788] interval division.
 */
export function divide(quantity: Quantity, divisor: number): Quantity {
  return divisor === 0 ? notKnown('division by nought') : scale(quantity, 1 / divisor);
}

/**
 * The same quantity made narrower by what is known of it otherwise: the part both ranges share. A depth that is
 * "not known" but cannot be negative becomes "at least 0".
 *
 * Units: both in the same. Valid: any quantities; two that exclude one another throw a `RangeError`.
 * Source: [IEEE1788] intersection.
 */
export function narrow(a: Quantity, b: Quantity): Quantity {
  const lo = Math.max(a.lo, b.lo);
  const hi = Math.min(a.hi, b.hi);
  if (lo > hi) throw new RangeError(`[${a.lo}, ${a.hi}] and [${b.lo}, ${b.hi}] exclude one another.`);
  return ranged(lo, hi, isNotKnown(b) ? [a] : [a, b]);
}
