import { between, exactly, isKnown, isNotKnown, notKnown, type Quantity } from './quantity';

/** A quantity where infinities cannot go: JSON and stores. */
export type WireQuantity =
  | number
  | { readonly atLeast: number; readonly reason?: string }
  | { readonly atMost: number; readonly reason?: string }
  | { readonly from: number; readonly to: number; readonly reason?: string }
  | { readonly notKnown: string };

/**
 * The quantity in a form JSON can carry: 5.8, `{ atLeast: 5.8 }`, `{ from, to }` or `{ notKnown: reason }`.
 *
 * Units: the quantity's. Valid: any quantity. Source: none (definition).
 */
export function toWire(quantity: Quantity): WireQuantity {
  const { lo, hi, reason } = quantity;
  if (isKnown(quantity)) return lo;
  if (isNotKnown(quantity)) return { notKnown: reason ?? 'the reason was not said' };
  const why = reason === undefined ? {} : { reason };
  if (hi === Infinity) return { atLeast: lo, ...why };
  return lo === -Infinity ? { atMost: hi, ...why } : { from: lo, to: hi, ...why };
}

/**
 * The quantity that `toWire` wrote.
 *
 * Units: the quantity's. Valid: what `toWire` gives; an end that is no number throws `NotANumberError`.
 * Source: none (definition).
 */
export function fromWire(wire: WireQuantity): Quantity {
  if (typeof wire === 'number') return exactly(wire);
  if ('notKnown' in wire) return notKnown(wire.notKnown);
  if ('atLeast' in wire) return between(wire.atLeast, Infinity, wire.reason);
  return 'atMost' in wire
    ? between(-Infinity, wire.atMost, wire.reason)
    : between(wire.from, wire.to, wire.reason);
}
