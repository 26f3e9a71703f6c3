import { exampleInWords } from './example-in-words';
import { LONGEST_REPROPOSAL_MINUTES, LONGEST_VALIDITY_HOURS } from './limits';
import { memberPath, shown, type ProblemList } from './problems';
import { checkNumber, isFields, refuseOtherKeys, type Fields } from './read-fields';
import type { Condition } from './rule-definition';
import { satisfyTogether } from './satisfy';
import { validateCondition } from './validate-condition';

const KEYS = ['begin', 'end', 'earliestReproposalMinutes', 'longestValidityHours', 'hoursOfDay', 'season'];

/** Notes all that is wrong with the rule for one kind of notice. */
export function validateNoticeRule(rule: unknown, path: string, list: ProblemList): void {
  if (!isFields(rule)) {
    list.add(
      path,
      'not-a-rule',
      `Here belongs an object with begin, end and longestValidityHours, not ${shown(rule)}.`,
    );
    return;
  }
  refuseOtherKeys(rule, KEYS, path, list);
  const before = list.problems.length;
  for (const key of ['begin', 'end'] as const) {
    if (rule[key] === undefined)
      list.add(memberPath(path, key), 'missing', `The condition to ${key} is missing.`);
    else validateCondition(rule[key], memberPath(path, key), list);
  }
  if (list.problems.length === before) {
    checkSense(rule['begin'] as Condition, rule['end'] as Condition, path, list);
  }
  const minutes = { lo: 0, hi: LONGEST_REPROPOSAL_MINUTES, unit: 'minutes', whole: true };
  checkNumber(rule, 'earliestReproposalMinutes', minutes, path, list);
  const hours = { lo: 1, hi: LONGEST_VALIDITY_HOURS, unit: 'hours', required: true };
  checkNumber(rule, 'longestValidityHours', hours, path, list);
  if (rule['hoursOfDay'] !== undefined)
    validateHours(rule['hoursOfDay'], memberPath(path, 'hoursOfDay'), list);
  if (rule['season'] !== undefined) validateSeason(rule['season'], memberPath(path, 'season'), list);
}

/** Notes a condition that no values make true, and values for which begin and end would both be true. */
function checkSense(begin: Condition, end: Condition, path: string, list: ProblemList): void {
  const tangled = 'It has too many choices within choices to be checked. Write it more simply.';
  for (const [key, condition] of [
    ['begin', begin],
    ['end', end],
  ] as const) {
    const { found } = satisfyTogether([condition]);
    if (found === 'no') {
      list.add(
        memberPath(path, key),
        'never-true',
        `No values make the condition to ${key} true. Correct its limits.`,
      );
    }
  }
  const both = satisfyTogether([begin, end]);
  if (both.found === 'too tangled to say') list.add(path, 'too-tangled', tangled);
  if (both.found !== 'yes') return;
  list.add(
    path,
    'begin-and-end-overlap',
    `The conditions to begin and to end are both true when ${exampleInWords(both.example)}. ` +
      'Add to one of them what the other excludes.',
  );
}

function validateHours(hours: unknown, path: string, list: ProblemList): void {
  if (!isFields(hours)) {
    list.add(path, 'wrong-value', `Give { "from": 0 to 23, "to": 1 to 24 }, not ${shown(hours)}.`);
    return;
  }
  refuseOtherKeys(hours, ['from', 'to'], path, list);
  const whole = { unit: 'the clock', whole: true, required: true };
  const fine =
    checkNumber(hours, 'from', { lo: 0, hi: 23, ...whole }, path, list) &&
    checkNumber(hours, 'to', { lo: 1, hi: 24, ...whole }, path, list);
  if (fine && hours['from'] === hours['to']) {
    list.add(path, 'wrong-value', 'from and to are the same hour. Leave hoursOfDay out to allow every hour.');
  }
}

function validateSeason(season: unknown, path: string, list: ProblemList): void {
  if (!isFields(season)) {
    list.add(path, 'wrong-value', `Give { "from": "MM-DD", "to": "MM-DD" }, not ${shown(season)}.`);
    return;
  }
  refuseOtherKeys(season, ['from', 'to'], path, list);
  for (const key of ['from', 'to'] as const) checkDay(season, key, path, list);
}

function checkDay(season: Fields, key: 'from' | 'to', path: string, list: ProblemList): void {
  const day = season[key];
  const [, month, date] = (typeof day === 'string' && /^(\d\d)-(\d\d)$/.exec(day)) || [];
  const days = [31, 29, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][Number(month) - 1] ?? 0;
  if (date !== undefined && Number(date) >= 1 && Number(date) <= days) return;
  list.add(
    memberPath(path, key),
    day === undefined ? 'missing' : 'wrong-date',
    `${day === undefined ? `${key} is missing` : `${shown(day)} is no day of the year`}. Write month and day as "11-01".`,
  );
}
