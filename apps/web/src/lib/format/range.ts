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
export const isNotKnown = (value: RangeValue): boolean => drawable(value) === null;

/** The number within the value that can be drawn: itself, its bound or its middle; null when not known. */
export function drawable({ exactly, atLeast, atMost, between }: RangeValue): number | null {
  if (between) return ((between[0] ?? NaN) + (between[1] ?? NaN)) / 2;
  return exactly ?? atLeast ?? atMost ?? null;
}

/** A value that may be a range, in words or signs: "≥ 5.1 °C", "at least 5.1 °C", "1.0 to 2.0 °C", "not known". */
export function rangeText(
  value: RangeValue,
  { decimals = 1, unit = '', style = 'signs', write }: Form = {},
): string {
  const { exactly, atLeast, atMost, between } = value;
  const number = write ?? ((v: number) => decimal(v, decimals));
  const withUnit = (text: string) => (unit === '' ? text : `${text} ${unit}`);
  if (exactly !== undefined) return withUnit(number(exactly));
  if (atLeast !== undefined) return BOUNDS[style].atLeast + withUnit(number(atLeast));
  if (atMost !== undefined) return BOUNDS[style].atMost + withUnit(number(atMost));
  return between ? withUnit(between.map(number).join(' to ')) : 'not known';
}
