import { isKnown, isNotKnown, type Quantity } from '@lidwatch/atmosphere';
import { MEASURES, type MeasureName } from '../measures/catalogue';
import type { Language } from '../measures/measure';

const YES_NO = { en: ['no', 'yes'], es: ['no', 'sí'] } as const;
const AT_LEAST = { en: 'at least', es: 'al menos' };
const AT_MOST = { en: 'at most', es: 'como máximo' };
const BETWEEN = { en: ['between', 'and'], es: ['entre', 'y'] } as const;
const NOT_KNOWN = { en: 'not known', es: 'no se sabe' };

/** Letters of the ΔT/Δz classes, the first being class 1. */
const STABILITY_CLASSES = 'ABCDEFG';

/**
 * A number as the measure is read: rounded to its decimals (one at least, so that a limit of 12.5 stays so), a decimal comma in Spanish,
 * the letter of a stability class, yes or no.
 *
 * Units: the measure's, not written. Valid: any finite number. Source: none (definition).
 */
export function numberInWords(measure: MeasureName, value: number | boolean, language: Language): string {
  const { kind, decimals } = MEASURES[measure];
  if (kind === 'yes-no') return YES_NO[language][Number(value) === 1 ? 1 : 0];
  const letter = measure === 'deltaTClass' ? STABILITY_CLASSES[Number(value) - 1] : undefined;
  if (letter !== undefined) return letter;
  const text = String(Number(Number(value).toFixed(Math.max(decimals, 1))));
  return language === 'es' ? text.replace('.', ',') : text;
}

/**
 * A limit or value with its unit: "2 °C", "13 h", "F".
 *
 * Units: the measure's, written. Valid: any finite number or truth. Source: none (definition).
 */
export function valueInWords(measure: MeasureName, value: number | boolean, language: Language): string {
  const { unit } = MEASURES[measure];
  return numberInWords(measure, value, language) + (unit && ` ${unit}`);
}

/**
 * What was measured, in words: "5.1 °C", "at least 5.1 °C", "between 1 and 2 °C", "not known (the sensor was silent)".
 *
 * Units: the measure's, written. Valid: any quantity. Source: none (definition).
 */
export function measuredInWords(measure: MeasureName, measured: Quantity, language: Language): string {
  const { lo, hi, reason } = measured;
  if (isNotKnown(measured) || (MEASURES[measure].kind === 'yes-no' && !isKnown(measured))) {
    return NOT_KNOWN[language] + (reason ? ` (${reason})` : '');
  }
  if (isKnown(measured)) return valueInWords(measure, lo, language);
  if (hi === Infinity) return `${AT_LEAST[language]} ${valueInWords(measure, lo, language)}`;
  if (lo === -Infinity) return `${AT_MOST[language]} ${valueInWords(measure, hi, language)}`;
  const [from, to] = BETWEEN[language];
  return `${from} ${numberInWords(measure, lo, language)} ${to} ${valueInWords(measure, hi, language)}`;
}

/**
 * A stretch of time: "45 min", "2 h", "1 h 30 min".
 *
 * Units: min. Valid: 0 and above; rounded to the minute. Source: none (definition).
 */
export function minutesInWords(minutes: number): string {
  const whole = Math.round(minutes);
  const hours = Math.floor(whole / 60);
  const rest = whole % 60;
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`;
}
