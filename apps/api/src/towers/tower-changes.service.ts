import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { offsetOf, type PageQuery } from '../common/paging';
import { Sql } from '../database/sql';
import { describeChange, type ChangeBody } from './describe-change';
import type { TowerChangeDto, TowerChangePage } from './dto/tower-change.dto';
import { TowerLayouts } from './tower-layouts';

interface Row {
  readonly seq: number;
  readonly at: number;
  readonly actor: string;
  readonly act: string;
  readonly body: string | null;
}

/** A tower that was deleted leaves its number to a later one; what was done to the former is not the later's. */
const OF_TOWER = `a.subject = $1
  AND a.seq > (SELECT coalesce(max(seq), 0) FROM activity WHERE subject = $1 AND act = 'tower deleted')`;
const LIST = `SELECT a.seq, a.at, a.actor, a.act, b.body FROM activity a LEFT JOIN activity_body b ON b.seq = a.seq
  WHERE ${OF_TOWER} ORDER BY a.seq DESC LIMIT $2 OFFSET $3`;

const show = ({ seq, at, actor, act, body }: Row): TowerChangeDto => ({
  ...{ id: seq, at: toIso(at), by: actor, act },
  what: describeChange(JSON.parse(body ?? '{}') as ChangeBody),
});

/** What was ever changed about a tower: its settings, sensors, sources, keys, spans and imports. */
@Injectable()
export class TowerChangesService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
  ) {}

  /** Changes of a tower, the newest first; 404 without the tower. */
  async list(towerId: number, query: PageQuery): Promise<TowerChangePage> {
    await this.layouts.of(towerId);
    const { page, pageSize } = query;
    const subject = `tower ${towerId}`;
    const rows = await this.sql.all<Row>(LIST, [subject, pageSize, offsetOf(query)]);
    const count = await this.sql.get<{ n: number }>(`SELECT count(*) n FROM activity a WHERE ${OF_TOWER}`, [
      subject,
    ]);
    return { items: rows.map(show), total: count?.n ?? 0, page, pageSize };
  }
}
