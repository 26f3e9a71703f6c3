import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { KeptMean } from './block-facts';
import { PROFILE_COLUMNS, REAL_COLUMNS, type profileRow } from './profile-row';

/** A tower's block. */
export interface TowerBlock {
  readonly towerId: number;
  readonly tEnd: number;
}

/** What is kept of a block that is to become a profile. */
export interface MeansOfBlock {
  readonly means: readonly KeptMean[];
  /** Whether it is one already, so that a change has to keep what it was. */
  readonly hasProfile: boolean;
}

const value = (column: string, i: number): string =>
  REAL_COLUMNS.has(column) ? `CAST(value->>${i} AS REAL)` : `value->>${i}`;
const columns = PROFILE_COLUMNS.join(', ');
const given = PROFILE_COLUMNS.map((column, i) => `${value(column, i)} AS ${column}`).join(', ');
const content = PROFILE_COLUMNS.slice(2);
const differs = (a: string, b: string): string =>
  `(${content.map((c) => `${a}.${c}`).join(', ')}) IS NOT (${content.map((c) => `${b}.${c}`).join(', ')})`;
/** Rows in SQLite's own form of JSON: else each of the columns would read the row's text again, at twice the cost. */
const ROWS = 'jsonb_each($1)';
const body = content.map((column) => `'${column}', p.${column}`).join(', ');

const MEANS = `SELECT j.key,
    EXISTS (SELECT 1 FROM profile p WHERE p.tower_id = j.value->>2 AND p.t_end = j.value->>1) hasProfile,
    json_group_array(json_array(b.sensor_id, format('%!.17g', b.mean), b.n, b.quality)) means
  FROM json_each($1) j CROSS JOIN json_each(j.value->'$[0]') s CROSS JOIN block_mean b
  ON b.sensor_id = s.value AND b.t_end = j.value->>1 GROUP BY j.key`;
const HOUR_OF_PM25 = `SELECT j.key, group_concat(format('%!.17g', b.mean) ORDER BY b.t_end) means
  FROM json_each($1) j CROSS JOIN block_mean b ON b.sensor_id = j.value->>0 AND b.t_end > (j.value->>1) - 3600
  AND b.t_end <= j.value->>1 AND b.mean IS NOT NULL GROUP BY j.key`;
const KEEP_PAST = `INSERT INTO profile_past (tower_id, t_end, rev, until_at, body)
  SELECT p.tower_id, p.t_end, p.rev, $2, json_object(${body})
  FROM (SELECT ${given} FROM ${ROWS}) n CROSS JOIN profile p ON p.tower_id = n.tower_id AND p.t_end = n.t_end
  WHERE ${differs('p', 'n')}`;
const ADD = `INSERT INTO profile (${columns}, rev) SELECT ${given}, 1 FROM ${ROWS}`;
const WRITE = `WITH j AS (SELECT value FROM ${ROWS}) INSERT INTO profile AS p (${columns}, rev)
  SELECT ${given}, 1 FROM j WHERE true
  ON CONFLICT DO UPDATE SET ${content.map((c) => `${c} = excluded.${c}`).join(', ')}, rev = p.rev + 1
  WHERE ${differs('p', 'excluded')} RETURNING tower_id towerId, t_end tEnd`;

/** The statements by which profiles are made and kept. */
@Injectable()
export class ProfileStore {
  constructor(private readonly sql: Sql) {}

  /** The means of some blocks, for the sensors given with each, and whether each has a profile; in the order asked. */
  async means(blocks: readonly (TowerBlock & { sensorIds: readonly number[] })[]): Promise<MeansOfBlock[]> {
    const asked = JSON.stringify(blocks.map(({ sensorIds, tEnd, towerId }) => [sensorIds, tEnd, towerId]));
    const rows = await this.sql.all<{ key: number; hasProfile: number; means: string }>(MEANS, [asked]);
    const found = new Map(rows.map((row) => [row.key, row]));
    return blocks.map((_, key) => ({
      means: meansOf(found.get(key)?.means),
      hasProfile: found.get(key)?.hasProfile === 1,
    }));
  }

  /** The means of the blocks of the hour that ends with each block, in the order asked. */
  async hours(blocks: readonly { sensorId: number; tEnd: number }[]): Promise<number[][]> {
    if (blocks.length === 0) return [];
    const asked = JSON.stringify(blocks.map(({ sensorId, tEnd }) => [sensorId, tEnd]));
    const rows = await this.sql.all<{ key: number; means: string }>(HOUR_OF_PM25, [asked]);
    const found = new Map(rows.map(({ key, means }) => [key, JSON.parse(`[${means}]`) as number[]]));
    return blocks.map((_, key) => found.get(key) ?? []);
  }

  /** Keeps, within the caller's transaction, what these profiles are about to replace. */
  async keepPast(rows: readonly ReturnType<typeof profileRow>[], now: number): Promise<void> {
    if (rows.length > 0) await this.sql.run(KEEP_PAST, [JSON.stringify(rows), now]);
  }

  /** Writes profiles, given as JSON rows, of blocks that had none, within the caller's transaction. */
  async addRows(rows: string): Promise<void> {
    await this.sql.run(ADD, [rows]);
  }

  /** Writes profiles within the caller's transaction; gives those that are new or differ. */
  async write(rows: readonly ReturnType<typeof profileRow>[]): Promise<TowerBlock[]> {
    if (rows.length === 0) return [];
    const values = JSON.stringify(rows);
    return this.sql.returning<TowerBlock>(WRITE, [values]);
  }
}

const meansOf = (text: string | undefined): KeptMean[] => {
  if (text === undefined) return [];
  const rows = JSON.parse(text) as [number, string | null, number, number][];
  return rows.map(([sensorId, mean, n, quality]) => ({
    ...{ sensorId, n, quality },
    mean: quality === 3 || mean === null ? null : Number(mean),
  }));
};
