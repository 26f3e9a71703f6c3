import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { ParsedReading } from './parse/parsed-readings';
import type { RefusedRow } from './refusal';

/** The value in force for a sensor's instant. */
export interface InForce {
  readonly sensorId: number;
  readonly tEnd: number;
  readonly value: number;
  readonly importId: number;
  readonly rowNo: number;
}

/** How many rows of an import went which way. */
export interface Counts {
  readonly new: number;
  readonly repeated: number;
  readonly corrected: number;
  readonly refused: number;
}

const IN_FORCE = `SELECT r.sensor_id sensorId, r.t_end tEnd, r.value, r.import_id importId, r.row_no rowNo
  FROM json_each($1) j CROSS JOIN reading r ON r.sensor_id = j.value->>0 AND r.t_end = j.value->>1`;
const WRITE = `INSERT INTO reading (sensor_id, t_end, value, import_id, row_no)
  SELECT value->>0, value->>1, CAST(value->>2 AS REAL), $2, value->>3 FROM json_each($1) WHERE true
  ON CONFLICT DO UPDATE SET value = excluded.value, import_id = excluded.import_id, row_no = excluded.row_no`;
const KEEP_PAST = `INSERT INTO reading_past (sensor_id, t_end, until_at, value, import_id, row_no)
  SELECT value->>0, value->>1, $2, CAST(value->>2 AS REAL), value->>3, value->>4 FROM json_each($1)`;
const REFUSE = `INSERT INTO refused_row (import_id, row_no, col, code, text, raw)
  SELECT $2, value->>0, value->>1, value->>2, value->>3, value->>4 FROM json_each($1)`;
const BEGIN = `WITH made(x) AS (SELECT 1)
  INSERT INTO import (tower_id, origin, name, received_at, new_count, repeated_count, corrected_count, refused_count)
  SELECT $1, $2, $3, $4, $5, $6, $7, $8 FROM made RETURNING id`;
const COUNT = `UPDATE import SET new_count = new_count + $2, repeated_count = repeated_count + $3,
  corrected_count = corrected_count + $4, refused_count = refused_count + $5 WHERE id = $1`;

/** The statements that put readings into the store; each within the caller's transaction. */
@Injectable()
export class ReadingsStore {
  constructor(private readonly sql: Sql) {}

  /** Begins an import with its first counts and gives its id. */
  async begin(
    towerId: number,
    { origin, name }: { origin: string; name: string },
    receivedAt: number,
    counts: Counts,
  ): Promise<number> {
    const counted = [counts.new, counts.repeated, counts.corrected, counts.refused];
    const [made] = await this.sql.returning<{ id: number }>(BEGIN, [
      towerId,
      origin,
      name,
      receivedAt,
      ...counted,
    ]);
    return made!.id;
  }

  /** The values in force at the instants of these rows. */
  inForce(rows: readonly ParsedReading[]): Promise<InForce[]> {
    return this.sql.all<InForce>(IN_FORCE, [JSON.stringify(rows.map((row) => [row.sensorId, row.tEnd]))]);
  }

  /** Puts values in force. */
  async write(rows: readonly ParsedReading[], importId: number): Promise<void> {
    if (rows.length === 0) return;
    const values = rows.map(({ sensorId, tEnd, value, rowNo }) => [sensorId, tEnd, value, rowNo]);
    await this.sql.run(WRITE, [JSON.stringify(values), importId]);
  }

  /** Keeps values that are no longer in force, with when they ceased to be; those without an import are of this one. */
  async keepPast(
    past: readonly (ParsedReading | InForce)[],
    importId: number,
    untilAt: number,
  ): Promise<void> {
    if (past.length === 0) return;
    const values = past.map((was) => [
      ...[was.sensorId, was.tEnd, was.value],
      ...['importId' in was ? was.importId : importId, was.rowNo],
    ]);
    await this.sql.run(KEEP_PAST, [JSON.stringify(values), untilAt]);
  }

  /** Keeps refused rows with their reasons. */
  async refuse(rows: readonly RefusedRow[], importId: number): Promise<void> {
    if (rows.length === 0) return;
    const values = rows.map(({ rowNo, column = null, code, text, raw }) => [rowNo, column, code, text, raw]);
    await this.sql.run(REFUSE, [JSON.stringify(values), importId]);
  }

  /** Adds to an import's counts. */
  async count(importId: number, counts: Counts): Promise<void> {
    await this.sql.run(COUNT, [importId, counts.new, counts.repeated, counts.corrected, counts.refused]);
  }
}
