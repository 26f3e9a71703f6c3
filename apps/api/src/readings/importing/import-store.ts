import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import type { RefusedRow } from '../refusal';
import type { Counts, Origin } from './origin';

/** How an import stands. */
export type ImportState = 'running' | 'done' | 'cancelled' | 'failed';

/** From when to when an import holds readings of a sensor, both ends included, UTC epoch seconds. */
export interface SensorSpan {
  readonly sensorId: number;
  readonly t0: number;
  readonly t1: number;
}

const BEGIN = `WITH made(x) AS (SELECT 1)
  INSERT INTO import (tower_id, origin, name, received_at, sha256, by_user, source_id, state)
  SELECT $1, $2, $3, $4, $5, $6, $7, 'running' FROM made RETURNING id`;
const COUNT = `UPDATE import SET new_count = new_count + $2, repeated_count = repeated_count + $3,
  corrected_count = corrected_count + $4, refused_count = refused_count + $5 WHERE id = $1`;
const SPAN = `INSERT INTO import_span (import_id, sensor_id, t0, t1)
  SELECT $2, value->>0, value->>1, value->>2 FROM json_each($1) WHERE true
  ON CONFLICT DO UPDATE SET t0 = min(t0, excluded.t0), t1 = max(t1, excluded.t1)`;
const REFUSE = `INSERT INTO refused_row (import_id, row_no, col, code, text, raw)
  SELECT $2, value->>0, value->>1, value->>2, value->>3, value->>4 FROM json_each($1)`;
const END = 'UPDATE import SET state = $2 WHERE id = $1';
const END_INTERRUPTED = `UPDATE import SET state = 'failed' WHERE state = 'running'`;

/** The statements that keep what an import is and what it gave; each within the caller's transaction. */
@Injectable()
export class ImportStore {
  constructor(private readonly sql: Sql) {}

  /** Begins an import and gives its id. */
  async begin(towerId: number, origin: Origin, receivedAt: number): Promise<number> {
    const { sha256 = null, byUser = null, sourceId = null } = origin;
    const bound = [towerId, origin.origin, origin.name, receivedAt, sha256, byUser, sourceId];
    const [made] = await this.sql.returning<{ id: number }>(BEGIN, bound);
    return made!.id;
  }

  /** Adds to an import's counts. */
  async count(importId: number, counts: Counts): Promise<void> {
    await this.sql.run(COUNT, [importId, counts.new, counts.repeated, counts.corrected, counts.refused]);
  }

  /** Widens the spans in which an import holds readings. */
  async widen(importId: number, spans: readonly SensorSpan[]): Promise<void> {
    if (spans.length === 0) return;
    const values = spans.map(({ sensorId, t0, t1 }) => [sensorId, t0, t1]);
    await this.sql.run(SPAN, [JSON.stringify(values), importId]);
  }

  /** Keeps refused rows with their reasons. */
  async refuse(rows: readonly RefusedRow[], importId: number): Promise<void> {
    if (rows.length === 0) return;
    const values = rows.map(({ rowNo, column = null, code, text, raw }) => [rowNo, column, code, text, raw]);
    await this.sql.run(REFUSE, [JSON.stringify(values), importId]);
  }

  /** Says how an import ended. */
  async end(importId: number, state: Exclude<ImportState, 'running'>): Promise<void> {
    await this.sql.run(END, [importId, state]);
  }

  /** Imports that a former process left running have failed. */
  async endInterrupted(): Promise<void> {
    await this.sql.run(END_INTERRUPTED);
  }
}
