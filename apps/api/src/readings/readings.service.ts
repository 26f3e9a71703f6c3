import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import type { Lane } from '../database/gate';
import { UnitOfWork } from '../database/unit-of-work';
import { TowerLayouts } from '../towers/tower-layouts';
import { ImportStore } from './importing/import-store';
import { NOTHING_COUNTED, sumOf, type Ingested, type Origin } from './importing/origin';
import { CHUNK_ROWS, ReadingTaker } from './importing/reading-taker';
import type { ParsedReading } from './parse/parsed-readings';
import { refuseRetired, refuseStrangers } from './refuse-strangers';

export type { Ingested, Origin } from './importing/origin';

/** The door for readings that are read already: what a site pushed, new lines of a logger's file. */
@Injectable()
export class ReadingsService {
  constructor(
    private readonly taker: ReadingTaker,
    private readonly imports: ImportStore,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * Takes readings of one tower in as one import. Idempotent: a row that says what is known already changes nothing.
   * What depends on the rows is marked in the same transaction.
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
    refuseRetired(layout);
    refuseStrangers(layout, rows);
    const refused = origin.refused ?? [];
    const all = Math.max(rows.length, refused.length);
    let importId: number | undefined;
    let total = NOTHING_COUNTED;
    for (let at = 0; at === 0 || at < all; at += CHUNK_ROWS) {
      await this.work.run(async () => {
        const chunk = { rows: rows.slice(at, at + CHUNK_ROWS), refused: refused.slice(at, at + CHUNK_ROWS) };
        importId ??= await this.imports.begin(towerId, origin, this.clock.now());
        total = sumOf(total, await this.taker.take(layout, importId, chunk, total.refused));
        if (at + CHUNK_ROWS >= all) await this.imports.end(importId, 'done');
      }, lane);
    }
    return { importId: importId!, ...total };
  }
}
