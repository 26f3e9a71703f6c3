import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { DirtyStages } from '../../database/dirty';
import { blockEndOf, type TowerLayout } from '../../towers/tower-layout';
import type { ParsedReading } from '../parse/parsed-readings';
import { ReadingsStore } from '../readings-store';
import type { RefusedRow } from '../refusal';
import { columnsOf, type ReadingColumns } from './file-reading';
import { ImportStore, type SensorSpan } from './import-store';
import type { Counts } from './origin';
import { sortRows } from './sort-rows';

/** Some rows of an import. */
export interface TakenRows {
  readonly rows: readonly ParsedReading[];
  readonly refused: readonly RefusedRow[];
}

/** Rows of one transaction: short enough that people's writes and other requests get in between. */
export const CHUNK_ROWS = 2_000;
/** Refused rows of one import that are kept; further ones are counted. */
export const MOST_REFUSED_KEPT = 100_000;

/** Takes some rows of an import in, within the caller's transaction. */
@Injectable()
export class ReadingTaker {
  constructor(
    private readonly store: ReadingsStore,
    private readonly imports: ImportStore,
    private readonly dirty: DirtyStages,
    private readonly clock: Clock,
  ) {}

  /**
   * A row that says what is known already changes nothing. A different value for a known instant comes into force, and
   * the former is kept with when it ceased to be. What depends on the rows is marked. `refusedBefore` rows of the
   * import were refused before these.
   */
  async take(
    layout: TowerLayout,
    importId: number,
    { rows, refused }: TakenRows,
    refusedBefore = 0,
  ): Promise<Counts> {
    const { write, past, counts } = sortRows(rows, await this.store.inForce(rows));
    const taken = { ...counts, refused: refused.length };
    await this.keep(importId, columnsOf(rows), refused, taken, refusedBefore);
    await this.store.write(write, importId);
    await this.store.keepPast(past, importId, this.clock.now());
    const blocks = new Set(write.map((row) => blockEndOf(row.tEnd, layout.blockS)));
    await this.dirty.markRead([...blocks].map((t) => [layout.id, t] as const));
    return taken;
  }

  /** Keeps what is said of an import about some of its rows: counts, spans and refused rows. */
  async keep(
    importId: number,
    rows: Pick<ReadingColumns, 'sensorId' | 'tEnd'>,
    refused: readonly RefusedRow[],
    taken: Counts,
    refusedBefore: number,
  ): Promise<void> {
    await this.imports.count(importId, taken);
    await this.imports.widen(importId, spansOf(rows));
    await this.imports.refuse(keptOf(refused, refusedBefore), importId);
  }
}

const spansOf = ({ sensorId, tEnd }: Pick<ReadingColumns, 'sensorId' | 'tEnd'>): SensorSpan[] => {
  const spans = new Map<number, { sensorId: number; t0: number; t1: number }>();
  for (let i = 0; i < tEnd.length; i += 1) {
    const [id, t] = [sensorId[i]!, tEnd[i]!];
    const span = spans.get(id);
    if (!span) spans.set(id, { sensorId: id, t0: t, t1: t });
    else if (t < span.t0) span.t0 = t;
    else if (t > span.t1) span.t1 = t;
  }
  return [...spans.values()];
};

/** Those that are kept; in place of the first that is not, a row that says so. */
const keptOf = (refused: readonly RefusedRow[], before: number): readonly RefusedRow[] => {
  const room = MOST_REFUSED_KEPT - before;
  if (refused.length <= room) return refused;
  if (room < 0) return [];
  const { rowNo } = refused[room]!;
  const text =
    `Row ${rowNo}: ${MOST_REFUSED_KEPT.toLocaleString('en')} rows were refused before it; this one and the refused ` +
    `ones after it are counted but not kept. Correct how the file is laid out, and send it again.`;
  return [...refused.slice(0, room), { rowNo, code: 'further-rows-not-kept', text, raw: '' }];
};
