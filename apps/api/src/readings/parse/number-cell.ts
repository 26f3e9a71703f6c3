import { quoted } from '../../common/quoted';
import type { Refusal } from '../refusal';

const PLAIN = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/i;
const WITH_COMMA = /^[+-]?(?:\d+,\d*|,\d+|\d+)(?:e[+-]?\d+)?$/i;

/** Larger numbers are no measurement, and differences of them could not be held. */
const LARGEST = 1e300;

const whyNot = (text: string, decimal: '.' | ','): string => {
  if (decimal === '.' && WITH_COMMA.test(text)) {
    return `${quoted(text)} is written with a decimal comma; declare the comma as this source's decimal mark.`;
  }
  if (text.startsWith('=')) return `${quoted(text)} is a spreadsheet formula; save the file with values.`;
  return `${quoted(text)} is not a number; correct it, or declare it as one of this source's marks for "no reading".`;
};

/** Whether a number can be worked with: finite, and not beyond ±1e300. */
export const isMeasurable = (value: number): boolean => Math.abs(value) <= LARGEST;

/**
 * The number in a cell. Only plain decimal notation counts; anything else, and numbers too large to hold, are refused
 * with the cure.
 */
export function readNumber(text: string, decimal: '.' | ',' = '.'): number | Refusal {
  const trimmed = text.trim();
  const readable = decimal === ',' ? WITH_COMMA.test(trimmed) || PLAIN.test(trimmed) : PLAIN.test(trimmed);
  const value = readable ? Number(trimmed.replace(',', '.')) : NaN;
  if (isMeasurable(value)) return value;
  return { code: 'value-not-a-number', why: whyNot(trimmed, decimal) };
}
