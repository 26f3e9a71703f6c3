/** A plain phrase, for people, that says why a value is not known: "the sensor at 30 m gave nothing". */
export type NotKnownReason = string;

/**
 * What is known of one number: the closed range [lo, hi] that holds it.
 *
 * Units: those of the number it bounds; a name says which (`strengthC`, `mixingHeightM`).
 * `lo === hi` is a number. `-Infinity` and `Infinity` are open ends ("at least", "at most"); the range of
 * everything is *not known* and carries its reason. Neither end is ever NaN.
 */
export interface Quantity {
  readonly lo: number;
  readonly hi: number;
  readonly reason?: NotKnownReason;
}

/** Thrown when NaN, or a range upside down, is handed over as if it were a known value. */
export class NotANumberError extends Error {
  constructor(what: string) {
    super(`${what}. Give a number, or notKnown(reason) where there is none.`);
    this.name = 'NotANumberError';
  }
}

const refuseNaN = (value: number, what: string): number => {
  if (typeof value !== 'number' || Number.isNaN(value)) throw new NotANumberError(`${what} is not a number`);
  return value === 0 ? 0 : value;
};

const withReason = (lo: number, hi: number, reason?: NotKnownReason): Quantity =>
  reason === undefined ? { lo, hi } : { lo, hi, reason };

/**
 * A number known outright.
 *
 * Units: those of the number. Valid: any finite number; NaN or an infinity throws `NotANumberError`.
 * Source: [IEEE1788] degenerate interval.
 */
export function exactly(value: number): Quantity {
  refuseNaN(value, 'exactly(value)');
  if (!Number.isFinite(value)) throw new NotANumberError('exactly(value) is infinite');
  return { lo: value === 0 ? 0 : value, hi: value === 0 ? 0 : value };
}

/**
 * A number known to lie in [lo, hi], both ends possible.
 *
 * Units: those of the number. Valid: lo ≤ hi, ends may be open (infinite); both open gives *not known*.
 * NaN, lo > hi, lo = +∞ or hi = −∞ throws `NotANumberError`. Source: [IEEE1788] closed interval.
 */
export function between(lo: number, hi: number, reason?: NotKnownReason): Quantity {
  const low = refuseNaN(lo, 'between(lo, …)');
  const high = refuseNaN(hi, 'between(…, hi)');
  if (low > high) throw new NotANumberError(`between(${low}, ${high}) is upside down`);
  if (low === Infinity || high === -Infinity) throw new NotANumberError('A range needs a possible value');
  if (low === -Infinity && high === Infinity) return notKnown(reason ?? 'no limit is known on either side');
  return withReason(low, high, reason);
}

/**
 * A number known to be no smaller than `value`, such as the strength of an inversion that reaches the mast's top.
 *
 * Units: those of the number. Valid: any finite number; NaN throws `NotANumberError`.
 * Source: [IEEE1788] half-open interval.
 */
export function atLeast(value: number, reason?: NotKnownReason): Quantity {
  return between(exactly(value).lo, Infinity, reason);
}

/**
 * A number known to be no larger than `value`.
 *
 * Units: those of the number. Valid: any finite number; NaN throws `NotANumberError`.
 * Source: [IEEE1788] half-open interval.
 */
export function atMost(value: number, reason?: NotKnownReason): Quantity {
  return between(-Infinity, exactly(value).hi, reason);
}

/**
 * A number of which nothing is known, with the reason in plain words.
 *
 * Units: none. Valid: a reason that is not empty, or an `Error` is thrown: silence without a reason is a defect.
 * Source: [IEEE1788] the entire line.
 */
export function notKnown(reason: NotKnownReason): Quantity {
  if (!reason) throw new Error('notKnown needs a reason: say in plain words why the value is missing.');
  return { lo: -Infinity, hi: Infinity, reason };
}

/**
 * A measured value that may be missing.
 *
 * Units: those of the value. Valid: any input: null, undefined, NaN and infinities give *not known* with `reason`.
 * Source: none (definition).
 */
export function fromMeasured(value: number | null | undefined, reason: NotKnownReason): Quantity {
  return typeof value === 'number' && Number.isFinite(value) ? exactly(value) : notKnown(reason);
}

/**
 * Whether the quantity is one number.
 *
 * Units: none. Valid: any quantity. Source: none (definition).
 */
export function isKnown(quantity: Quantity): boolean {
  return quantity.lo === quantity.hi;
}

/**
 * Whether nothing at all is known of the quantity (the range of everything).
 *
 * Units: none. Valid: any quantity. Source: none (definition).
 */
export function isNotKnown(quantity: Quantity): boolean {
  return quantity.lo === -Infinity && quantity.hi === Infinity;
}

/**
 * The number where the quantity is one, else null. For charts and stores that hold a single number.
 *
 * Units: those of the quantity. Valid: any quantity. Source: none (definition).
 */
export function numberOrNull(quantity: Quantity): number | null {
  return isKnown(quantity) ? quantity.lo : null;
}
