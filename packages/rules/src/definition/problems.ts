/** What can be wrong with a rule, as a stable code for programs. */
export type ProblemCode =
  | 'not-a-rule'
  | 'too-large'
  | 'too-deep'
  | 'too-many-parts'
  | 'too-tangled'
  | 'unknown-key'
  | 'missing'
  | 'not-a-condition'
  | 'empty-group'
  | 'unknown-measure'
  | 'wrong-op'
  | 'wrong-value'
  | 'impossible-value'
  | 'out-of-range'
  | 'tolerance-without-hold'
  | 'tolerance-not-below-hold'
  | 'wrong-date'
  | 'never-true'
  | 'begin-and-end-overlap';

/** One thing wrong with a rule. */
export interface Problem {
  /** Where, as a JSON path ([RFC9535]): `$.advisory.begin.all[0].value`. */
  readonly path: string;
  readonly code: ProblemCode;
  /** What is wrong and what to do, in a sentence for people. */
  readonly text: string;
}

/** More problems than this help nobody; the rest is left out. */
const MOST_PROBLEMS = 50;

/** Gathers the problems found while reading a rule. */
export class ProblemList {
  readonly problems: Problem[] = [];

  /** Notes one problem; beyond the fiftieth it is dropped. */
  add(path: string, code: ProblemCode, text: string): void {
    if (this.problems.length < MOST_PROBLEMS) this.problems.push({ path, code, text });
  }
}

/**
 * The JSON path of a member of what stands at `path`.
 *
 * Units: none. Valid: any key; one that is no plain name is quoted. Source: [RFC9535] §2.7 (normalized paths, with
 * the dot form for plain names).
 */
export function memberPath(path: string, key: string): string {
  return /^[A-Za-z_]\w*$/.test(key) ? `${path}.${key}` : `${path}[${JSON.stringify(key)}]`;
}

/** A value from outside shortened so that a message stays readable. */
export function shown(value: unknown): string {
  const text = JSON.stringify(value) ?? 'nothing';
  return text.length > 40 ? `${text.slice(0, 37)}…` : text;
}
