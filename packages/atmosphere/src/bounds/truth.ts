/** A finding of yes, no, or not known: the third value is a value, never an empty yes or no. */
export type Truth = 'true' | 'false' | 'not known';

/**
 * All of them: Kleene's strong conjunction. False if any is false, true if all are, else not known. None at all is true.
 *
 * Units: none. Valid: any number of truths. Source: [Kleene1952] §64, strong tables.
 */
export function and(...truths: readonly Truth[]): Truth {
  if (truths.includes('false')) return 'false';
  return truths.includes('not known') ? 'not known' : 'true';
}

/**
 * Any of them: Kleene's strong disjunction. True if any is true, false if all are, else not known. None at all is false.
 *
 * Units: none. Valid: any number of truths. Source: [Kleene1952] §64, strong tables.
 */
export function or(...truths: readonly Truth[]): Truth {
  if (truths.includes('true')) return 'true';
  return truths.includes('not known') ? 'not known' : 'false';
}

/**
 * The contrary; not known stays not known.
 *
 * Units: none. Valid: any truth. Source: [Kleene1952] §64, strong tables.
 */
export function not(truth: Truth): Truth {
  if (truth === 'not known') return truth;
  return truth === 'true' ? 'false' : 'true';
}

/**
 * A plain yes or no as a truth; null and undefined are not known.
 *
 * Units: none. Valid: any input. Source: none (definition).
 */
export function truthOf(value: boolean | null | undefined): Truth {
  if (value === null || value === undefined) return 'not known';
  return value ? 'true' : 'false';
}
