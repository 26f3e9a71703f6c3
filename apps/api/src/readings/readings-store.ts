import { Injectable } from '@nestjs/common';
import { exactSql, millionths } from '../common/exact-decimal';
import { Sql } from '../database/sql';
import type { ParsedReading } from './parse/parsed-readings';

/** The value in force for a sensor's instant. */
export interface InForce {
  readonly sensorId: number;
  readonly tEnd: number;
  readonly value: number;
  readonly importId: number;
  readonly rowNo: number;
}

const IN_FORCE = `SELECT r.sensor_id sensorId, r.t_end tEnd, r.value, r.import_id importId, r.row_no rowNo
  FROM jsonb_each($1) j CROSS JOIN reading r ON r.sensor_id = j.value->>0 AND r.t_end = j.value->>1`;
const WRITE = `INSERT INTO reading (sensor_id, t_end, value, import_id, row_no)
  SELECT value->>0, value->>1, ${exactSql(1e6, 2, 4)}, $2, value->>3 FROM jsonb_each($1) WHERE true
  ON CONFLICT DO UPDATE SET value = excluded.value, import_id = excluded.import_id, row_no = excluded.row_no`;
const KEEP_PAST = `INSERT INTO reading_past (sensor_id, t_end, until_at, value, import_id, row_no)
  SELECT value->>0, value->>1, $2, ${exactSql(1e6, 2, 5)}, value->>3, value->>4 FROM jsonb_each($1)`;
/** The statements that put readings into the store; each within the caller's transaction. */
@Injectable()
export class ReadingsStore {
  constructor(private readonly sql: Sql) {}

  /** The values in force at the instants of these rows. */
  inForce(rows: readonly ParsedReading[]): Promise<InForce[]> {
    return this.sql.all<InForce>(IN_FORCE, [JSON.stringify(rows.map((row) => [row.sensorId, row.tEnd]))]);
  }

  /** Puts values in force. */
  async write(rows: readonly ParsedReading[], importId: number): Promise<void> {
    if (rows.length === 0) return;
    const values = rows.map(({ sensorId, tEnd, value, rowNo }) => [
      sensorId,
      tEnd,
      millionths(value),
      rowNo,
      value,
    ]);
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
      ...[was.sensorId, was.tEnd, millionths(was.value)],
      ...['importId' in was ? was.importId : importId, was.rowNo, was.value],
    ]);
    await this.sql.run(KEEP_PAST, [JSON.stringify(values), untilAt]);
  }
}
