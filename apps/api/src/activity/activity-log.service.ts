import { Injectable } from '@nestjs/common';
import type { Role } from '@lidwatch/contracts';
import { toIso } from '../common/instants';
import { offsetOf } from '../common/paging';
import { Sql } from '../database/sql';
import { linkHash, type EntryFacts } from './digest';
import type { ActivityEntry, ActivityPage, ActivityQuery } from './dto/activity-entry.dto';

/** Who reads the record. */
interface Reader {
  id: number;
  role: Role;
  districtIds: number[];
}

type Row = EntryFacts & { prev: string; hash: string };

const columns =
  'seq, at, actor, actor_id AS actorId, act, subject, district_id AS districtId, digest, prev, hash';
const checkedAtOnce = 1000;

/** What part of the record each role reads: administrators all, analysts their own, officers their districts. */
const visible: Record<Role, string> = {
  administrator: 'true',
  analyst: 'actor_id = $readerId',
  officer: 'district_id IN (SELECT value FROM json_each($districts))',
};

/** Reads the record of what was done. */
@Injectable()
export class ActivityLogService {
  constructor(private readonly sql: Sql) {}

  /** One page of what the reader may see, the newest first. */
  async page(reader: Reader, query: ActivityQuery): Promise<ActivityPage> {
    const where = `${visible[reader.role]} AND ($districtId IS NULL OR district_id = $districtId)`;
    const bind = { ...readerBind(reader), districtId: query.districtId ?? null };
    const total = await this.sql.get<{ n: number }>(
      `SELECT count(*) AS n FROM activity WHERE ${where}`,
      bind,
    );
    const rows = await this.sql.all<Row>(
      `SELECT ${columns} FROM activity WHERE ${where} ORDER BY seq DESC LIMIT $limit OFFSET $offset`,
      { ...bind, limit: query.pageSize, offset: offsetOf(query) },
    );
    return { items: rows.map(toEntry), total: total?.n ?? 0, page: query.page, pageSize: query.pageSize };
  }

  /** The first entry whose link does not hold (changed, or one before it is gone); undefined when all hold. */
  async firstBroken(): Promise<number | undefined> {
    let prev = '';
    for (let seq = 0; ;) {
      const rows = await this.sql.all<Row>(
        `SELECT ${columns} FROM activity WHERE seq > $1 ORDER BY seq LIMIT $2`,
        [seq, checkedAtOnce],
      );
      for (const row of rows) {
        if (row.prev !== prev || row.hash !== linkHash(prev, row)) return row.seq;
        prev = row.hash;
        seq = row.seq;
      }
      if (rows.length < checkedAtOnce) return undefined;
    }
  }
}

/** Only what the role's condition names: SQLite refuses a value that no statement asks for. */
function readerBind({ id, role, districtIds }: Reader): Record<string, unknown> {
  if (role === 'analyst') return { readerId: id };
  return role === 'officer' ? { districts: JSON.stringify(districtIds) } : {};
}

function toEntry({ seq, at, actor, act, subject, districtId, hash }: Row): ActivityEntry {
  return { seq, at: toIso(at), actor, act, subject, districtId, hash };
}
