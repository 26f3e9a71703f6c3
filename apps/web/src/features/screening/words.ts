import { count, counted, decimal } from '../../lib/format/number';
import { duration } from '../../lib/format/time';
import type { ChangedFindings, Check, Quality, RawSeries, Said } from './types';

/** A quality in words. */
export const QUALITY_NAME: Record<Quality, string> = {
  ...{ valid: 'valid', suspect: 'suspect', failed: 'failed', missing: 'missing' },
};

/** A check by a short name. */
export const CHECK_NAME: Record<Check, string> = {
  range: 'outside the range',
  spike: 'spike',
  step: 'fast change',
  persistence: 'steady for long',
  'internal consistency': 'at odds with the temperature',
  'vertical consistency': 'unusual to the next level',
  neighbours: 'at odds with neighbours',
  override: 'set by a person',
  stuck: 'stuck',
  clock: 'wrong clock',
};

/** What a person did to a span. */
export const SAID_NAME: Record<Said, string> = { failed: 'Set aside', valid: 'Set right' };

const hours = (value: number): string => duration(60 * value);

const movesOf = (changes: ChangedFindings): string[] =>
  (
    [
      ['presentToAbsent', 'from inversion to none'],
      ['absentToPresent', 'from none to inversion'],
      ['toNotKnown', 'to not known'],
      ['fromNotKnown', 'from not known'],
      ['toNotSure', 'from sure to not sure'],
      ['toSure', 'from not sure to sure'],
    ] as const
  )
    .filter(([key]) => changes[key] > 0)
    .map(([key, way]) => `${counted(changes[key], 'block')} ${way}`);

const strongest = (value: number | null): string => (value === null ? 'none' : `${decimal(value)} °C`);

/** What is different in the findings, sentence by sentence. */
export function changeSentences(changes: ChangedFindings): string[] {
  if (changes.blocksChanged === 0) return ['Nothing in the findings is different.'];
  const moves = movesOf(changes);
  const sentences = [
    `${counted(changes.blocksChanged, 'block')} changed${moves.length > 0 ? `: ${moves.join(', ')}` : '; none changed between inversion, none and not known, or in how sure it is'}.`,
  ];
  if (changes.inversionHoursBefore > 0 || changes.inversionHoursAfter > 0) {
    const [before, after] = [hours(changes.inversionHoursBefore), hours(changes.inversionHoursAfter)];
    const [was, is] = [strongest(changes.strongestBeforeC), strongest(changes.strongestAfterC)];
    sentences.push(
      before === after
        ? `In them an inversion for ${after}, as before.`
        : `In them an inversion for ${after}, before ${before}.`,
      was === is ? `Strongest ${is}, as before.` : `Strongest ${is}, before ${was}.`,
    );
  }
  const told = changes.districts.filter(({ truthsChanged }) => truthsChanged > 0);
  for (const { name, truthsChanged } of told)
    sentences.push(`In ${name} the rule now says otherwise for ${counted(truthsChanged, 'block')}.`);
  if (changes.districts.length > 0 && told.length === 0) sentences.push('No rule says otherwise.');
  return sentences;
}

/** The readings of some sensors in a sentence: how many, how many flagged, where. */
export function rawSentence(shown: readonly RawSeries[]): string {
  if (shown.every(({ readings }) => readings === 0)) return 'No readings in this time.';
  return shown
    .map(({ name, readings, failed, suspect }) => {
      const flagged = [
        ...(failed > 0 ? [`${count(failed)} failed`] : []),
        ...(suspect > 0 ? [`${count(suspect)} suspect`] : []),
      ];
      return `${name}: ${counted(readings, 'reading')}${flagged.length > 0 ? `, ${flagged.join(', ')}` : ''}.`;
    })
    .join(' ');
}
