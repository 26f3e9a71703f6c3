import { Injectable } from '@nestjs/common';
import { exactSql } from '../../../common/exact-decimal';
import { DirtyStages } from '../../../database/dirty';
import { Sql } from '../../../database/sql';
import { Hours } from '../../../profiles/hours';
import { ProfileStore } from '../../../profiles/profile-store';
import { ScreeningStore } from '../../../screening/screening-store';
import type { TowerLayout } from '../../../towers/tower-layout';
import type { Fresh } from './fresh';

const NEAR = `SELECT count(*) held, total(import_id = $3) own FROM reading
  WHERE sensor_id IN (SELECT value FROM json_each($1)) AND t_end > $2 AND t_end <= $4`;
const ELSE = `SELECT
  EXISTS (SELECT 1 FROM block_mean WHERE sensor_id IN (SELECT value FROM json_each($1)) AND t_end > $2 AND t_end <= $3)
  OR EXISTS (SELECT 1 FROM profile WHERE tower_id = $4 AND t_end > $2 AND t_end <= $3)
  OR EXISTS (SELECT 1 FROM dirty WHERE stage = 1 AND subject = $4 AND t > $5 AND t <= $6)
  OR EXISTS (SELECT 1 FROM override WHERE undone_at IS NULL AND sensor_id IN (SELECT value FROM json_each($1))
    AND t1 > $7 AND t0 <= $6) found`;
const WRITE = `INSERT INTO reading (sensor_id, t_end, value, quality, checks, import_id, row_no)
  SELECT value->>0, value->>1, ${exactSql(1e6, 2, 6)}, value->>3, value->>4, $2, value->>5 FROM jsonb_each($1)`;

/** Writes what an import's rows came to, within the caller's transaction. */
@Injectable()
export class FreshWriter {
  constructor(
    private readonly sql: Sql,
    private readonly screening: ScreeningStore,
    private readonly profiles: ProfileStore,
    private readonly hours: Hours,
    private readonly dirty: DirtyStages,
  ) {}

  /** Whether the store holds nothing else near the rows, so that what they came to is all there is to say. */
  async isAlone(tower: TowerLayout, importId: number, { near, done, held }: Fresh): Promise<boolean> {
    const sensorIds = JSON.stringify(tower.sensors.map(({ id }) => id));
    const { afterT, untilT, count, unmarkedAfterT } = near;
    const found = await this.sql.get<{ held: number; own: number }>(NEAR, [
      sensorIds,
      afterT,
      importId,
      untilT,
    ]);
    if (found?.held !== count || found.own !== count) return false;
    const bound = [sensorIds, done.afterT, held.untilT, tower.id, unmarkedAfterT, untilT, afterT];
    return (await this.sql.get<{ found: number }>(ELSE, bound))?.found === 0;
  }

  /**
   * Writes readings, means, profiles and hours, and marks what follows. Blocks that are not final are marked, but held
   * for the import by `holder` until it lets them go.
   */
  async write(tower: TowerLayout, importId: number, fresh: Fresh, holder: object): Promise<void> {
    const { id: towerId, blockS } = tower;
    this.dirty.hold(holder, { towerId, ...fresh.held });
    await this.sql.run(WRITE, [fresh.readings, importId]);
    if (fresh.earlierFlags) await this.screening.writeFlagRows(fresh.earlierFlags);
    await this.dirty.markHeld(fresh.waitingEnds.map((end) => [towerId, end]));
    const ends = [...fresh.waitingEnds, ...fresh.profileEnds, ...fresh.failedEnds];
    await this.dirty.markNeighbours(ends.map((end) => [towerId, end]));
    if (fresh.profileEnds.length + fresh.failedEnds.length === 0) return;
    await this.screening.addMeanRows(fresh.means);
    await this.profiles.addRows(fresh.profiles);
    await this.hours.rollUp(fresh.profileEnds.map((tEnd) => ({ towerId, tEnd, blockS })));
    await this.dirty.markDistricts(fresh.profileEnds.map((tEnd) => [towerId, tEnd]));
    await this.dirty.mark(
      2,
      fresh.failedEnds.map((tEnd) => [towerId, tEnd]),
    );
    await this.dirty.unmarkHeld({ towerId, ...fresh.done });
  }

  /** Lets go what is held: the stages work out what waits. */
  letGo(holder: object): void {
    this.dirty.hold(holder, undefined);
  }
}
