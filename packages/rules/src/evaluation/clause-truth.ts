import { compare, type Quantity, type Truth } from '@lidwatch/atmosphere';
import type { Clause } from '../definition/rule-definition';

/**
 * Whether a measured quantity satisfies a clause now, held-for left aside.
 *
 * Units: the quantity in the measure's. Valid: a clause that passed validation; yes is 1, no is 0.
 * Source: [IEEE1788], [Kleene1952] through `compare`.
 */
export function clauseTruth(clause: Clause, measured: Quantity): Truth {
  return compare(measured, clause.op, Number(clause.value));
}
