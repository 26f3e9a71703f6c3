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
 * The separator that cuts most lines into the same number of cells, two at least. Undefined where none does: then the
 * file is no table.
 */
export function findSeparator(sample: FileSample): Cut | undefined {
  const cuts = SEPARATORS.map((separator) => {
    const rows = rowsBy(sample, separator);
    const common = mostFrequent(rows.map(({ cells }) => cells.length));
    return { separator, rows, cells: common?.value ?? 0, share: common?.share ?? 0 };
  }).filter(({ cells, share }) => cells >= 2 && share >= ENOUGH);
  return cuts.find(({ share }) => share >= CLEAR) ?? cuts.sort((a, b) => b.share - a.share)[0];
}
