import { NotANumberError, type Quantity } from './quantity';
import type { Truth } from './truth';

/** The comparisons a rule may make between a measure and a limit. */
export type Comparison = '>=' | '>' | '<=' | '<' | '=';

/** Every comparison, in the order in which a list of choices shows them. */
export const COMPARISONS: readonly Comparison[] = ['>=', '>', '<=', '<', '='];

const whole = (every: boolean, none: boolean): Truth => (every ? 'true' : none ? 'false' : 'not known');

/**
 * Compares a quantity with a limit: true when the whole range satisfies it, false when none of it does, else not
 * known. Nothing else in the house compares a measure with a limit.
 *
 * Units: `value` in the quantity's own. Valid: any quantity; a limit that is NaN or infinite throws
 * `NotANumberError`. Source: [IEEE1788] comparison over all elements; [Kleene1952] the third value.
 */
export function compare(quantity: Quantity, comparison: Comparison, value: number): Truth {
  if (!Number.isFinite(value)) throw new NotANumberError('The limit of a comparison is no finite number');
  const { lo, hi } = quantity;
  if (Number.isNaN(lo) || Number.isNaN(hi)) throw new NotANumberError('An end of the range is not a number');
  switch (comparison) {
    case '>=':
      return whole(lo >= value, hi < value);
    case '>':
      return whole(lo > value, hi <= value);
    case '<=':
      return whole(hi <= value, lo > value);
    case '<':
      return whole(hi < value, lo >= value);
    case '=':
      return whole(lo === value && hi === value, lo > value || hi < value);
    default:
      throw new RangeError(`'${String(comparison)}' is no comparison. Use one of ${COMPARISONS.join(' ')}.`);
  }
}
