import { longHeader, wideHeader, type LongHeader, type WideHeader } from './header';
import type { Mapping } from './mapping';
import { readNumber } from './number-cell';
import type { ParsedReadings } from './parsed-readings';
import { recordsOf, type CsvRecord } from './records';
import { quoted } from '../../common/quoted';
import { refusedRow, type Refusal } from '../refusal';
import { intervalEnd, type TimeKeeping } from '../../towers/time-keeping/interval-end';

/** What a text of readings is read against: its layout, the tower's sensors by name, its clock, and now. */
export interface ReadingContext {
  readonly mapping: Mapping;
  readonly sensorIds: ReadonlyMap<string, number>;
  readonly time: TimeKeeping;
  readonly nowS: number;
}

const cellsDoNotMatch = (found: number, expected: number): Refusal => ({
  code: 'cells-do-not-match-header',
  why: `it has ${found} cells where the header has ${expected}; send the whole line again.`,
});

/**
 * Reads lines of readings, wide or long, in as many calls as they come in, the header line first. Bad cells and bad
 * rows are refused one by one, the rest is taken; a header that cannot be used throws a `HeaderError`. The header
 * written again, as loggers do when they start anew, is passed over.
 */
export class CsvReader {
  private result: ParsedReadings = { rows: [], refused: [], ignoredColumns: [] };
  private wide?: WideHeader;
  private long?: LongHeader;
  private headerRaw?: string;
  private readonly noReading: ReadonlySet<string>;

  constructor(private readonly given: ReadingContext) {
    this.noReading = new Set(['', ...given.mapping.missing.map((mark) => mark.trim())]);
  }

  /** Whether the header line has come. */
  get hasHeader(): boolean {
    return this.wide !== undefined || this.long !== undefined;
  }

  /** Reads whole lines without their line ends; the first of them is row `firstRowNo` of the file. */
  readLines(lines: readonly string[], firstRowNo: number): void {
    const { separator } = this.given.mapping;
    for (const record of recordsOf(lines, firstRowNo, separator, this.result.refused)) {
      if (this.hasHeader) this.read(record);
      else this.readHeader(record);
    }
  }

  /** What was read since it was last taken. */
  take(): ParsedReadings {
    const taken = this.result;
    this.result = { rows: [], refused: [], ignoredColumns: [] };
    return taken;
  }

  private readHeader({ cells, raw }: CsvRecord): void {
    this.headerRaw = raw;
    if (this.given.mapping.format === 'wide') {
      this.wide = wideHeader(cells, this.given.mapping, this.given.sensorIds);
    } else this.long = longHeader(cells, this.given.mapping);
    this.result.ignoredColumns.push(...(this.wide ?? this.long)!.ignored);
  }

  private read(record: CsvRecord): void {
    const header = (this.wide ?? this.long)!;
    if (record.raw === this.headerRaw) return;
    if (record.cells.length !== header.cells) {
      this.refuse(record, undefined, cellsDoNotMatch(record.cells.length, header.cells));
      return;
    }
    const tEnd = intervalEnd(record.cells[header.time]!, this.given.time, this.given.nowS);
    if (typeof tEnd !== 'number') this.refuse(record, this.given.mapping.timeColumn, tEnd);
    else if (this.wide) this.readWide(record, this.wide, tEnd);
    else this.readLong(record, this.long!, tEnd);
  }

  private readWide(record: CsvRecord, header: WideHeader, tEnd: number): void {
    for (const { index, column, sensorId } of header.sensors) {
      this.takeCell(record, column, sensorId, tEnd, record.cells[index]!);
    }
  }

  private readLong(record: CsvRecord, header: LongHeader, tEnd: number): void {
    const { mapping, sensorIds } = this.given;
    const named = record.cells[header.sensor]!.trim();
    const sensorId = sensorIds.get(mapping.columns[named] ?? named);
    if (sensorId !== undefined) {
      this.takeCell(record, mapping.valueColumn, sensorId, tEnd, record.cells[header.value]!);
      return;
    }
    const why = `this tower has no sensor ${quoted(named)}; correct the name, map it, or add the sensor first.`;
    this.refuse(record, mapping.sensorColumn, { code: 'sensor-not-known', why });
  }

  private takeCell(record: CsvRecord, column: string, sensorId: number, tEnd: number, cell: string): void {
    if (this.noReading.has(cell.trim())) return;
    const value = readNumber(cell, this.given.mapping.decimal);
    if (typeof value !== 'number') this.refuse(record, column, value);
    else this.result.rows.push({ sensorId, tEnd, value, rowNo: record.rowNo });
  }

  private refuse(record: CsvRecord, column: string | undefined, refusal: Refusal): void {
    this.result.refused.push(refusedRow(record.rowNo, column, refusal, record.raw));
  }
}
