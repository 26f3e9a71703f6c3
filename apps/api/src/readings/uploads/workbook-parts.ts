import { StringDecoder } from 'node:string_decoder';
import path from 'node:path';
import ExcelJS from 'exceljs';
import type { CentralDirectory } from 'unzipper';
import { NotTextError } from '../parse/decode-text';

/** A sheet of a workbook, its rows still to be read. */
export interface SheetToRead {
  readonly name: string;
  readonly isHidden: boolean;
  readonly rows: AsyncIterable<ExcelJS.Row>;
}

type Pieces = AsyncIterable<string>;
interface SheetEntry {
  readonly name: string;
  readonly rId: string;
  readonly state?: string;
}

/** The steps of the library's reader. Each stands in the archive where its writer put it, so each is asked for by name. */
interface Steps {
  workbookRels?: readonly { Id: string; Target: string }[];
  model?: { sheets?: readonly SheetEntry[] };
  _parseRels(entry: NodeJS.ReadableStream): Promise<void>;
  _parseWorkbook(entry: NodeJS.ReadableStream): Promise<void>;
  _parseStyles(entry: NodeJS.ReadableStream): Promise<void>;
  _parseSharedStrings(entry: NodeJS.ReadableStream): AsyncIterable<unknown>;
  _parseWorksheet(pieces: Pieces, no: string): Iterable<{ value: AsyncIterable<ExcelJS.Row> }>;
}

/** Text of an entry piece by piece; a character is never cut in two. */
async function* textOf(entry: AsyncIterable<Buffer>): Pieces {
  const decoder = new StringDecoder('utf8');
  for await (const piece of entry) yield decoder.write(piece);
  yield decoder.end();
}

/**
 * The sheets of a workbook in its order (Office Open XML, ECMA-376), one after the other. Writers order the parts of the
 * archive as they like; here names, styles and texts are read before any sheet, so that dates are known as dates and
 * hidden sheets as hidden.
 *
 * @throws NotTextError where it holds no workbook.
 */
export async function* sheetsOf({ files }: CentralDirectory): AsyncGenerator<SheetToRead> {
  const entry = (name: string) => files.find((file) => file.path === name.replace(/^\//, ''));
  const book = entry('xl/workbook.xml');
  const rels = entry('xl/_rels/workbook.xml.rels');
  if (!book || !rels) {
    throw new NotTextError('The archive holds no workbook. Send a spreadsheet (.xlsx) or a file of text.');
  }
  const reader = new ExcelJS.stream.xlsx.WorkbookReader('', {
    ...{
      worksheets: 'emit',
      sharedStrings: 'cache',
      styles: 'cache',
      hyperlinks: 'ignore',
      entries: 'ignore',
    },
  }) as unknown as Steps;
  await reader._parseRels(rels.stream());
  await reader._parseWorkbook(book.stream());
  const styles = entry('xl/styles.xml');
  if (styles) await reader._parseStyles(styles.stream());
  const texts = entry('xl/sharedStrings.xml');
  if (texts) for await (const _ of reader._parseSharedStrings(texts.stream())) continue;
  for (const { name, rId, state } of reader.model?.sheets ?? []) {
    const target = reader.workbookRels?.find(({ Id }) => Id === rId)?.Target ?? '';
    const sheet = entry(target.startsWith('/') ? target : path.posix.join('xl', target));
    if (!sheet || !/worksheets\//.test(sheet.path)) continue;
    const [read] = reader._parseWorksheet(textOf(sheet.stream()), rId);
    yield { name, isHidden: state !== undefined && state !== 'visible', rows: read!.value };
  }
}
