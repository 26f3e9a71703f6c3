import type { Comparison } from '@lidwatch/atmosphere';
import type { MeasureName } from '../measures/catalogue';
import { exampleOf, narrowed, wholeRegion, type Region } from './region';
import type { Clause, Condition } from './rule-definition';

/** Values, one per measure named, for which the conditions are all true. */
export type Example = Partial<Record<MeasureName, number>>;

/** Whether some values make conditions true together. */
export type Satisfaction =
  | { readonly found: 'yes'; readonly example: Example }
  | { readonly found: 'no' }
  | { readonly found: 'too tangled to say' };

interface Atom {
  readonly kind: 'atom';
  readonly measure: MeasureName;
  readonly op: Comparison;
  readonly value: number;
}

interface Choice {
  readonly kind: 'all' | 'any';
  readonly parts: readonly Plain[];
}

/** A comparison, or a choice or union of them, without any "not" left. */
type Plain = Atom | Choice;

const MOST_STEPS = 20_000;
const CONTRARY = { '>=': '<', '>': '<=', '<=': '>', '<': '>=' } as const;

/** What excludes no values. */
const ANYTHING: Plain = { kind: 'all', parts: [] };

/**
 * Moves every "not" inwards until it turns a comparison round (De Morgan). What has *not* held for two hours may well
 * be so now, so under a "not" a condition with held-for excludes nothing.
 */
function plain(condition: Condition, negated: boolean): Plain {
  if (negated && condition.heldMinutes) return ANYTHING;
  if ('not' in condition) return plain(condition.not, !negated);
  if ('all' in condition) {
    return { kind: negated ? 'any' : 'all', parts: condition.all.map((part) => plain(part, negated)) };
  }
  if ('any' in condition) {
    return { kind: negated ? 'all' : 'any', parts: condition.any.map((part) => plain(part, negated)) };
  }
  return plainClause(condition, negated);
}

function plainClause({ measure, op, value }: Clause, negated: boolean): Plain {
  const limit = Number(value);
  if (!negated) return { kind: 'atom', measure, op, value: limit };
  if (op !== '=') return { kind: 'atom', measure, op: CONTRARY[op], value: limit };
  const sides = (['<', '>'] as const).map((side) => ({
    kind: 'atom' as const,
    measure,
    op: side,
    value: limit,
  }));
  return { kind: 'any', parts: sides };
}

/**
 * Looks for one set of values that makes all the conditions true at once, held-for left aside (a condition that has
 * held is true of the values at some time). Measures are taken to be free of one another.
 *
 * Units: each measure's. Valid: conditions that passed validation; the search gives up after 20,000 steps and says so.
 * Source: none (search over the choices, comparisons first).
 */
export function satisfyTogether(conditions: readonly Condition[]): Satisfaction {
  let steps = 0;
  const search = (todo: readonly Plain[], regions: ReadonlyMap<MeasureName, Region>): Example | null => {
    steps += 1;
    if (steps > MOST_STEPS) return null;
    const known = new Map(regions);
    const choices: (readonly Plain[])[] = [];
    const stack = [...todo];
    for (let next = stack.pop(); next !== undefined; next = stack.pop()) {
      if (next.kind === 'all') stack.push(...next.parts);
      else if (next.kind === 'any') choices.push(next.parts);
      else if (next.kind === 'atom') {
        const region = known.get(next.measure) ?? wholeRegion(next.measure);
        const left = narrowed(region, next.measure, next.op, next.value);
        if (left === null) return null;
        known.set(next.measure, left);
      }
    }
    const [first, ...others] = choices;
    if (first === undefined) {
      return Object.fromEntries([...known].map(([measure, region]) => [measure, exampleOf(region)]));
    }
    const rest = others.map((parts): Plain => ({ kind: 'any', parts }));
    for (const choice of first) {
      const example = search([choice, ...rest], known);
      if (example !== null || steps > MOST_STEPS) return example;
    }
    return null;
  };
  const example = search(
    conditions.map((condition) => plain(condition, false)),
    new Map(),
  );
  if (example !== null) return { found: 'yes', example };
  return { found: steps > MOST_STEPS ? 'too tangled to say' : 'no' };
}
