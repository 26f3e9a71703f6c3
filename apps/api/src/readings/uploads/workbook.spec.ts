import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import ExcelJS from 'exceljs';
import JSZip from 'jszip';
import { writeSheets, type WrittenSheet } from './workbook';

const SHEET = 'xl/worksheets/sheet1.xml';
const begun = new Date(Date.UTC(2026, 0, 9, 22, 0));

/** A workbook as a spreadsheet program writes it. */
const workbook = async (): Promise<JSZip> => {
  const book = new ExcelJS.Workbook();
  book.addWorksheet('notes', { state: 'hidden' }).addRow(['nothing']);
  const sheet = book.addWorksheet('Readings');
  sheet.addRow(['day', 'clock', 'at', 'T 2 m']);
  const formats = ['yyyy-mm-dd', 'hh:mm', 'yyyy-mm-dd hh:mm', '0.0\\ \\m'];
  [-6.5, -7.25].forEach((value, i) => {
    const at = new Date(begun.getTime() + i * 600_000);
    const clock = new Date(Date.UTC(1899, 11, 30, 22, i * 10));
    const row = sheet.addRow([new Date(Date.UTC(2026, 0, 9)), clock, at, value]);
    formats.forEach((format, column) => (row.getCell(column + 1).numFmt = format));
  });
  const worked = sheet.addRow([null, null, { formula: 'C3+1/144', result: 46031.930555555555 }, 1]);
  worked.getCell(3).numFmt = 'yyyy-mm-dd hh:mm';
  return JSZip.loadAsync(Buffer.from(await book.xlsx.writeBuffer()));
};

describe('the sheets of a workbook', () => {
  let folder: string;
  beforeAll(async () => {
    folder = await mkdtemp(path.join(tmpdir(), 'lidwatch-book-'));
  });
  afterAll(() => rm(folder, { recursive: true }));

  const write = async (zip: JSZip): Promise<WrittenSheet[]> => {
    const file = path.join(folder, 'a.xlsx');
    await writeFile(file, await zip.generateAsync({ type: 'nodebuffer', compression: 'DEFLATE' }));
    return writeSheets(file, folder);
  };
  const lines = async ({ file }: WrittenSheet): Promise<string[]> =>
    (await readFile(path.join(folder, file), 'utf8')).split('\n');

  it.each([
    ['as it came', (names: string[]) => names],
    ['backwards, sheets before what they need', (names: string[]) => [...names].reverse()],
  ])('are read whatever the order of the parts: %s', async (_, order) => {
    const [from, to] = [await workbook(), new JSZip()];
    for (const name of order(Object.keys(from.files).filter((each) => !from.files[each]!.dir)))
      to.file(name, await from.file(name)!.async('nodebuffer'));
    const sheets = await write(to);
    expect(sheets.map(({ name, isHidden, formulas }) => [name, isHidden, formulas])).toEqual([
      ['notes', true, 0],
      ['Readings', false, 1],
    ]);
    expect(await lines(sheets[1]!)).toEqual([
      'day,clock,at,T 2 m',
      '2026-01-09 00:00:00,22:00:00,2026-01-09 22:00:00,-6.5',
      '2026-01-09 00:00:00,22:10:00,2026-01-09 22:10:00,-7.25',
      ',,2026-01-09 22:20:00,1',
      '',
    ]);
  });

  const sheetOf = (rows: string): string =>
    `<?xml version="1.0"?><worksheet xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><sheetData>${rows}</sheetData></worksheet>`;

  it.each<[string, string, string, RegExp]>([
    ['a row beyond the last', SHEET, sheetOf('<row r="900000000"><c r="A1"><v>1</v></c></row>'), /damaged/],
    ['rows that go back', SHEET, sheetOf('<row r="2"/><row r="1"/>'), /damaged/],
    ['a column beyond the last', SHEET, sheetOf('<row r="1"><c r="ZZZZ1"><v>1</v></c></row>'), /damaged/],
    ['a sheet cut off', SHEET, '<worksheet><sheetData><row', /./],
    ['no book', 'xl/workbook.xml', '', /./],
  ])('are refused with the cure, or hold nothing: %s', async (_, name, content, words) => {
    const zip = await workbook();
    zip.file(name, content);
    const outcome = await write(zip).then(
      (sheets) => `rows ${sheets.map(({ rows }) => rows).join()}`,
      (error: Error) => `${error.name}: ${error.message}`,
    );
    expect(outcome).toMatch(words);
    expect(outcome).toMatch(/^(NotTextError|rows)/);
  });
});
