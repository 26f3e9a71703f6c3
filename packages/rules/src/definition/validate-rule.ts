import { ProblemList, shown, type Problem } from './problems';
import { isFields, refuseOtherKeys } from './read-fields';
import { NOTICE_KINDS, type RuleDefinition } from './rule-definition';
import { validateNoticeRule } from './validate-notice-rule';

/** The outcome of a validation: the rule as plain data of its own, or all that is wrong with it. */
export type Validation =
  | { readonly ok: true; readonly rule: RuleDefinition }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** Characters of JSON a rule may have; the largest sensible one is a tenth of it. */
const MOST_CHARACTERS = 100_000;

/**
 * Reads a rule from outside and says everything that is wrong with it, each with its JSON path and a cure.
 *
 * Units: those in the names. Valid: any input at all; it never throws, and the rule it gives is a copy that shares
 * nothing with the input. Source: none (the project's own rule language).
 */
export function validateRule(input: unknown): Validation {
  const list = new ProblemList();
  const copy = plainCopy(input, list);
  if (list.problems.length > 0) return { ok: false, problems: list.problems };
  if (!isFields(copy)) {
    list.add('$', 'not-a-rule', `A rule is an object with advisory, burnBan or both, not ${shown(copy)}.`);
    return { ok: false, problems: list.problems };
  }
  refuseOtherKeys(copy, NOTICE_KINDS, '$', list);
  const kinds = NOTICE_KINDS.filter((kind) => copy[kind] !== undefined);
  if (kinds.length === 0) {
    list.add('$', 'missing', 'The rule says nothing. Give it a part for advisory, burnBan or both.');
  }
  for (const kind of kinds) validateNoticeRule(copy[kind], `$.${kind}`, list);
  return list.problems.length === 0 ? { ok: true, rule: copy } : { ok: false, problems: list.problems };
}

/** The input as JSON and back: no cycles, getters, prototypes or unheard-of types are left to trip over. */
function plainCopy(input: unknown, list: ProblemList): unknown {
  let text: string | undefined;
  try {
    text = JSON.stringify(input);
  } catch (error) {
    const why = error instanceof RangeError ? 'it is nested too deep' : 'it is no plain JSON';
    list.add('$', 'not-a-rule', `This cannot be read as a rule: ${why}. Give a JSON object.`);
    return undefined;
  }
  if (text === undefined) return undefined;
  if (text.length > MOST_CHARACTERS) {
    list.add(
      '$',
      'too-large',
      `A rule of ${text.length} characters is too large; ${MOST_CHARACTERS} are allowed.`,
    );
    return undefined;
  }
  return JSON.parse(text);
}
