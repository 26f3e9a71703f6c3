import { Injectable } from '@nestjs/common';
import { UnitOfWork } from '../../database/unit-of-work';
import type { Source } from '../../towers/models/source.model';
import { SourcePositions } from '../../towers/source-positions';
import { CsvReader, type ReadingContext } from '../parse/csv-reader';
import { ImportRunner } from '../importing/import-runner';
import { LineCutter } from '../importing/lines';
import { decodeText } from '../parse/decode-text';
import { HeaderError, type ParsedReadings } from '../parse/parsed-readings';
import { linesOf } from '../parse/records';
import type { RefusedRow } from '../refusal';
import { ReadingsService } from '../readings.service';
import { newLines, type NewLines, type ReadingOn } from './new-lines';
import { addTo, type Tally } from './tally';
import { WholeFile } from './whole-file';

/** A file to be read on. */
export interface FileToTake extends Omit<ReadingOn, 'headerRow'> {
  readonly source: Source;
  readonly origin: 'folder' | 'http';
  /** Where the bytes are. */
  readonly file: string;
  /** What it is known by from one collection to the next. */
  readonly knownAs: string;
  /** What people know it by. */
  readonly name: string;
}

/** So many rows are kept in one transaction with how far the file is read. */
const AT_ONCE_ROWS = 5_000;

/** Takes in what a source's file has gained since it was last read. */
@Injectable()
export class FileTaker {
  constructor(
    private readonly positions: SourcePositions,
    private readonly readings: ReadingsService,
    private readonly imports: ImportRunner,
    private readonly work: UnitOfWork,
  ) {}

  /** Reads a file on to its end and adds what that gave to the tally. */
  async take(given: FileToTake, context: ReadingContext, tally: Tally): Promise<void> {
    const { source, file, knownAs } = given;
    const on = { ...given, headerRow: context.mapping.headerRow };
    for (;;) {
      const found = await newLines(file, await this.positions.of(source.id, knownAs), on);
      if (found.anew && found.more) return this.takeWhole(given, on, found.after.header, context, tally);
      if (found.lines.length > 0) await this.takeLines(given, found, read(found, context), tally);
      if (found.unfinished) tally.unfinished += 1;
      if (!found.more) return;
    }
  }

  /** A large file that is not known yet is one import, of which little is held at a time. */
  private async takeWhole(
    { source, origin, file, knownAs, name }: FileToTake,
    on: ReadingOn,
    header: string,
    context: ReadingContext,
    tally: Tally,
  ): Promise<void> {
    const whole = new WholeFile(file, on);
    const from = { origin, name, sourceId: source.id };
    const imported = await this.imports.run({
      towerId: source.towerId,
      origin: from,
      context,
      bytes: whole.bytes(),
    });
    addTo(tally, imported);
    for (const column of imported.ignoredColumns) tally.ignored.add(column);
    if (whole.unfinished) tally.unfinished += 1;
    await this.positions.keep(source, knownAs, await whole.after(header));
  }

  private async takeLines(
    { source, origin, knownAs, name }: FileToTake,
    { after }: NewLines,
    { rows, refused, ignoredColumns }: ParsedReadings,
    tally: Tally,
  ): Promise<void> {
    for (const column of ignoredColumns) tally.ignored.add(column);
    const keep = async (): Promise<void> => {
      if (rows.length + refused.length > 0) {
        const from = { origin, name, refused, sourceId: source.id };
        addTo(tally, await this.readings.ingest(source.towerId, rows, from));
      }
      await this.positions.keep(source, knownAs, after);
    };
    await (rows.length <= AT_ONCE_ROWS ? this.work.run(keep, 'bulk') : keep());
  }
}

/**
 * New lines as readings; the header is read again before them, so that they mean what they did. A line that is no text
 * is refused alone.
 */
function read({ header, lines, firstRowNo }: NewLines, context: ReadingContext): ParsedReadings {
  const [reader, cutter] = [new CsvReader(context), new LineCutter(firstRowNo)];
  if (header !== '') reader.readLines(linesOf(decodeText(Buffer.from(header))), 1);
  const refused: RefusedRow[] = [];
  for (const cut of [cutter.push(lines), cutter.end()]) {
    reader.readLines(cut.lines, cut.firstRowNo);
    refused.push(...cut.refused);
  }
  if (!reader.hasHeader) throw new HeaderError('The file has no header line; send the column names first.');
  const taken = reader.take();
  return { ...taken, refused: [...refused, ...taken.refused] };
}
