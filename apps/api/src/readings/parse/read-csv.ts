import { CsvReader, type ReadingContext } from './csv-reader';
import { HeaderError, type ParsedReadings } from './parsed-readings';
import { linesOf } from './records';

export type { ReadingContext } from './csv-reader';

/** Lines parsed at a time, so that a large file does not hold up other requests. */
const LINES_AT_A_TIME = 2_000;

const pause = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

/**
 * Reads a CSV text of readings, wide or long, its header line first; `headerRowNo` is the row number the header counts
 * as. Bad cells and bad rows are refused one by one, the rest is taken; a header that cannot be used throws a
 * `HeaderError`. Gives way to other work between batches of lines.
 */
export async function readCsv(text: string, given: ReadingContext, headerRowNo = 1): Promise<ParsedReadings> {
  const reader = new CsvReader(given);
  const lines = linesOf(text);
  for (let at = 0; at < lines.length; at += LINES_AT_A_TIME) {
    reader.readLines(lines.slice(at, at + LINES_AT_A_TIME), headerRowNo + at);
    await pause();
  }
  if (!reader.hasHeader) throw new HeaderError('The file has no header line; send the column names first.');
  return reader.take();
}
