import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { Sql } from '../database/sql';
import type { ChangedFindingsDto, ReworkDto } from './dto/rework.dto';
import { Pending } from './pending';

interface ReworkRow {
  readonly id: number;
  readonly towerId: number;
  readonly cause: string;
  readonly by: string | null;
  readonly t0: number;
  readonly t1: number;
  readonly begunAt: number;
  readonly endedAt: number | null;
  readonly blocks: number;
  readonly changes: string | null;
}

const NEWEST = 50;
const LIST = `SELECT r.id, r.tower_id towerId, r.cause, u.name "by", r.t0, r.t1, r.begun_at begunAt, r.ended_at endedAt,
    r.blocks, r.changes
  FROM rework r LEFT JOIN user u ON u.id = r.by_user`;

/** What was worked out anew, for those who read it. */
@Injectable()
export class ReworksService {
  constructor(
    private readonly sql: Sql,
    private readonly pending: Pending,
  ) {}

  /** The newest fifty, of one tower or of all. */
  async list(towerId?: number): Promise<ReworkDto[]> {
    const where = towerId === undefined ? '' : 'WHERE r.tower_id = $1';
    const rows = await this.sql.all<ReworkRow>(
      `${LIST} ${where} ORDER BY r.id DESC LIMIT ${NEWEST}`,
      towerId === undefined ? [] : [towerId],
    );
    return Promise.all(rows.map((row) => this.show(row)));
  }

  private async show({ t0, t1, begunAt, endedAt, changes, ...row }: ReworkRow): Promise<ReworkDto> {
    const waiting =
      endedAt === null
        ? await this.pending.of({ towerId: row.towerId, t0, t1, begunAt })
        : { blocks: 0, districtBlocks: 0 };
    return {
      ...row,
      ...{ from: toIso(t0), to: toIso(t1), begunAt: toIso(begunAt) },
      endedAt: endedAt === null ? null : toIso(endedAt),
      pending: Math.min(waiting.blocks, row.blocks),
      pendingDistricts: waiting.districtBlocks,
      changes: changes === null ? null : (JSON.parse(changes) as ChangedFindingsDto),
    };
  }
}
