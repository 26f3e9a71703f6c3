import { Injectable } from '@nestjs/common';
import { Problem } from '../../common/problem';
import { Sql } from '../../database/sql';

/** How an upload stands. */
export type UploadState = 'waiting' | 'running' | 'done' | 'cancelled' | 'failed';

/** An upload as it is kept; instants in UTC epoch seconds. */
export interface StoredUpload {
  readonly id: number;
  readonly towerId: number;
  readonly towerName: string;
  readonly name: string;
  readonly kind: 'text' | 'workbook';
  readonly bytes: number;
  readonly sha256: string;
  readonly state: UploadState;
  readonly mapping: string | null;
  readonly bytesDone: number;
  readonly importId: number | null;
  readonly fault: string | null;
  readonly createdAt: number;
  readonly endedAt: number | null;
  readonly by: string;
  /** The newest import of the same file for the same tower that stands. */
  readonly sameId: number | null;
  readonly sameAt: number | null;
}

const SELECT = `SELECT u.id, u.tower_id towerId, t.name towerName, u.name, u.kind, u.bytes, u.sha256, u.state, u.mapping,
    u.bytes_done bytesDone, u.import_id importId, u.fault, u.created_at createdAt, u.ended_at endedAt, p.name "by",
    s.id sameId, s.received_at sameAt
  FROM upload u JOIN tower t ON t.id = u.tower_id JOIN user p ON p.id = u.by_user
  LEFT JOIN import s ON s.id = (SELECT max(i.id) FROM import i WHERE i.tower_id = u.tower_id AND i.sha256 = u.sha256
    AND i.state = 'done' AND i.withdrawn_at IS NULL AND i.id IS NOT u.import_id)`;
const INSERT = `WITH one AS (SELECT 1) INSERT INTO upload (tower_id, by_user, name, kind, bytes, sha256, state, created_at)
  SELECT $1, $2, $3, $4, $5, $6, 'waiting', $7 FROM one RETURNING id`;

/** What is needed to keep an upload. */
export interface NewUpload {
  readonly towerId: number;
  readonly byUser: number;
  readonly name: string;
  readonly kind: StoredUpload['kind'];
  readonly bytes: number;
  readonly sha256: string;
  readonly at: number;
}

/** The uploads' rows. */
@Injectable()
export class UploadRows {
  constructor(private readonly sql: Sql) {}

  /** One upload; 404 without it. */
  async find(id: number): Promise<StoredUpload> {
    const row = await this.sql.get<StoredUpload>(`${SELECT} WHERE u.id = $1`, [id]);
    if (!row) throw new Problem('not-found', `There is no upload ${id}. Send the file again.`);
    return row;
  }

  /** The newest 50, of one tower or of all. */
  list(towerId: number | null): Promise<StoredUpload[]> {
    return this.sql.all<StoredUpload>(
      `${SELECT} WHERE $1 IS NULL OR u.tower_id = $1 ORDER BY u.id DESC LIMIT 50`,
      [towerId],
    );
  }

  /** Keeps a new upload and gives its id. */
  async add({ towerId, byUser, name, kind, bytes, sha256, at }: NewUpload): Promise<number> {
    const [made] = await this.sql.returning<{ id: number }>(INSERT, [
      ...[towerId, byUser, name, kind, bytes, sha256, at],
    ]);
    return made!.id;
  }

  /** Says that an upload is being imported with a mapping, unless it is already or has been; whether it was so. */
  async begin(id: number, mapping: string): Promise<boolean> {
    const changed = await this.sql.run(
      `UPDATE upload SET state = 'running', mapping = $2, bytes_done = 0, fault = NULL, import_id = NULL, ended_at = NULL
       WHERE id = $1 AND state IN ('waiting', 'cancelled', 'failed')`,
      [id, mapping],
    );
    return changed > 0;
  }

  /** Says how importing an upload ended. */
  async end(
    id: number,
    ended: {
      state: UploadState;
      importId?: number | undefined;
      fault?: string | undefined;
      bytesDone: number;
      at: number;
    },
  ): Promise<void> {
    await this.sql.run(
      'UPDATE upload SET state = $2, import_id = $3, fault = $4, bytes_done = $5, ended_at = $6 WHERE id = $1',
      [id, ended.state, ended.importId ?? null, ended.fault ?? null, ended.bytesDone, ended.at],
    );
  }

  /** Uploads that a former process left in the middle have failed. */
  async endInterrupted(fault: string, at: number): Promise<void> {
    await this.sql.run(
      `UPDATE upload SET state = 'failed', fault = $1, ended_at = $2 WHERE state = 'running'`,
      [fault, at],
    );
  }

  /** Takes an upload that waits away; whether it was there and waited. */
  async remove(id: number): Promise<boolean> {
    return (await this.sql.run(`DELETE FROM upload WHERE id = $1 AND state = 'waiting'`, [id])) > 0;
  }

  /** The ids of uploads whose file is not needed any more: waiting or failed since before an instant. */
  async forgotten(before: number): Promise<number[]> {
    const rows = await this.sql.all<{ id: number }>(
      `SELECT id FROM upload WHERE state IN ('waiting', 'cancelled', 'failed') AND coalesce(ended_at, created_at) < $1`,
      [before],
    );
    return rows.map(({ id }) => id);
  }

  /** The mapping that was kept for a tower's next file. */
  async keptMapping(towerId: number): Promise<string | undefined> {
    const row = await this.sql.get<{ mapping: string }>(
      'SELECT mapping FROM tower_mapping WHERE tower_id = $1',
      [towerId],
    );
    return row?.mapping;
  }

  /** Keeps a mapping for a tower's next file. */
  async keepMapping(towerId: number, mapping: string, byUser: number, at: number): Promise<void> {
    await this.sql.run(
      `INSERT INTO tower_mapping (tower_id, mapping, kept_at, kept_by) VALUES ($1, $2, $3, $4)
       ON CONFLICT DO UPDATE SET mapping = excluded.mapping, kept_at = excluded.kept_at, kept_by = excluded.kept_by`,
      [towerId, mapping, at, byUser],
    );
  }
}
