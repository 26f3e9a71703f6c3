import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { Sql } from '../database/sql';
import type { TowerFreshness } from './dto/desk.dto';

/** A tower is late when its newest block ended longer ago than this, or 2.5 of its intervals, s. */
const LATE_S = 45 * 60;

const NEWEST = `SELECT id, name, interval_s intervalS, stale_limit_s staleLimitS,
  (SELECT max(t_end) FROM profile p WHERE p.tower_id = t.id) newest
  FROM tower t WHERE retired_at IS NULL ORDER BY name`;

/** How lately each tower has given a block. */
@Injectable()
export class TowerNews {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** Every tower in use, by name. */
  async all(): Promise<TowerFreshness[]> {
    const rows = await this.sql.all<{
      id: number;
      name: string;
      intervalS: number;
      staleLimitS: number | null;
      newest: number | null;
    }>(NEWEST);
    const now = this.clock.now();
    return rows.map(({ id, name, intervalS, staleLimitS, newest }) => {
      const limitS = staleLimitS ?? Math.max(LATE_S, 2.5 * intervalS);
      return {
        id,
        name,
        newest: newest === null ? null : toIso(newest),
        late: newest === null || now - newest > limitS,
      };
    });
  }
}
