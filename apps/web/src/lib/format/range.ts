import type { RangeValue } from '../api/types';
import { decimal } from './number';

/** How a bound is written: signs for the desk, words for the phone and the public. */
export type BoundStyle = 'signs' | 'words';

interface Form {
  decimals?: number;
  unit?: string;
  style?: BoundStyle;
  /** How the bare number is written; fixed decimals by default. */
  write?: (value: number) => string;
}

const BOUNDS: Record<BoundStyle, { atLeast: string; atMost: string }> = {
  signs: { atLeast: '≥ ', atMost: '≤ ' },
  words: { atLeast: 'at least ', atMost: 'at most ' },
};

/** Whether nothing is known of the value. */
export const isNotKnown = (value: RangeValue): value is { notKnown: string } => 'notKnown' in value;

/** The number within the value that can be drawn: itself, its bound or its middle; null when not known. */
export function drawable(value: RangeValue): number | null {
  if ('exactly' in value) return value.exactly;
  if ('atLeast' in value) return value.atLeast;
  if ('atMost' in value) return value.atMost;
  if ('between' in value) return ((value.between[0] ?? NaN) + (value.between[1] ?? NaN)) / 2;
  return null;
}

/** A value that may be a range, in words or signs: "≥ 5.1 °C", "at least 5.1 °C", "1.0 to 2.0 °C", "not known". */
export function rangeText(
  value: RangeValue,
  { decimals = 1, unit = '', style = 'signs', write }: Form = {},
): string {
  const number = write ?? ((v: number) => decimal(v, decimals));
  const withUnit = (text: string) => (unit === '' ? text : `${text} ${unit}`);
  if ('exactly' in value) return withUnit(number(value.exactly));
  if ('atLeast' in value) return BOUNDS[style].atLeast + withUnit(number(value.atLeast));
  if ('atMost' in value) return BOUNDS[style].atMost + withUnit(number(value.atMost));
  if ('between' in value) return withUnit(value.between.map(number).join(' to '));
  return 'not known';
}
