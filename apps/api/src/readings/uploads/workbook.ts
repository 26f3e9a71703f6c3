import { createWriteStream } from 'node:fs';
import path from 'node:path';
import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import ExcelJS, { type CellValue } from 'exceljs';
import { NotTextError } from '../parse/decode-text';
import { refuseBombs } from './archive-size';

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
const MOST_COLUMNS = 2_000;
const HALF_SECOND_MS = 500;

/** A date as the clock shows it; spreadsheets keep fractions of days, so it is rounded to the second. */
const wallTime = (date: Date): string =>
  new Date(date.getTime() + HALF_SECOND_MS).toISOString().slice(0, 19).replace('T', ' ');

/** What a cell shows as text; a formula without a result is left as its formula, which no reading is. */
function textOf(value: CellValue): string {
  if (value === null || value === undefined) return '';
  if (value instanceof Date) return Number.isNaN(value.getTime()) ? '' : wallTime(value);
  if (typeof value !== 'object') return String(value);
  if ('richText' in value) return value.richText.map(({ text }) => text).join('');
  if ('error' in value) return value.error;
  if ('hyperlink' in value) return String(value.text);
  const { result } = value;
  return result === undefined ? `=${'formula' in value ? value.formula : ''}` : textOf(result);
}

const isFormula = (value: CellValue): boolean =>
  typeof value === 'object' && value !== null && ('formula' in value || 'sharedFormula' in value);

const quotedCell = (text: string): string => {
  const line = text.replace(/[\r\n]+/g, ' ');
  return /[",]/.test(line) ? `"${line.replaceAll('"', '""')}"` : line;
};

/** Writes one sheet, a line for each of its rows, so that row numbers are the sheet's own. */
async function writeSheet(
  sheet: AsyncIterable<ExcelJS.Row>,
  file: string,
): Promise<{ rows: number; formulas: number }> {
  const out = createWriteStream(file);
  let [rows, formulas] = [0, 0];
  for await (const row of sheet) {
    const values = (Array.isArray(row.values) ? row.values.slice(1, MOST_COLUMNS + 2) : []) as CellValue[];
    formulas += values.filter(isFormula).length;
    const line = Array.from(values, (value) => quotedCell(textOf(value))).join(',');
    const gap = '\n'.repeat(Math.max(0, row.number - rows - 1));
    rows = Math.max(row.number, rows + 1);
    if (!out.write(`${gap}${line}\n`)) await once(out, 'drain');
  }
  out.end();
  await finished(out);
  return { rows, formulas };
}

/**
 * Writes the sheets of a workbook (Office Open XML, ECMA-376) as files of comma-separated text into a folder. Dates
 * become what the clock shows, formulas their last result. The workbook is read as a stream, sheet by sheet.
 *
 * @throws NotTextError where the file is no such workbook, is damaged, or inflates beyond all measure.
 */
export async function writeSheets(workbook: string, folder: string): Promise<WrittenSheet[]> {
  await refuseBombs(workbook);
  const sheets: WrittenSheet[] = [];
  try {
    const reader = new ExcelJS.stream.xlsx.WorkbookReader(workbook, {
      ...{
        worksheets: 'emit',
        sharedStrings: 'cache',
        styles: 'cache',
        hyperlinks: 'ignore',
        entries: 'ignore',
      },
    });
    for await (const sheet of reader) {
      const { name, state } = sheet as unknown as { name?: string; state?: string };
      const file = `${sheets.length}.csv`;
      const written = await writeSheet(sheet, path.join(folder, file));
      const isHidden = state !== undefined && state !== 'visible';
      sheets.push({ name: name ?? `Sheet ${sheets.length + 1}`, isHidden, ...written, file });
      if (sheets.length >= MOST_SHEETS) break;
    }
  } catch (error) {
    if (error instanceof NotTextError || (error as NodeJS.ErrnoException).syscall !== undefined) throw error;
    throw new NotTextError(
      'The spreadsheet cannot be read: it is damaged, protected by a password, or of another kind. ' +
        'Open it, save it as .xlsx or as CSV, and send it again.',
    );
  }
  if (sheets.length > 0) return sheets;
  throw new NotTextError('The archive holds no sheet. Send a spreadsheet (.xlsx) or a file of text.');
}
