import { memberPath, shown, type ProblemList } from './problems';

/** A JSON object not yet known to be anything in particular. */
export type Fields = Readonly<Record<string, unknown>>;

/** Whether a JSON value is an object (no list, no null). */
export function isFields(value: unknown): value is Fields {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Notes every key that the place does not know, naming those it does. */
export function refuseOtherKeys(
  fields: Fields,
  known: readonly string[],
  path: string,
  list: ProblemList,
): void {
  for (const key of Object.keys(fields)) {
    if (!known.includes(key)) {
      list.add(
        memberPath(path, key),
        'unknown-key',
        `${shown(key)} means nothing here. Use only ${known.join(', ')}.`,
      );
    }
  }
}

/** What a number in a rule must be. */
export interface NumberLimits {
  readonly lo: number;
  readonly hi: number;
  readonly unit: string;
  readonly whole?: boolean;
  readonly required?: boolean;
}

/** Notes a number that is missing, no number, not whole where it must be, or outside its limits. True when in order. */
export function checkNumber(
  fields: Fields,
  key: string,
  limits: NumberLimits,
  path: string,
  list: ProblemList,
): boolean {
  const at = memberPath(path, key);
  const value = fields[key];
  const asked = `a ${limits.whole ? 'whole ' : ''}number of ${limits.unit} from ${limits.lo} to ${limits.hi}`;
  if (value === undefined) {
    if (limits.required) list.add(at, 'missing', `${key} is missing. Give ${asked}.`);
    return !limits.required;
  }
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    list.add(at, 'wrong-value', `${key} is ${shown(value)}. Give ${asked}.`);
    return false;
  }
  if (value < limits.lo || value > limits.hi || (limits.whole && !Number.isInteger(value))) {
    list.add(at, 'out-of-range', `${key} is ${value}. Give ${asked}.`);
    return false;
  }
  return true;
}
