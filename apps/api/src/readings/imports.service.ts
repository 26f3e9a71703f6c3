import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { offsetOf, type PageQuery } from '../common/paging';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import type { ImportDto, ImportPage, ImportsQuery, RefusedRowDto, RefusedRowPage } from './dto/import.dto';

interface ImportRow extends Omit<ImportDto, 'receivedAt' | 'withdrawnAt' | 'canWithdraw'> {
  readonly receivedAt: number;
  readonly withdrawnAt: number | null;
}

const SELECT = `SELECT i.id, i.tower_id towerId, t.name towerName, i.origin, i.name, i.received_at receivedAt, i.new_count new,
    i.repeated_count repeated, i.corrected_count corrected, i.refused_count refused, p.name "by",
    CASE WHEN i.withdrawn_at IS NOT NULL AND i.state <> 'withdrawn' THEN 'withdrawing' ELSE i.state END state,
    i.withdrawn_at withdrawnAt, w.name withdrawnBy
  FROM import i JOIN tower t ON t.id = i.tower_id LEFT JOIN user p ON p.id = i.by_user LEFT JOIN user w ON w.id = i.withdrawn_by`;
const REFUSED = `SELECT row_no row, col "column", code, text, raw FROM refused_row WHERE import_id = $1 ORDER BY row_no, id LIMIT $2 OFFSET $3`;
const ENDED: readonly ImportDto['state'][] = ['done', 'cancelled', 'failed'];

const show = (row: ImportRow): ImportDto => ({
  ...row,
  receivedAt: toIso(row.receivedAt),
  withdrawnAt: row.withdrawnAt === null ? null : toIso(row.withdrawnAt),
  canWithdraw: ENDED.includes(row.state),
});

/** What was imported, and what was refused and why. */
@Injectable()
export class ImportsService {
  constructor(private readonly sql: Sql) {}

  /** Imports, the newest first. */
  async list(query: ImportsQuery): Promise<ImportPage> {
    const { page, pageSize } = query;
    const towerId = query.towerId ?? null;
    const rows = await this.sql.all<ImportRow>(
      `${SELECT} WHERE $1 IS NULL OR i.tower_id = $1 ORDER BY i.id DESC LIMIT $2 OFFSET $3`,
      [towerId, pageSize, offsetOf(query)],
    );
    const total = await this.count(
      'SELECT count(*) n FROM import WHERE $1 IS NULL OR tower_id = $1',
      towerId,
    );
    return { items: rows.map(show), total, page, pageSize };
  }

  /** One import; 404 without it. */
  async get(id: number): Promise<ImportDto> {
    const row = await this.sql.get<ImportRow>(`${SELECT} WHERE i.id = $1`, [id]);
    if (!row) throw new Problem('not-found', `There is no import ${id}.`);
    return show(row);
  }

  /** An import's refused rows in the order of the file; 404 without the import. */
  async refused(importId: number, query: PageQuery): Promise<RefusedRowPage> {
    await this.get(importId);
    const { page, pageSize } = query;
    const rows = await this.sql.all<RefusedRowDto>(REFUSED, [importId, pageSize, offsetOf(query)]);
    const total = await this.count('SELECT count(*) n FROM refused_row WHERE import_id = $1', importId);
    return { items: rows, total, page, pageSize };
  }

  private async count(sql: string, bound: unknown): Promise<number> {
    return (await this.sql.get<{ n: number }>(sql, [bound]))?.n ?? 0;
  }
}
