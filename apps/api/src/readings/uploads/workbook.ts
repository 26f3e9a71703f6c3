import { createWriteStream } from 'node:fs';
import path from 'node:path';
import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import type { Row } from 'exceljs';
import { NotTextError } from '../parse/decode-text';
import { openArchive } from './archive-size';
import { cellText, isFormula } from './cell-text';
import { sheetsOf } from './workbook-parts';

/** A sheet as it was written out. */
export interface WrittenSheet {
  readonly name: string;
  readonly isHidden: boolean;
  /** Rows up to the last that holds anything. */
  readonly rows: number;
  /** Cells that are formulas, whose last result was taken. */
  readonly formulas: number;
  /** Name of its file of text. */
  readonly file: string;
}

const MOST_SHEETS = 50;
const MOST_COLUMNS = 2_001;
/** Rows of a sheet at most (ECMA-376). */
const MOST_ROWS = 1_048_576;

const DAMAGED =
  'The spreadsheet cannot be read: it is damaged, protected by a password, or of another kind. ' +
  'Open it, save it as .xlsx or as CSV, and send it again.';

const quotedCell = (text: string): string => {
  const line = text.replace(/[\r\n]+/g, ' ');
  return /[",]/.test(line) ? `"${line.replaceAll('"', '""')}"` : line;
};

/** Writes one sheet, a line for each of its rows, so that row numbers are the sheet's own. */
async function writeSheet(
  sheet: AsyncIterable<Row>,
  file: string,
): Promise<{ rows: number; formulas: number }> {
  const out = createWriteStream(file);
  let [rows, formulas] = [0, 0];
  try {
    for await (const row of sheet) {
      if (!(row.number > rows && row.number <= MOST_ROWS)) throw new NotTextError(DAMAGED);
      const cells = Array.from({ length: Math.min(row.cellCount, MOST_COLUMNS) }, (_, i) =>
        row.getCell(i + 1),
      );
      formulas += cells.filter(({ value }) => isFormula(value)).length;
      const line = cells.map((cell) => quotedCell(cellText(cell))).join(',');
      if (!out.write(`${'\n'.repeat(row.number - rows - 1)}${line}\n`)) await once(out, 'drain');
      rows = row.number;
    }
  } finally {
    out.end();
    await finished(out);
  }
  return { rows, formulas };
}

/**
 * Writes the sheets of a workbook as files of comma-separated text into a folder. Dates become what the clock shows,
 * formulas their last result. The workbook is read as a stream, sheet by sheet.
 *
 * @throws NotTextError where the file is no such workbook, is damaged, or unpacks beyond all measure.
 */
export async function writeSheets(workbook: string, folder: string): Promise<WrittenSheet[]> {
  const archive = await openArchive(workbook);
  const sheets: WrittenSheet[] = [];
  try {
    for await (const { name, isHidden, rows } of sheetsOf(archive)) {
      const file = `${sheets.length}.csv`;
      sheets.push({ name, isHidden, ...(await writeSheet(rows, path.join(folder, file))), file });
      if (sheets.length >= MOST_SHEETS) break;
    }
  } catch (error) {
    if (error instanceof NotTextError || (error as NodeJS.ErrnoException).syscall !== undefined) throw error;
    throw new NotTextError(DAMAGED);
  }
  if (sheets.length > 0) return sheets;
  throw new NotTextError(
    'The workbook holds no sheet with cells. Send a spreadsheet (.xlsx) or a file of text.',
  );
}
