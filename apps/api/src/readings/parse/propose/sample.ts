import { recordsOf } from '../records';

/** Lines of a file to look at: its beginning, and some of its middle and end. */
export interface FileSample {
  /** The first lines; the first is row 1. */
  readonly head: readonly string[];
  /** Whole lines of further places of the file, each place in the file's order. */
  readonly further: readonly (readonly string[])[];
}

/** A line cut into its cells, each trimmed; `rowNo` is 0 where the row is not known. */
export interface SampleRow {
  readonly rowNo: number;
  readonly cells: readonly string[];
}

const trimmed = (cells: readonly string[]): string[] => cells.map((cell) => cell.trim());

/** The sample's rows as one separator cuts them; lines whose quotation marks do not match are left out. */
export function rowsBy({ head, further }: FileSample, separator: string): SampleRow[] {
  const first = recordsOf(head, 1, separator, []).map(({ rowNo, cells }) => ({
    rowNo,
    cells: trimmed(cells),
  }));
  const rest = further
    .flatMap((lines) => recordsOf(lines, 1, separator, []))
    .map(({ cells }) => ({ rowNo: 0, cells: trimmed(cells) }));
  return [...first, ...rest];
}

/** What occurs most often, and in which share of all; undefined for nothing. */
export function mostFrequent<T>(values: readonly T[]): { value: T; share: number } | undefined {
  const counts = new Map<T, number>();
  for (const value of values) counts.set(value, (counts.get(value) ?? 0) + 1);
  let best: { value: T; share: number } | undefined;
  for (const [value, count] of counts) {
    if (!best || count / values.length > best.share) best = { value, share: count / values.length };
  }
  return best;
}
