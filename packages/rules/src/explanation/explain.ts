import type { Truth } from '@lidwatch/atmosphere';
import type { EvaluatedNode, HeldFacts } from '../evaluation/evaluated-node';
import type { Language } from '../measures/measure';
import { describeClause, describeGroup } from './describe';
import { measuredInWords, minutesInWords } from './numbers';

/** An evaluated condition in words, with its parts below it. */
export interface Explanation {
  /** One sentence without its full stop: "Inversion at least 2 °C for 2 h: met, at least 5.1 °C". */
  readonly text: string;
  readonly truth: Truth;
  readonly parts: readonly Explanation[];
}

const VERDICTS: Readonly<Record<Language, Record<Truth, string>>> = {
  en: { true: 'met', false: 'not met', 'not known': 'not known' },
  es: { true: 'se cumple', false: 'no se cumple', 'not known': 'no se sabe' },
};

const HELD_WORDS = {
  en: {
    metOf: (met: string, needed: string) => `met for ${met} of the last ${needed}`,
    notKnown: (minutes: string) => `${minutes} of it not known`,
    record: (minutes: string) => `only ${minutes} on record`,
    change: (minutes: string) => `another tower answered until ${minutes} ago`,
  },
  es: {
    metOf: (met: string, needed: string) => `se cumplió ${met} de los últimos ${needed}`,
    notKnown: (minutes: string) => `${minutes} sin datos`,
    record: (minutes: string) => `solo hay registro de ${minutes}`,
    change: (minutes: string) => `hasta hace ${minutes} respondía otra torre`,
  },
} as const;

/** What must be said of the time: nothing when all of it was met. */
function heldFactsInWords(held: HeldFacts, language: Language): string[] {
  const words = HELD_WORDS[language];
  const facts: string[] = [];
  if (held.trueMinutes < held.neededMinutes) {
    facts.push(words.metOf(minutesInWords(held.trueMinutes), minutesInWords(held.neededMinutes)));
  }
  if (held.notKnownMinutes > 0) facts.push(words.notKnown(minutesInWords(held.notKnownMinutes)));
  if (held.recordStartsAfter !== undefined) {
    const since = minutesInWords(held.recordMinutes);
    facts.push(held.recordStartsAfter === 'change of tower' ? words.change(since) : words.record(since));
  }
  return facts;
}

/**
 * An evaluated tree in plain words, in English or Spanish.
 *
 * Units: each measure's, written. Valid: any evaluated tree; reasons why a value is not known stand as they were given.
 * Source: none (definition).
 */
export function explain(node: EvaluatedNode, language: Language): Explanation {
  const held = node.held === undefined ? {} : { heldMinutes: node.held.neededMinutes };
  const facts = node.held === undefined ? [] : heldFactsInWords(node.held, language);
  const verdict = VERDICTS[language][node.truth];
  if (node.kind === 'clause') {
    const measured = measuredInWords(node.measure, node.measured, language);
    // "not known, not known (the sensor was silent)" says it twice.
    const found = measured.startsWith(verdict) ? [measured] : [verdict, measured];
    const text = `${describeClause({ ...node, ...held }, language)}: ${[...found, ...facts].join(', ')}`;
    return { text, truth: node.truth, parts: [] };
  }
  const text = `${describeGroup(node.kind, held, language)}: ${[verdict, ...facts].join(', ')}`;
  return { text, truth: node.truth, parts: node.parts.map((part) => explain(part, language)) };
}

/**
 * An explanation in sentences, one a line, each level indented by two spaces.
 *
 * Units: each measure's, written. Valid: what `explain` gave. Source: none (definition).
 */
export function sentencesOf(explanation: Explanation): string[] {
  const inside = explanation.parts.flatMap(sentencesOf).map((line) => `  ${line}`);
  return [`${explanation.text}.`, ...inside];
}
