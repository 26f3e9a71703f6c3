import { parse, type CsvError } from 'csv-parse/sync';
import { refusedRow, type RefusedRow } from '../refusal';

/** One line of a file as its cells. */
export interface CsvRecord {
  readonly rowNo: number;
  readonly cells: readonly string[];
  readonly raw: string;
}

/** Lines longer than this are refused unread: no logger writes them. */
const LONGEST_LINE = 1_000_000;

const options = (separator: string) => ({
  delimiter: separator === 'blank' ? [' ', '\t'] : separator,
  relax_column_count: true,
  skip_empty_lines: false,
  ignore_last_delimiters: false,
});

/** Without a quotation mark a line is its cells between separators: by far the most, and cut at a tenth of the cost. */
const plainCells = (text: string, separator: string): string[][] =>
  text.split('\n').map((line) => line.split(separator));

const cellsOf = (text: string, separator: string): string[][] => {
  if (separator !== 'blank' && !text.includes('"')) return plainCells(text, separator);
  const rows: string[][] = parse(text, options(separator));
  return separator === 'blank' ? rows.map((row) => row.filter((cell) => cell !== '')) : rows;
};

const refusalOf = (line: string, rowNo: number, error: unknown): RefusedRow => {
  const code = (error as CsvError | undefined)?.code;
  if (!(error instanceof Error) || code === undefined) throw error;
  const why =
    'the quotation marks do not match; quote a whole cell or none of it, and double a mark within it.';
  return refusedRow(rowNo, undefined, { code: 'quotes-do-not-match', why }, line);
};

/**
 * Lines as records. A record is a line: a logger's cell never spans two, so a stray quotation mark spoils its own line
 * only; such lines go to `refused`. Empty lines are passed over but counted, so that row numbers are those of an
 * editor. Where the lines fail together, each is parsed alone, so that one bad line costs only itself.
 */
export function recordsOf(
  lines: readonly string[],
  firstRowNo: number,
  separator: string,
  refused: RefusedRow[],
): CsvRecord[] {
  const numbered = lines.map((raw, i) => ({ raw, rowNo: firstRowNo + i }));
  const tooLong = numbered.filter(({ raw }) => raw.length > LONGEST_LINE);
  for (const { raw, rowNo } of tooLong) {
    const why = `the line has ${raw.length} characters; check the line ends and the separator of the file.`;
    refused.push(refusedRow(rowNo, undefined, { code: 'line-too-long', why }, raw));
  }
  const usable = numbered.filter(({ raw }) => raw.trim() !== '' && raw.length <= LONGEST_LINE);
  const whole = wholeBatch(usable.map((l) => l.raw).join('\n'), separator);
  if (whole?.length === usable.length) return usable.map((line, i) => ({ ...line, cells: whole[i]! }));
  return usable.flatMap(({ raw, rowNo }) => {
    try {
      return [{ rowNo, raw, cells: cellsOf(raw, separator)[0] ?? [] }];
    } catch (error) {
      refused.push(refusalOf(raw, rowNo, error));
      return [];
    }
  });
}

const wholeBatch = (text: string, separator: string): string[][] | undefined => {
  try {
    return cellsOf(text, separator);
  } catch (error) {
    if ((error as CsvError).code === undefined) throw error;
    return undefined;
  }
};

/** The lines of a text: LF, CRLF or CR ends one. */
export const linesOf = (text: string): string[] => text.split(/\r\n|\n|\r/);
