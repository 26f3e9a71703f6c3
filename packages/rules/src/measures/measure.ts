/** The languages in which the package writes for people. */
export type Language = 'en' | 'es';

/** Every language, the first being the one a text falls back to. */
export const LANGUAGES: readonly Language[] = ['en', 'es'];

/** One thing a rule may ask about, with all that a form, a sentence and a check need to know of it. */
export interface Measure {
  /** Whether the measure is a number or a yes or no (kept as 1 or 0 where it is a quantity). */
  readonly kind: 'number' | 'yes-no';
  /** The unit as written for people; empty where there is none. */
  readonly unit: string;
  /** Decimals shown in a sentence. */
  readonly decimals: number;
  /** Whether only whole numbers occur, so that "equal to" makes sense. */
  readonly whole: boolean;
  /** The limits a rule may set, in the unit: outside them no real value can lie, so the clause would be idle. */
  readonly possible: { readonly lo: number; readonly hi: number };
  /** The name in a sentence, with a capital. */
  readonly label: Readonly<Record<Language, string>>;
  /** What is measured, from what and when it is not known: one or two sentences for whoever writes a rule. */
  readonly docs: string;
}

type Details = Pick<Measure, 'label' | 'docs'> & Partial<Pick<Measure, 'decimals' | 'whole'>>;

/**
 * A measure that is a number.
 *
 * Units: `unit`, also of `lo` and `hi`. Valid: lo < hi. Source: none (definition).
 */
export function numberMeasure(unit: string, lo: number, hi: number, details: Details): Measure {
  return { kind: 'number', unit, possible: { lo, hi }, decimals: 1, whole: false, ...details };
}

/**
 * A measure that is a yes (1) or a no (0).
 *
 * Units: none. Valid: any label and docs. Source: none (definition).
 */
export function yesNoMeasure(details: Pick<Measure, 'label' | 'docs'>): Measure {
  return { kind: 'yes-no', unit: '', possible: { lo: 0, hi: 1 }, decimals: 0, whole: true, ...details };
}
