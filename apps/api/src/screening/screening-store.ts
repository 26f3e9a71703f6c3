import { Injectable } from '@nestjs/common';
import { exactSql } from '../common/exact-decimal';
import { Sql } from '../database/sql';
import type { BlockMean } from './block-means';
import { meanRow } from './mean-row';
import type { ChangedFlag } from './series';

const WRITE_FLAGS = `UPDATE reading SET quality = j.q, checks = j.c
  FROM (SELECT value->>0 s, value->>1 t, value->>2 q, value->>3 c FROM jsonb_each($1)) j
  WHERE sensor_id = j.s AND t_end = j.t`;
const MEAN = `value->>0, value->>1, ${exactSql(1e9, 2, 5)}, value->>3, value->>4`;
const ADD_MEANS = `INSERT INTO block_mean (sensor_id, t_end, mean, n, quality) SELECT ${MEAN} FROM jsonb_each($1)`;
const WRITE_MEANS = `WITH j AS (SELECT value FROM jsonb_each($1))
  INSERT INTO block_mean (sensor_id, t_end, mean, n, quality)
  SELECT ${MEAN} FROM j WHERE true
  ON CONFLICT DO UPDATE SET mean = excluded.mean, n = excluded.n, quality = excluded.quality
  WHERE (mean, n, quality) IS NOT (excluded.mean, excluded.n, excluded.quality)
  RETURNING sensor_id sensorId, t_end tEnd`;

/** Writes what screening found, within the caller's transaction; only what differs from what is kept. */
@Injectable()
export class ScreeningStore {
  constructor(private readonly sql: Sql) {}

  /** Writes changed flags. */
  async writeFlags(flags: readonly ChangedFlag[]): Promise<void> {
    if (flags.length === 0) return;
    const values = flags.map(({ sensorId, tEnd, quality, checks }) => [sensorId, tEnd, quality, checks]);
    await this.writeFlagRows(JSON.stringify(values));
  }

  /** Writes flags given as JSON rows [sensor, end, quality, checks]. */
  async writeFlagRows(rows: string): Promise<void> {
    await this.sql.run(WRITE_FLAGS, [rows]);
  }

  /** Writes means, given as JSON rows, of blocks that had none. */
  async addMeanRows(rows: string): Promise<void> {
    await this.sql.run(ADD_MEANS, [rows]);
  }

  /** Writes block means and gives those that were new or differed. */
  async writeMeans(means: readonly BlockMean[]): Promise<{ sensorId: number; tEnd: number }[]> {
    if (means.length === 0) return [];
    return this.sql.returning(WRITE_MEANS, [`[${means.map(meanRow).join()}]`]);
  }
}
