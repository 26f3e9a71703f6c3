import { TextDecoder } from 'node:util';
import { Readable } from 'node:stream';
import { stat } from 'node:fs/promises';
import { Injectable } from '@nestjs/common';
import { linesOf } from '../parse/records';
import { HeaderError } from '../parse/parsed-readings';
import type { FileSample } from '../parse/propose/sample';
import { decoderOf, encodingOf, type Encoding } from './encoding';
import type { StoredUpload } from './upload-rows';
import { UploadFiles } from './upload-files';
import { WorkbookTexts, type Sheet } from './workbook-texts';

/** What an upload's text looks like, and where it lies. */
export interface UploadedText {
  readonly path: string;
  readonly bytes: number;
  readonly encoding: Encoding;
  readonly sample: FileSample;
  /** Whether the sample is the whole file. */
  readonly isWhole: boolean;
  /** Workbooks only. */
  readonly sheets?: readonly Sheet[];
  readonly sheet?: string;
}

/** The beginning of the file that is looked at, and each further place, bytes. */
const HEAD_BYTES = 300_000;
const PLACE_BYTES = 60_000;
/** A header may be wide, a line of readings is not: what is no line within this is no table. */
const LONGEST_LINE = 200_000;

const inner = (lines: string[]): string[] => lines.slice(1, -1);

/** The text of uploaded files: of a workbook the sheet that is asked for, otherwise the file itself. */
@Injectable()
export class UploadTexts {
  constructor(
    private readonly files: UploadFiles,
    private readonly workbooks: WorkbookTexts,
  ) {}

  /**
   * Looks at an upload's text.
   *
   * @throws HeaderError, NotTextError where it is none; Problem `not-found` where the file is gone.
   */
  async look(upload: StoredUpload, sheetWanted?: string): Promise<UploadedText> {
    if (upload.kind === 'text') return this.lookAt(this.files.pathOf(upload.id));
    const sheets = await this.workbooks.sheetsOf(upload.id);
    const sheet = this.workbooks.choose(sheets, sheetWanted);
    return { ...(await this.lookAt(sheet.path)), sheets, sheet: sheet.name };
  }

  /** The whole text as UTF-8 bytes, piece by piece. */
  bytes({ path, encoding }: UploadedText, pieceBytes = 1_000_000): AsyncIterable<Buffer> {
    const file = this.files.stream(path, pieceBytes);
    const decoder = decoderOf(encoding);
    return decoder ? Readable.from(decoded(file, decoder)) : file;
  }

  private async lookAt(path: string): Promise<UploadedText> {
    const { size } = await stat(path);
    const head = await this.files.slice(path, 0, HEAD_BYTES);
    const places = size <= HEAD_BYTES ? [] : [size / 2, size - PLACE_BYTES].map(Math.floor);
    const further = await Promise.all(places.map((from) => this.files.slice(path, from, PLACE_BYTES)));
    const encoding = encodingOf([head, ...further]);
    const textOf = (bytes: Buffer): string => (decoderOf(encoding) ?? new TextDecoder('utf-8')).decode(bytes);
    const headLines = linesOf(textOf(head));
    if (headLines[0]!.length > LONGEST_LINE) {
      throw new HeaderError('The first line is longer than any table has. Check the line ends of the file.');
    }
    if (size > HEAD_BYTES) headLines.pop();
    return {
      ...{ path, bytes: size, encoding, isWhole: size <= HEAD_BYTES },
      sample: { head: headLines, further: further.map((bytes) => inner(linesOf(textOf(bytes)))) },
    };
  }
}

async function* decoded(pieces: AsyncIterable<Buffer>, decoder: TextDecoder): AsyncGenerator<Buffer> {
  for await (const piece of pieces) yield Buffer.from(decoder.decode(piece, { stream: true }));
  yield Buffer.from(decoder.decode());
}
