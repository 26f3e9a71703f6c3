import { readNumber } from '../number-cell';

/** Texts that loggers commonly write for "no reading" (common practice). */
const WORDS = /^(?:nan|na|n\/a|#n\/a|null|none|nil|missing|m|-+|\/+|\*+|\?+|x+|bad|err(?:or)?|invalid)$/i;
/** Numbers that loggers commonly write for "no reading" (common practice). */
const NUMBERS =
  /^[+-]?(?:9{3,6}(?:[.,]9*)?0*|99(?:[.,]9+)?|888+|777+|6999|7999|32767|32768|273[.,]15|1(?:\.0*)?e\+?0?5|100000)(?:[.,]0+)?$/i;
/** A text that seems to stand for "no reading", and how often it was seen. */
export interface FoundMark {
  readonly text: string;
  readonly times: number;
}

/**
 * Texts in the columns of readings that seem to stand for "no reading": the usual words, and the usual numbers where
 * they come again far from all that the column else holds. A number that could be a reading in another column is left:
 * 999 is a direction that no vane shows, and a pressure that any barometer does.
 */
export function findMarks(columns: readonly (readonly string[])[], decimal: '.' | ','): FoundMark[] {
  const numeric = columns.filter((cells) => holdsNumbers(cells, decimal));
  const spans = numeric.map((cells) => spanOf(cells, decimal));
  const seen = new Map<string, number>();
  numeric.forEach((cells, i) => {
    for (const cell of cells.filter((each) => WORDS.test(each) || isFar(each, spans[i]!, decimal)))
      seen.set(cell, (seen.get(cell) ?? 0) + 1);
  });
  return [...seen]
    .map(([text, times]) => ({ text, times }))
    .filter(({ text, times }) => WORDS.test(text) || times > 1)
    .filter(({ text }) => WORDS.test(text) || !spans.some((span) => isWithin(text, span, decimal)))
    .sort((a, b) => b.times - a.times)
    .slice(0, MOST_MARKS);
}

const MOST_MARKS = 18;
const HALF = 0.5;

interface Span {
  readonly low: number;
  readonly high: number;
}

/** Columns of words, such as a class by letters, hold no marks. */
const holdsNumbers = (cells: readonly string[], decimal: '.' | ','): boolean => {
  const said = cells.filter((cell) => cell !== '' && !WORDS.test(cell));
  return said.filter((cell) => typeof readNumber(cell, decimal) === 'number').length > HALF * said.length;
};

/** What a column holds besides numbers that could be marks. */
const spanOf = (cells: readonly string[], decimal: '.' | ','): Span => {
  const values = cells
    .filter((cell) => cell !== '' && !NUMBERS.test(cell))
    .map((cell) => readNumber(cell, decimal))
    .filter((value): value is number => typeof value === 'number')
    .sort((a, b) => a - b);
  return {
    low: values[Math.floor(values.length * 0.01)] ?? 0,
    high: values.at(-1 - Math.floor(values.length * 0.01)) ?? 0,
  };
};

/** So much farther than the column's own width lies a mark. */
const FAR = 1.5;
const LEAST_WIDTH = 10;

const isFar = (cell: string, { low, high }: Span, decimal: '.' | ','): boolean => {
  const value = NUMBERS.test(cell) ? readNumber(cell, decimal) : undefined;
  if (typeof value !== 'number') return false;
  const width = FAR * Math.max(high - low, LEAST_WIDTH);
  return value < low - width || value > high + width;
};

const isWithin = (cell: string, { low, high }: Span, decimal: '.' | ','): boolean => {
  const value = readNumber(cell, decimal);
  return typeof value === 'number' && value >= low - LEAST_WIDTH && value <= high + LEAST_WIDTH;
};
