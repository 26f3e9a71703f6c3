import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { DirtyStages } from '../database/dirty';
import type { Lane } from '../database/gate';
import { UnitOfWork } from '../database/unit-of-work';
import { blockEndOf, type TowerLayout } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import type { ParsedReading } from './parse/parsed-readings';
import { ReadingsStore, type Counts, type InForce } from './readings-store';
import type { RefusedRow } from './refusal';

/** Where readings came from. */
export interface Origin {
  readonly origin: 'folder' | 'push' | 'demo';
  /** File name, key name, or the like. */
  readonly name: string;
  /** Rows that were refused while reading; they are kept with their reasons. */
  readonly refused?: readonly RefusedRow[];
}

/** What taking readings in gave. */
export interface Ingested extends Counts {
  readonly importId: number;
}

/** Rows of one transaction: short enough that people's writes get in between. */
const CHUNK_ROWS = 5_000;
const NONE: Counts = { new: 0, repeated: 0, corrected: 0, refused: 0 };

interface Sorted {
  readonly write: ParsedReading[];
  /** Those without an import are of this one. */
  readonly past: (ParsedReading | InForce)[];
  readonly counts: Counts;
}

/** The one door through which readings enter the store, whichever way they came. */
@Injectable()
export class ReadingsService {
  constructor(
    private readonly store: ReadingsStore,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * Takes readings of one tower in. Idempotent: a row that says what is known already changes nothing. A different
   * value for a known instant comes into force, and the former is kept with when it ceased to be. What depends on the
   * rows is marked in the same transaction.
   *
   * @throws Problem `invalid` where a row's sensor is another tower's or retired: nothing is taken then.
   */
  async ingest(
    towerId: number,
    rows: readonly ParsedReading[],
    origin: Origin,
    lane: Lane = 'bulk',
  ): Promise<Ingested> {
    const layout = await this.layouts.of(towerId);
    refuseStrangers(layout, rows);
    const refused = origin.refused ?? [];
    let importId: number | undefined;
    let total = NONE;
    for (let at = 0; at === 0 || at < Math.max(rows.length, refused.length); at += CHUNK_ROWS) {
      await this.work.run(async () => {
        const chunk = { rows: rows.slice(at, at + CHUNK_ROWS), refused: refused.slice(at, at + CHUNK_ROWS) };
        const sorted = sortRows(chunk.rows, await this.store.inForce(chunk.rows));
        const counts = { ...sorted.counts, refused: chunk.refused.length };
        if (importId === undefined)
          importId = await this.store.begin(towerId, origin, this.clock.now(), counts);
        else await this.store.count(importId, counts);
        await this.keep(layout, sorted, chunk.refused, importId);
        total = sum(total, counts);
      }, lane);
    }
    return { importId: importId!, ...total };
  }

  private async keep(
    layout: TowerLayout,
    { write, past }: Sorted,
    refused: readonly RefusedRow[],
    importId: number,
  ): Promise<void> {
    await this.store.write(write, importId);
    await this.store.keepPast(past, importId, this.clock.now());
    await this.store.refuse(refused, importId);
    const blocks = new Set(write.map((row) => blockEndOf(row.tEnd, layout.blockS)));
    await this.dirty.mark(
      1,
      [...blocks].map((t) => [layout.id, t] as const),
    );
  }
}

const keyOf = (row: { sensorId: number; tEnd: number }): string => `${row.sensorId} ${row.tEnd}`;

/**
 * The store reads decimal text, which can be off by the last bit of a double: values that close are the same, or a
 * file sent twice would correct itself.
 */
const isSame = (a: number, b: number): boolean => Math.abs(a - b) <= 4 * Number.EPSILON * Math.abs(a);

/** Sorts rows into new, repeated and corrected; of several rows for one instant the last is in force. */
function sortRows(rows: readonly ParsedReading[], known: readonly InForce[]): Sorted {
  const inForce = new Map<string, ParsedReading | InForce>(known.map((row) => [keyOf(row), row]));
  const write = new Map<string, ParsedReading>();
  const past: (ParsedReading | InForce)[] = [];
  let [fresh, repeated] = [0, 0];
  for (const row of rows) {
    const key = keyOf(row);
    const was = inForce.get(key);
    if (was && isSame(was.value, row.value)) {
      repeated += 1;
      continue;
    }
    if (was) past.push(was);
    else fresh += 1;
    inForce.set(key, row);
    write.set(key, row);
  }
  const counts = { new: fresh, repeated, corrected: past.length, refused: 0 };
  return { write: [...write.values()], past, counts };
}

function refuseStrangers(layout: TowerLayout, rows: readonly ParsedReading[]): void {
  const usable = new Set(layout.sensors.filter((sensor) => sensor.retiredAt === null).map(({ id }) => id));
  const stranger = rows.find((row) => !usable.has(row.sensorId));
  if (layout.retiredAt !== null) {
    throw new Problem('not-possible-now', `The tower "${layout.name}" is retired and takes no readings.`);
  }
  if (stranger === undefined) return;
  throw new Problem('invalid', `Sensor ${stranger.sensorId} is none of "${layout.name}", or is retired.`);
}

const sum = (a: Counts, b: Counts): Counts => ({
  new: a.new + b.new,
  repeated: a.repeated + b.repeated,
  corrected: a.corrected + b.corrected,
  refused: a.refused + b.refused,
});
