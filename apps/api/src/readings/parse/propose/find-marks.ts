import { readNumber } from '../number-cell';

/** Texts that loggers commonly write for "no reading" (common practice). */
const WORDS = /^(?:nan|na|n\/a|#n\/a|null|none|nil|missing|m|-+|\/+|\*+|\?+|x+|bad|err(?:or)?|invalid)$/i;
/** Numbers that loggers commonly write for "no reading" (common practice). */
const NUMBERS =
  /^[+-]?(?:9{3,6}(?:[.,]9*)?0*|99[.,]9+|6999|7999|32767|32768|1(?:\.0*)?e\+?0?5|100000)(?:[.,]0+)?$/i;
/** Beyond this, °C, no air has been at the ground (WMO extremes: −89.2 and 56.7 °C). */
const COLDEST_C = -95;
const WARMEST_C = 65;

/** A text that seems to stand for "no reading", and how often it was seen. */
export interface FoundMark {
  readonly text: string;
  readonly times: number;
}

/**
 * Texts in the columns of readings that seem to stand for "no reading": the usual words, and the usual numbers where
 * they come again and cannot be temperatures.
 */
export function findMarks(columns: readonly (readonly string[])[], decimal: '.' | ','): FoundMark[] {
  const seen = new Map<string, number>();
  for (const cell of columns.filter((cells) => holdsNumbers(cells, decimal)).flat()) {
    if (cell !== '' && (WORDS.test(cell) || isSentinel(cell, decimal)))
      seen.set(cell, (seen.get(cell) ?? 0) + 1);
  }
  return [...seen]
    .map(([text, times]) => ({ text, times }))
    .filter(({ text, times }) => times > 1 || WORDS.test(text))
    .sort((a, b) => b.times - a.times)
    .slice(0, 20);
}

const HALF = 0.5;

/** Columns of words, such as a class by letters, hold no marks. */
const holdsNumbers = (cells: readonly string[], decimal: '.' | ','): boolean => {
  const said = cells.filter((cell) => cell !== '' && !WORDS.test(cell));
  return said.filter((cell) => typeof readNumber(cell, decimal) === 'number').length > HALF * said.length;
};

const isSentinel = (cell: string, decimal: '.' | ','): boolean => {
  if (!NUMBERS.test(cell)) return false;
  const value = readNumber(cell, decimal);
  return typeof value === 'number' && (value < COLDEST_C || value > WARMEST_C);
};
