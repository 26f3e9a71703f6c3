import { LONGEST_HELD_MINUTES, MOST_CLAUSES, MOST_LEVELS, MOST_PARTS } from './limits';
import { memberPath, shown, type ProblemList } from './problems';
import { checkNumber, isFields, refuseOtherKeys, type Fields } from './read-fields';
import { validateClause } from './validate-clause';

const GROUPS = ['all', 'any', 'not'] as const;
const HELD_KEYS = ['heldMinutes', 'toleranceMinutes'];
const SHAPE =
  'A condition is { "all": […] }, { "any": […] }, { "not": … } or { "measure": …, "op": …, "value": … }';

/** What has been counted so far in one condition. */
interface Count {
  clauses: number;
  parts: number;
}

/** Notes all that is wrong with one condition tree, wherever in it. */
export function validateCondition(condition: unknown, path: string, list: ProblemList): void {
  const count: Count = { clauses: 0, parts: 0 };
  validatePart(condition, path, 1, count, list);
  if (count.clauses > MOST_CLAUSES) {
    list.add(path, 'too-many-parts', `It has more than ${MOST_CLAUSES} clauses. Write it more simply.`);
  } else if (count.parts > MOST_PARTS) {
    list.add(
      path,
      'too-many-parts',
      `It has more than ${MOST_PARTS} clauses and groups. Write it more simply.`,
    );
  }
}

function validatePart(
  condition: unknown,
  path: string,
  level: number,
  count: Count,
  list: ProblemList,
): void {
  count.parts += 1;
  if (count.parts > MOST_PARTS) return;
  if (level > MOST_LEVELS) {
    list.add(
      path,
      'too-deep',
      `Groups are nested more than ${MOST_LEVELS} deep. Write it with fewer levels.`,
    );
    return;
  }
  if (!isFields(condition)) {
    list.add(path, 'not-a-condition', `${SHAPE}; here stands ${shown(condition)}.`);
    return;
  }
  const groups = GROUPS.filter((key) => Object.hasOwn(condition, key));
  if (groups.length > 1 || (groups.length === 1 && Object.hasOwn(condition, 'measure'))) {
    list.add(path, 'not-a-condition', `${SHAPE}, one of them at a time; here are several.`);
  } else if (groups[0] !== undefined) {
    validateGroup(condition, groups[0], path, level, count, list);
  } else if (['measure', 'op', 'value'].some((key) => Object.hasOwn(condition, key))) {
    count.clauses += 1;
    validateClause(condition, path, list);
  } else {
    list.add(path, 'not-a-condition', `${SHAPE}; here is none of them.`);
    return;
  }
  validateHeld(condition, path, list);
}

function validateGroup(
  condition: Fields,
  key: (typeof GROUPS)[number],
  path: string,
  level: number,
  count: Count,
  list: ProblemList,
): void {
  refuseOtherKeys(condition, [key, ...HELD_KEYS], path, list);
  const at = memberPath(path, key);
  const inside = condition[key];
  if (key === 'not') return validatePart(inside, at, level + 1, count, list);
  if (!Array.isArray(inside)) {
    list.add(at, 'not-a-condition', `"${key}" takes a list of conditions; here stands ${shown(inside)}.`);
  } else if (inside.length === 0) {
    list.add(at, 'empty-group', `"${key}" is empty. Put at least one condition into it, or leave it out.`);
  } else {
    inside.forEach((part, i) => validatePart(part, `${at}[${i}]`, level + 1, count, list));
  }
}

function validateHeld(condition: Fields, path: string, list: ProblemList): void {
  const limits = { lo: 0, hi: LONGEST_HELD_MINUTES, unit: 'minutes', whole: true };
  const fine =
    checkNumber(condition, 'heldMinutes', limits, path, list) &&
    checkNumber(condition, 'toleranceMinutes', limits, path, list);
  const { heldMinutes, toleranceMinutes } = condition as { heldMinutes?: number; toleranceMinutes?: number };
  if (!fine || toleranceMinutes === undefined || toleranceMinutes === 0) return;
  const at = memberPath(path, 'toleranceMinutes');
  if (!heldMinutes) {
    list.add(
      at,
      'tolerance-without-hold',
      'A tolerance needs heldMinutes beside it. Give both or leave it out.',
    );
  } else if (toleranceMinutes >= heldMinutes) {
    list.add(
      at,
      'tolerance-not-below-hold',
      `With ${toleranceMinutes} of ${heldMinutes} minutes tolerated, silence alone would do. Tolerate fewer minutes.`,
    );
  }
}
