import { setImmediate as nextTurn } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import { toIso } from '../../common/instants';
import { unitsByQuantity } from '../../towers/quantities';
import type { LayoutSensor } from '../../towers/tower-layout';
import { TowerLayouts } from '../../towers/tower-layouts';
import type { MappingInput } from '../../towers/dto/mapping.dto';
import { LineCutter, type Lines } from '../importing/lines';
import { CsvReader } from '../parse/csv-reader';
import { readMapping } from '../parse/mapping';
import { HeaderError, type ParsedReading } from '../parse/parsed-readings';
import { ReadingContexts } from '../reading-contexts';
import type { RefusedRow } from '../refusal';
import { civilQuestions } from './civil-questions';
import type { PreviewDto, PreviewRowDto, PreviewSpanDto } from './dto/proposal.dto';
import { KeptComparison } from './kept-comparison';
import { MappingChecks } from './mapping-checks';
import { ProposalsService } from './proposals.service';
import { UploadRows } from './upload-rows';
import { UploadTexts } from './upload-texts';

/** Looked at, at most, bytes: a preview is to be quick. */
const LOOKED_AT_BYTES = 5_000_000;
const PIECE_BYTES = 64_000;
const SHOWN_ROWS = 30;
const SHOWN_REFUSED = 100;
/** Of each sensor so many readings are compared with the tower's own, one in so many. */
const COMPARED = 500;
const ONE_IN = 7;

interface Span {
  from: number;
  to: number;
  count: number;
  lowest: number;
  highest: number;
  /** Some of its readings. */
  readonly some: ParsedReading[];
}

interface Tally {
  read: number;
  refused: number;
  readonly rows: Map<
    string,
    { readonly rowNo: number; readonly tEnd: number; readonly readings: ParsedReading[] }
  >;
  readonly refusedRows: RefusedRow[];
  readonly civil: RefusedRow[];
  readonly ignored: string[];
  readonly spans: Map<number, Span>;
}

function count(tally: Tally, readings: readonly ParsedReading[], refused: readonly RefusedRow[]): void {
  tally.read += readings.length;
  tally.refused += refused.length;
  tally.refusedRows.push(...refused.slice(0, SHOWN_REFUSED - tally.refusedRows.length));
  tally.civil.push(
    ...refused.filter(({ code }) => code === 'time-happens-twice' || code === 'time-does-not-exist'),
  );
  for (const reading of readings) {
    const key = `${reading.rowNo} ${reading.tEnd}`;
    const row = tally.rows.get(key);
    if (row) row.readings.push(reading);
    else if (tally.rows.size < SHOWN_ROWS) tally.rows.set(key, { ...reading, readings: [reading] });
    const { sensorId, tEnd, value } = reading;
    const span = tally.spans.get(sensorId);
    if (!span) {
      const first = { from: tEnd, to: tEnd, count: 1, lowest: value, highest: value, some: [reading] };
      tally.spans.set(sensorId, first);
    } else {
      if (span.count % ONE_IN === 0 && span.some.length < COMPARED) span.some.push(reading);
      span.from = Math.min(span.from, tEnd);
      span.to = Math.max(span.to, tEnd);
      span.count += 1;
      span.lowest = Math.min(span.lowest, value);
      span.highest = Math.max(span.highest, value);
    }
  }
}

/** What importing an uploaded file would give, before anything is taken. */
@Injectable()
export class PreviewsService {
  constructor(
    private readonly uploads: UploadRows,
    private readonly texts: UploadTexts,
    private readonly proposals: ProposalsService,
    private readonly contexts: ReadingContexts,
    private readonly layouts: TowerLayouts,
    private readonly checks: MappingChecks,
    private readonly comparison: KeptComparison,
  ) {}

  /** Reads an upload by a mapping; of a large file its beginning. */
  async preview(uploadId: number, given: MappingInput): Promise<PreviewDto> {
    const upload = await this.uploads.find(uploadId);
    const tower = await this.layouts.of(upload.towerId);
    this.checks.check(tower, given);
    const mapping = readMapping(JSON.stringify(given));
    return this.proposals.readable(upload, async () => {
      const text = await this.texts.look(upload, mapping.sheet);
      const [cutter, reader] = [new LineCutter(), new CsvReader(await this.contexts.of(tower.id, mapping))];
      const tally: Tally = {
        ...{ read: 0, refused: 0, rows: new Map(), spans: new Map() },
        ...{ refusedRows: [], civil: [], ignored: [] },
      };
      const take = ({ lines, firstRowNo, refused: unread }: Lines): void => {
        reader.readLines(lines, firstRowNo);
        const { rows, refused, ignoredColumns } = reader.take();
        tally.ignored.push(...ignoredColumns);
        count(tally, rows, [...unread, ...refused]);
      };
      let looked = 0;
      for await (const piece of this.texts.bytes(text, PIECE_BYTES)) {
        take(cutter.push(piece));
        looked += piece.length;
        if (looked >= LOOKED_AT_BYTES) break;
        await nextTurn();
      }
      const whole = looked < LOOKED_AT_BYTES;
      if (whole) take(cutter.end());
      if (!reader.hasHeader)
        throw new HeaderError('The file has no header line; say in which row it stands.');
      return { ...show(tally, tower.sensors, whole), warnings: await this.warnings(tally, tower.sensors) };
    });
  }

  private async warnings({ spans }: Tally, sensors: readonly LayoutSensor[]): Promise<string[]> {
    const warnings: string[] = [];
    for (const sensor of sensors) {
      const some = spans.get(sensor.id)?.some;
      if (some) warnings.push(...(await this.comparison.warnings(sensor, some)));
    }
    return warnings;
  }
}

function show(tally: Tally, sensors: readonly LayoutSensor[], whole: boolean): Omit<PreviewDto, 'warnings'> {
  const known = new Map(sensors.map((sensor) => [sensor.id, sensor]));
  const named = (id: number): { sensor: string; unit: string } => {
    const { name, quantity } = known.get(id)!;
    return { sensor: name, unit: unitsByQuantity[quantity] };
  };
  const rows = [...tally.rows.values()].map(({ rowNo, tEnd, readings }): PreviewRowDto => ({
    ...{ rowNo, time: toIso(tEnd) },
    values: readings.map(({ sensorId, value }) => ({ ...named(sensorId), value })),
  }));
  const spans = [...tally.spans].map(([id, { from, to, some: _, ...span }]): PreviewSpanDto => ({
    ...named(id),
    ...span,
    from: toIso(from),
    to: toIso(to),
  }));
  return {
    ...{ rows, spans, whole, read: tally.read, refused: tally.refused },
    refusedRows: tally.refusedRows.map(({ rowNo, column, code, text, raw }) => ({
      ...{ row: rowNo, column: column ?? null, code, text, raw },
    })),
    ignoredColumns: tally.ignored,
    questions: civilQuestions(tally.civil) as PreviewDto['questions'],
  };
}
