import { longHeader, wideHeader, type LongHeader, type WideHeader } from './header';
import { sensorNameOf, type Mapping } from './mapping';
import { readNumber } from './number-cell';
import type { ParsedReadings } from './parsed-readings';
import { recordsOf, type CsvRecord } from './records';
import { quoted } from '../../common/quoted';
import { refusedRow, type Refusal } from '../refusal';
import type { TimeKeeping } from '../../towers/time-keeping/interval-end';
import { TimeReader } from '../../towers/time-keeping/time-reader';
import { joinTime } from './join-time';
import { inOwnUnit, type ForeignUnit } from '../../towers/units';

/** What a text of readings is read against: its layout, the tower's sensors by name, its clock, and now. */
export interface ReadingContext {
  readonly mapping: Mapping;
  readonly sensorIds: ReadonlyMap<string, number>;
  readonly time: TimeKeeping;
  readonly nowS: number;
}

interface Place {
  readonly sensorId: number;
  readonly tEnd: number;
  readonly unit: ForeignUnit | undefined;
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
  private readonly times: TimeReader;

  constructor(private readonly given: ReadingContext) {
    this.times = new TimeReader(given.time, given.nowS, given.mapping.format === 'wide');
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
      else this.begin(record);
    }
  }

  /** What was read since it was last taken. */
  take(): ParsedReadings {
    const taken = this.result;
    this.result = { rows: [], refused: [], ignoredColumns: [] };
    return taken;
  }

  /** The header; lines above it are passed over. A file without one has columns by number. */
  private begin(record: CsvRecord): void {
    const { headerRow = 1, firstDataRow = 1 } = this.given.mapping;
    if (headerRow === 0) {
      if (record.rowNo < firstDataRow) return;
      this.useHeader(record.cells.map((_, i) => String(i + 1)));
      this.read(record);
    } else if (record.rowNo >= headerRow) {
      this.headerRaw = record.raw;
      this.useHeader(record.cells);
    }
  }

  private useHeader(cells: readonly string[]): void {
    if (this.given.mapping.format === 'wide') {
      this.wide = wideHeader(cells, this.given.mapping, this.given.sensorIds);
    } else this.long = longHeader(cells, this.given.mapping);
    this.result.ignoredColumns.push(...(this.wide ?? this.long)!.ignored);
  }

  private read(record: CsvRecord): void {
    const header = (this.wide ?? this.long)!;
    if (record.raw === this.headerRaw || record.rowNo < (this.given.mapping.firstDataRow ?? 0)) return;
    if (record.cells.length !== header.cells) {
      this.refuse(record, undefined, cellsDoNotMatch(record.cells.length, header.cells));
      return;
    }
    if (header.leaveOut.some(({ place, values }) => values.has(record.cells[place]!.trim()))) return;
    const tEnd = this.times.read(this.timeOf(record, header.time));
    if (typeof tEnd !== 'number') this.refuse(record, this.timeName, tEnd);
    else if (this.wide) this.readWide(record, this.wide, tEnd);
    else this.readLong(record, this.long!, tEnd);
  }

  private get timeName(): string {
    const { timeColumn, timeColumns } = this.given.mapping;
    return timeColumns?.map(({ column }) => column).join(' ') ?? timeColumn;
  }

  private timeOf({ cells }: CsvRecord, places: readonly number[]): string {
    const { timeColumns } = this.given.mapping;
    if (!timeColumns) return cells[places[0]!]!;
    return joinTime(
      places.map((place) => cells[place]!),
      timeColumns,
    );
  }

  private readWide(record: CsvRecord, header: WideHeader, tEnd: number): void {
    for (const { index, column, sensorId, unit } of header.sensors) {
      this.takeCell(record, column, { sensorId, tEnd, unit }, record.cells[index]!);
    }
  }

  private readLong(record: CsvRecord, header: LongHeader, tEnd: number): void {
    const { mapping, sensorIds } = this.given;
    const named = record.cells[header.sensor]!.trim();
    const sensorId = sensorIds.get(sensorNameOf(mapping, named) ?? '');
    if (sensorId !== undefined) {
      const place = { sensorId, tEnd, unit: mapping.units?.[named] };
      this.takeCell(record, mapping.valueColumn, place, record.cells[header.value]!);
      return;
    }
    if (sensorIds.has(named)) return;
    const why = `this tower has no sensor ${quoted(named)}; correct the name, map it, or add the sensor first.`;
    this.refuse(record, mapping.sensorColumn, { code: 'sensor-not-known', why });
  }

  private takeCell(record: CsvRecord, column: string, { sensorId, tEnd, unit }: Place, cell: string): void {
    if (this.noReading.has(cell.trim())) return;
    const value = readNumber(cell, this.given.mapping.decimal);
    if (typeof value !== 'number') this.refuse(record, column, value);
    else this.result.rows.push({ sensorId, tEnd, value: inOwnUnit(value, unit), rowNo: record.rowNo });
  }

  private refuse(record: CsvRecord, column: string | undefined, refusal: Refusal): void {
    this.result.refused.push(refusedRow(record.rowNo, column, refusal, record.raw));
  }
}
