import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import type { Source } from './models/source.model';

/** How far a file has been read, and by what it is known again. */
export interface FilePosition {
  /** 0 for a body over HTTP, which has none. */
  readonly inode: number;
  /** Bytes read, up to the end of a line. */
  readonly position: number;
  /** Lines read. */
  readonly rowNo: number;
  /** The lines up to and with the header, without which later lines mean nothing. */
  readonly header: string;
  /** Of what was read: a file that was replaced under its name reads otherwise. */
  readonly headSha256: string;
}

const READ = `SELECT inode, position, row_no rowNo, header, head_sha256 headSha256 FROM source_file
  WHERE source_id = $1 AND path = $2`;
const KEEP = `INSERT INTO source_file (source_id, path, inode, header, position, row_no, seen_at, head_sha256)
  SELECT id, $2, $3, $4, $5, $6, $7, $8 FROM source WHERE id = $1 AND version = $9
  ON CONFLICT DO UPDATE SET inode = excluded.inode, header = excluded.header, position = excluded.position,
  row_no = excluded.row_no, seen_at = excluded.seen_at, head_sha256 = excluded.head_sha256`;

/** How far each collected file has been read. */
@Injectable()
export class SourcePositions {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** How far a source's file has been read; undefined where it is new. */
  of(sourceId: number, path: string): Promise<FilePosition | undefined> {
    return this.sql.get<FilePosition>(READ, [sourceId, path]);
  }

  /**
   * Keeps how far a source's file has been read, in the running transaction; not when somebody changed the source
   * meanwhile, for then it is read anew by its new settings.
   */
  async keep({ id, version }: Source, path: string, at: FilePosition): Promise<void> {
    const { inode, header, position, rowNo, headSha256 } = at;
    const seenAt = this.clock.now();
    await this.sql.run(KEEP, [id, path, inode, header, position, rowNo, seenAt, headSha256, version]);
  }

  /** Forgets how far a source's files have been read, so that they are read from their beginnings. */
  async forget(sourceId: number): Promise<void> {
    await this.sql.run('DELETE FROM source_file WHERE source_id = $1', [sourceId]);
  }
}
