import type { Comparison } from '@lidwatch/atmosphere';
import type { MeasureName } from '../measures/catalogue';

/** The two kinds of notice: asking people not to burn, and ordering them not to. */
export type NoticeKind = 'advisory' | 'burnBan';

/** Both kinds, the milder first. */
export const NOTICE_KINDS: readonly NoticeKind[] = ['advisory', 'burnBan'];

/** What a condition is asked for: silence is tolerated a little before beginning, by default never before ending. */
export type Purpose = 'begin' | 'end';

/** For how long a condition must hold before it counts, and how much of that time may be not known. */
export interface Held {
  /** Minutes the condition must have held; absent or 0: only now counts. */
  readonly heldMinutes?: number;
  /** Minutes of `heldMinutes` that may be not known; absent: `DEFAULT_TOLERANCE_MINUTES` of the purpose. */
  readonly toleranceMinutes?: number;
}

/** One measure against one limit, in the measure's unit. A yes-no measure takes "=" and true or false. */
export interface Clause extends Held {
  readonly measure: MeasureName;
  readonly op: Comparison;
  readonly value: number | boolean;
}

/** True when all its parts are. */
export interface AllOf extends Held {
  readonly all: readonly Condition[];
}

/** True when one of its parts is. */
export interface AnyOf extends Held {
  readonly any: readonly Condition[];
}

/** True when its part is false; not known stays not known. */
export interface NotOf extends Held {
  readonly not: Condition;
}

/** A condition: a clause, or a group of conditions. */
export type Condition = Clause | AllOf | AnyOf | NotOf;

/** Hours of the local day, from the first to before the last; 20 to 6 goes over midnight. */
export interface HoursOfDay {
  /** First hour, 0 to 23. */
  readonly from: number;
  /** Hour before which it ends, 1 to 24. */
  readonly to: number;
}

/** Part of the year by local date, both days included; "11-01" to "02-28" goes over the new year. */
export interface Season {
  /** First day, "MM-DD". */
  readonly from: string;
  /** Last day, "MM-DD". */
  readonly to: string;
}

/** The rule for one kind of notice. */
export interface NoticeRule {
  /** When to propose to begin. */
  readonly begin: Condition;
  /** When to propose to end what is in force. */
  readonly end: Condition;
  /** Minutes after a proposal was declined or lapsed before the same is proposed again. Absent: 0. */
  readonly earliestReproposalMinutes?: number;
  /** Hours after which a notice of this kind ends unless someone extends it. */
  readonly longestValidityHours: number;
  /** Local hours in which it may be proposed to begin. Absent: at any hour. */
  readonly hoursOfDay?: HoursOfDay;
  /** Part of the year in which it may be proposed to begin. Absent: all year. */
  readonly season?: Season;
}

/** A district's written rule: one part per kind of notice, at least one of them. */
export type RuleDefinition = { readonly [Kind in NoticeKind]?: NoticeRule };

/** Minutes of not-known that a held condition lets pass unless it says otherwise. */
export const DEFAULT_TOLERANCE_MINUTES: Readonly<Record<Purpose, number>> = { begin: 30, end: 0 };

/**
 * The parts of a group, none for a clause.
 *
 * Units: none. Valid: any condition. Source: none (definition).
 */
export function partsOf(condition: Condition): readonly Condition[] {
  if ('all' in condition) return condition.all;
  if ('any' in condition) return condition.any;
  return 'not' in condition ? [condition.not] : [];
}

/**
 * Minutes of not-known that a held condition lets pass.
 *
 * Units: min. Valid: any condition. Source: none (the project's own rule language).
 */
export function toleranceMinutesOf(condition: Held, purpose: Purpose): number {
  return condition.toleranceMinutes ?? DEFAULT_TOLERANCE_MINUTES[purpose];
}
