import { mostFrequent, rowsBy, type FileSample, type SampleRow } from './sample';

/** How the lines of a file are cut into cells. */
export interface Cut {
  readonly separator: string;
  /** Cells of most lines. */
  readonly cells: number;
  readonly rows: readonly SampleRow[];
}

/** In the order of preference: a comma may also be a decimal mark, and blanks stand within stamps and names. */
const SEPARATORS = [';', '\t', '|', ',', 'blank'];
const CLEAR = 0.9;
const ENOUGH = 0.5;

/**
 * The separators that cut most lines into the same number of cells, two at least, the likeliest first. None: the file is
 * no table. Which one is right is seen by where a time can be read.
 */
export function findCuts(sample: FileSample): Cut[] {
  const cuts = SEPARATORS.map((separator) => {
    const rows = rowsBy(sample, separator);
    const common = mostFrequent(rows.map(({ cells }) => cells.length));
    return { separator, rows, cells: common?.value ?? 0, share: common?.share ?? 0 };
  }).filter(({ cells, share }) => cells >= 2 && share >= ENOUGH);
  return cuts.sort((a, b) => Number(b.share >= CLEAR) - Number(a.share >= CLEAR));
}
