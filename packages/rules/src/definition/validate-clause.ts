import { COMPARISONS } from '@lidwatch/atmosphere';
import { isMeasureName, MEASURES, type MeasureName } from '../measures/catalogue';
import { memberPath, shown, type ProblemList } from './problems';
import { refuseOtherKeys, type Fields } from './read-fields';

const KEYS = ['measure', 'op', 'value', 'heldMinutes', 'toleranceMinutes'];

/** Notes what is wrong with one clause `{ measure, op, value }`; its held-for is checked with that of groups. */
export function validateClause(clause: Fields, path: string, list: ProblemList): void {
  refuseOtherKeys(clause, KEYS, path, list);
  const { measure } = clause;
  if (!isMeasureName(measure)) {
    list.add(
      memberPath(path, 'measure'),
      measure === undefined ? 'missing' : 'unknown-measure',
      `${measure === undefined ? 'The measure is missing' : `There is no measure ${shown(measure)}`}. ` +
        `Use one of ${Object.keys(MEASURES).join(', ')}.`,
    );
    return;
  }
  checkOp(measure, clause['op'], memberPath(path, 'op'), list);
  checkValue(measure, clause['value'], memberPath(path, 'value'), list);
}

/**
 * The comparisons that make sense for a measure: only a whole number or a yes or no can be equal to something.
 *
 * Units: none. Valid: any measure. Source: none (the project's own rule language).
 */
export function comparisonsFor(measure: MeasureName): readonly string[] {
  const { kind, whole } = MEASURES[measure];
  if (kind === 'yes-no') return ['='];
  return whole ? COMPARISONS : COMPARISONS.filter((op) => op !== '=');
}

function checkOp(measure: MeasureName, op: unknown, path: string, list: ProblemList): void {
  const fitting = comparisonsFor(measure);
  if (typeof op === 'string' && fitting.includes(op)) return;
  const said = op === undefined ? 'The comparison is missing' : `${shown(op)} cannot be used`;
  const cure =
    MEASURES[measure].kind === 'yes-no'
      ? 'it is a yes or no: use "=" with true or false'
      : `use ${fitting.join(' ')}`;
  list.add(path, op === undefined ? 'missing' : 'wrong-op', `${said} for ${measure}; ${cure}.`);
}

function checkValue(measure: MeasureName, value: unknown, path: string, list: ProblemList): void {
  const { kind, whole, unit, possible } = MEASURES[measure];
  if (kind === 'yes-no') {
    if (typeof value === 'boolean') return;
    const said = value === undefined ? 'The value is missing' : `The value is ${shown(value)}`;
    list.add(path, value === undefined ? 'missing' : 'wrong-value', `${said}; ${measure} is true or false.`);
    return;
  }
  const range = `from ${possible.lo} to ${possible.hi}${unit && ` ${unit}`}`;
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    const said = value === undefined ? 'The value is missing' : `The value is ${shown(value)}`;
    list.add(
      path,
      value === undefined ? 'missing' : 'wrong-value',
      `${said}; ${measure} takes a number ${range}.`,
    );
  } else if (value < possible.lo || value > possible.hi) {
    list.add(path, 'impossible-value', `${measure} can never be ${value}; give a limit ${range}.`);
  } else if (whole && !Number.isInteger(value)) {
    list.add(
      path,
      'impossible-value',
      `${measure} is always a whole number; ${value} is none. Give one ${range}.`,
    );
  }
}
