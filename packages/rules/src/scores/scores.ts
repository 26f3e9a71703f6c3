import type { Contingency } from './contingency';

/** Scores of warnings. Each is null where its definition divides by nought: never 0 in its stead. */
export interface Scores {
  /** Probability of detection, a/(a + c). */
  readonly pod: number | null;
  /** False alarm ratio, b/(a + b). */
  readonly far: number | null;
  /** Probability of false detection, b/(b + d). */
  readonly pofd: number | null;
  /** Critical success index, a/(a + b + c). */
  readonly csi: number | null;
  /** Frequency bias, (a + b)/(a + c). */
  readonly bias: number | null;
  /** Proportion correct, (a + d)/n. */
  readonly proportionCorrect: number | null;
  /** Equitable threat score (Gilbert skill score). */
  readonly ets: number | null;
  /** Heidke skill score. */
  readonly hss: number | null;
  /** Peirce skill score, POD − POFD. */
  readonly pss: number | null;
}

const ratio = (part: number, whole: number): number | null => (whole === 0 ? null : part / whole);

/**
 * The usual scores of a 2 × 2 table of warnings.
 *
 * Units: none. Valid: counts of 0 and above. Source: [Wilks2011] §8.2; [WWRP] verification pages.
 */
export function scoresOf({ hits: a, falseAlarms: b, misses: c, correctNegatives: d }: Contingency): Scores {
  const n = a + b + c + d;
  const random = ratio((a + b) * (a + c), n);
  const pod = ratio(a, a + c);
  const pofd = ratio(b, b + d);
  return {
    pod,
    far: ratio(b, a + b),
    pofd,
    csi: ratio(a, a + b + c),
    bias: ratio(a + b, a + c),
    proportionCorrect: ratio(a + d, n),
    ets: random === null ? null : ratio(a - random, a + b + c - random),
    hss: ratio(2 * (a * d - b * c), (a + c) * (c + d) + (a + b) * (b + d)),
    pss: pod === null || pofd === null ? null : pod - pofd,
  };
}
