import type { Comparison, Quantity, Truth } from '@lidwatch/atmosphere';
import type { MeasureName } from '../measures/catalogue';
import type { Run } from './block-series';

/** How long a condition held, beside what was asked. All in minutes; true + false + not known = record. */
export interface HeldFacts {
  readonly neededMinutes: number;
  readonly toleratedMinutes: number;
  readonly recordMinutes: number;
  readonly trueMinutes: number;
  readonly falseMinutes: number;
  readonly notKnownMinutes: number;
  /** How long it has been true without a break up to the block, where that is longer than was asked. */
  readonly unbrokenMinutes?: number;
  /** Only where it was true since the record begins, so that it may have held for longer. */
  readonly unbrokenOrMore?: true;
  /** Why the record is shorter than asked; absent when it is not. */
  readonly recordStartsAfter?: Run['after'] | 'nothing on record';
}

interface Evaluated {
  /** What counts: with held-for, where one is asked. */
  readonly truth: Truth;
  /** What holds at this block, held-for left aside. */
  readonly now: Truth;
  /** Only where the condition is asked to have held. */
  readonly held?: HeldFacts;
}

/** A clause with what was measured at the block. `Measured` is a `Quantity`, or its form in JSON. */
export interface EvaluatedClause<Measured = Quantity> extends Evaluated {
  readonly kind: 'clause';
  readonly measure: MeasureName;
  readonly op: Comparison;
  readonly value: number | boolean;
  readonly measured: Measured;
}

/** A group with its evaluated parts. */
export interface EvaluatedGroup<Measured = Quantity> extends Evaluated {
  readonly kind: 'all' | 'any' | 'not';
  readonly parts: readonly EvaluatedNode<Measured>[];
}

/** A condition tree as it was found at one block: the evidence. */
export type EvaluatedNode<Measured = Quantity> = EvaluatedClause<Measured> | EvaluatedGroup<Measured>;
