import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { offsetOf, type PageQuery } from '../common/paging';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import type { ImportDto, ImportPage, ImportsQuery, RefusedRowDto, RefusedRowPage } from './dto/import.dto';

type ImportRow = Omit<ImportDto, 'receivedAt'> & { readonly receivedAt: number };

const LIST = `SELECT id, tower_id towerId, origin, name, received_at receivedAt, new_count new, repeated_count repeated,
  corrected_count corrected, refused_count refused FROM import WHERE $1 IS NULL OR tower_id = $1
  ORDER BY id DESC LIMIT $2 OFFSET $3`;
const REFUSED = `SELECT row_no row, col "column", code, text, raw FROM refused_row WHERE import_id = $1 ORDER BY row_no, id LIMIT $2 OFFSET $3`;

/** What was imported, and what was refused and why. */
@Injectable()
export class ImportsService {
  constructor(private readonly sql: Sql) {}

  /** Imports, the newest first. */
  async list(query: ImportsQuery): Promise<ImportPage> {
    const { page, pageSize } = query;
    const towerId = query.towerId ?? null;
    const rows = await this.sql.all<ImportRow>(LIST, [towerId, pageSize, offsetOf(query)]);
    const total = await this.count(
      'SELECT count(*) n FROM import WHERE $1 IS NULL OR tower_id = $1',
      towerId,
    );
    return {
      items: rows.map((row) => ({ ...row, receivedAt: toIso(row.receivedAt) })),
      total,
      page,
      pageSize,
    };
  }

  /** An import's refused rows in the order of the file; 404 without the import. */
  async refused(importId: number, query: PageQuery): Promise<RefusedRowPage> {
    if ((await this.count('SELECT count(*) n FROM import WHERE id = $1', importId)) === 0) {
      throw new Problem('not-found', `There is no import ${importId}.`);
    }
    const { page, pageSize } = query;
    const rows = await this.sql.all<RefusedRowDto>(REFUSED, [importId, pageSize, offsetOf(query)]);
    const total = await this.count('SELECT count(*) n FROM refused_row WHERE import_id = $1', importId);
    return { items: rows, total, page, pageSize };
  }

  private async count(sql: string, bound: unknown): Promise<number> {
    return (await this.sql.get<{ n: number }>(sql, [bound]))?.n ?? 0;
  }
}
