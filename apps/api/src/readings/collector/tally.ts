import { quoted } from '../../common/quoted';
import type { Counts } from '../importing/origin';

/** What a collection gave so far. */
export type Tally = { -readonly [count in keyof Counts]: number } & {
  /** Files whose last line waits for its end. */
  unfinished: number;
  /** Columns that no sensor of the tower has. */
  readonly ignored: Set<string>;
};

const MOST_NAMED = 5;

/** Before anything was read. */
export const emptyTally = (): Tally => ({
  new: 0,
  repeated: 0,
  corrected: 0,
  refused: 0,
  unfinished: 0,
  ignored: new Set(),
});

/** A tally with what a further part gave. */
export const addTo = (tally: Tally, counts: Counts): void => {
  for (const key of ['new', 'repeated', 'corrected', 'refused'] as const) tally[key] += counts[key];
};

const counted = (n: number, one: string, many: string): string =>
  `${n.toLocaleString('en')} ${n === 1 ? one : many}`;

function ignoredWords(names: readonly string[]): string {
  if (names.length === 0) return '';
  const more = names.length > MOST_NAMED ? ` and ${names.length - MOST_NAMED} more` : '';
  return ` No sensor has the ${names.length === 1 ? 'column' : 'columns'} ${names.slice(0, MOST_NAMED).map(quoted).join(', ')}${more}.`;
}

/** What a collection gave, in one sentence: "12 new readings, 2 corrected, 1 row refused." */
export function tallyWords(tally: Tally): string {
  const { corrected, repeated, refused, unfinished } = tally;
  const parts = [
    tally.new > 0 && counted(tally.new, 'new reading', 'new readings'),
    corrected > 0 && `${corrected.toLocaleString('en')} corrected`,
    repeated > 0 && `${repeated.toLocaleString('en')} known already`,
    refused > 0 && counted(refused, 'row refused', 'rows refused'),
    unfinished > 0 && counted(unfinished, 'unfinished line waits', 'unfinished lines wait'),
  ].filter((part) => part !== false);
  if (tally.new === 0 && corrected === 0) parts.unshift('nothing new');
  const words = parts.join(', ');
  return `${words.charAt(0).toUpperCase()}${words.slice(1)}.${ignoredWords([...tally.ignored])}`;
}
