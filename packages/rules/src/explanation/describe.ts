import type { Comparison } from '@lidwatch/atmosphere';
import type { Condition, Held } from '../definition/rule-definition';
import { MEASURES, type MeasureName } from '../measures/catalogue';
import type { Language } from '../measures/measure';
import { minutesInWords, valueInWords } from './numbers';

const COMPARISON_WORDS: Readonly<Record<Language, Record<Comparison, string>>> = {
  en: { '>=': 'at least', '>': 'above', '<=': 'at most', '<': 'below', '=': 'exactly' },
  es: {
    '>=': 'de al menos',
    '>': 'por encima de',
    '<=': 'de como máximo',
    '<': 'por debajo de',
    '=': 'exactamente',
  },
};

const GROUP_WORDS = {
  en: { all: 'All of these', any: 'Any of these', not: 'Not so' },
  es: { all: 'Todo lo siguiente', any: 'Algo de lo siguiente', not: 'No se da' },
} as const;

const FOR = { en: 'for', es: 'durante' };

const heldInWords = ({ heldMinutes }: Held, language: Language): string =>
  heldMinutes ? ` ${FOR[language]} ${minutesInWords(heldMinutes)}` : '';

/**
 * A clause in words, without what was measured: "Inversion at least 2 °C for 2 h", "Inversion sure: yes".
 *
 * Units: the measure's, written. Valid: a clause that passed validation. Source: none (definition).
 */
export function describeClause(
  clause: { measure: MeasureName; op: Comparison; value: number | boolean } & Held,
  language: Language,
): string {
  const { measure, op, value } = clause;
  const { kind, label } = MEASURES[measure];
  const limit = valueInWords(measure, value, language);
  const middle = kind === 'yes-no' ? ':' : ` ${COMPARISON_WORDS[language][op]}`;
  return `${label[language]}${middle} ${limit}${heldInWords(clause, language)}`;
}

/**
 * The heading of a group in words: "All of these for 1 h".
 *
 * Units: min, written. Valid: any kind of group. Source: none (definition).
 */
export function describeGroup(kind: 'all' | 'any' | 'not', held: Held, language: Language): string {
  return GROUP_WORDS[language][kind] + heldInWords(held, language);
}

/**
 * A condition in lines, groups first and their parts below them, each level indented by two spaces.
 *
 * Units: each measure's, written. Valid: a condition that passed validation. Source: none (definition).
 */
export function describeCondition(condition: Condition, language: Language): string[] {
  if ('measure' in condition) return [describeClause(condition, language)];
  const kind = 'all' in condition ? 'all' : 'any' in condition ? 'any' : 'not';
  const parts = 'all' in condition ? condition.all : 'any' in condition ? condition.any : [condition.not];
  const inside = parts.flatMap((part) => describeCondition(part, language)).map((line) => `  ${line}`);
  return [`${describeGroup(kind, condition, language)}:`, ...inside];
}
