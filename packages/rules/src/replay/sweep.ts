import type { Condition, NoticeRule } from '../definition/rule-definition';
import type { LocalMoment } from '../definition/when-allowed';
import { contingencyOf, type Contingency } from '../scores/contingency';
import { scoresOf, type Scores } from '../scores/scores';
import type { BlockColumns } from './columns';
import { dayCases, type ObservedDay } from './day-cases';
import { replayRule } from './replay-rule';

/** What one value of the limit would have given. */
export interface SweepPoint {
  readonly value: number;
  readonly notices: number;
  readonly counts: Contingency & { readonly notKnown: number };
  readonly scores: Scores;
}

/** Where in a condition a clause stands: the index of the part at each level; empty for the condition itself. */
export type PartPath = readonly number[];

/**
 * The condition with the limit of one clause replaced.
 *
 * Units: the measure's. Valid: a path that leads to a clause on a number; any other throws a `RangeError`.
 * Source: none (definition).
 */
export function withLimit(condition: Condition, path: PartPath, value: number): Condition {
  const [index, ...rest] = path;
  if (index === undefined) {
    if (!('measure' in condition) || typeof condition.value !== 'number') {
      throw new RangeError('Only a clause on a number has a limit to sweep. Give the path of one.');
    }
    return { ...condition, value };
  }
  const replace = (parts: readonly Condition[]): Condition[] => {
    if (parts[index] === undefined)
      throw new RangeError(`There is no part ${index}. Give the path of a clause.`);
    return parts.map((part, i) => (i === index ? withLimit(part, rest, value) : part));
  };
  if ('all' in condition) return { ...condition, all: replace(condition.all) };
  if ('any' in condition) return { ...condition, any: replace(condition.any) };
  if ('not' in condition) return { ...condition, not: replace([condition.not])[0]! };
  throw new RangeError('A clause has no parts. Give the path of a clause, without steps beyond it.');
}

/**
 * Tries one limit of a rule's condition to begin at several values: the curve to choose from.
 *
 * Units: the values in the measure's. Valid: as `replayRule` and `withLimit`; the swept rules are not validated, since
 * begin and end may meet at some of the values. Source: none (the project's own).
 */
export function sweepLimit(
  rule: NoticeRule,
  path: PartPath,
  values: readonly number[],
  columns: BlockColumns,
  days: readonly ObservedDay[],
  localMoment: (t: number) => LocalMoment,
): SweepPoint[] {
  return values.map((value) => {
    const notices = replayRule({ ...rule, begin: withLimit(rule.begin, path, value) }, columns, localMoment);
    const counts = contingencyOf(dayCases(notices, days));
    return { value, notices: notices.length, counts, scores: scoresOf(counts) };
  });
}
