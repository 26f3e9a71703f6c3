import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Sql } from '../../database/sql';
import type { FilePosition } from './new-lines';

const READ = `SELECT inode, position, row_no rowNo, header, head_sha256 headSha256 FROM source_file
  WHERE source_id = $1 AND path = $2`;
const KEEP = `INSERT INTO source_file (source_id, path, inode, header, position, row_no, seen_at, head_sha256)
  VALUES ($1, $2, $3, $4, $5, $6, $7, $8) ON CONFLICT DO UPDATE SET inode = excluded.inode, header = excluded.header,
  position = excluded.position, row_no = excluded.row_no, seen_at = excluded.seen_at, head_sha256 = excluded.head_sha256`;

/** How far each collected file has been read. */
@Injectable()
export class FilePositions {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** How far a source's file has been read; undefined where it is new. */
  of(sourceId: number, path: string): Promise<FilePosition | undefined> {
    return this.sql.get<FilePosition>(READ, [sourceId, path]);
  }

  /** Keeps how far a source's file has been read, in the running transaction. */
  async keep(sourceId: number, path: string, at: FilePosition): Promise<void> {
    const { inode, header, position, rowNo, headSha256 } = at;
    await this.sql.run(KEEP, [sourceId, path, inode, header, position, rowNo, this.clock.now(), headSha256]);
  }
}
