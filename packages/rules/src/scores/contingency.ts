/** How often it was warned and how often it happened, as counts of days (or of any equal cases). */
export interface Contingency {
  /** Warned and happened (a). */
  readonly hits: number;
  /** Warned and did not happen (b). */
  readonly falseAlarms: number;
  /** Not warned and happened (c). */
  readonly misses: number;
  /** Not warned and did not happen (d). */
  readonly correctNegatives: number;
}

/** One case: whether it was warned and whether it happened; null where that is not known. */
export interface Case {
  readonly warned: boolean | null;
  readonly happened: boolean | null;
}

/**
 * Counts cases. Those of which either is not known are counted apart: they are neither hits nor misses.
 *
 * Units: cases. Valid: any cases. Source: [Wilks2011] §8.2.1, the 2 × 2 table.
 */
export function contingencyOf(cases: Iterable<Case>): Contingency & { readonly notKnown: number } {
  const counts = { hits: 0, falseAlarms: 0, misses: 0, correctNegatives: 0, notKnown: 0 };
  for (const { warned, happened } of cases) {
    if (warned === null || happened === null) counts.notKnown += 1;
    else if (warned) counts[happened ? 'hits' : 'falseAlarms'] += 1;
    else counts[happened ? 'misses' : 'correctNegatives'] += 1;
  }
  return counts;
}
