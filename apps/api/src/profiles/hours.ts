import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { TowerBlock } from './profile-store';

const HOUR_S = 3600;

/*
 * Minutes by what the blocks of the hour say; blocks that never came count as not known. The mean strength needs 75 %
 * of the hour (EPA-454/R-99-005 §5.3), an hour without an inversion counting as 0.
 */
const ROLL_UP = `INSERT INTO hour (tower_id, t_end, inversion_min, none_min, not_known_min, mean_strength_c, max_strength_c)
  SELECT tower_id, hour_end, inversion, none, max(0, 60 - inversion - none),
    CASE WHEN inversion + none >= 45 THEN mean END, strongest
  FROM (SELECT h.value->>0 tower_id, h.value->>1 hour_end,
      CAST(round(sum(p.surface = 'present') * (h.value->>2) / 60.0) AS INTEGER) inversion,
      CAST(round(sum(p.surface = 'absent') * (h.value->>2) / 60.0) AS INTEGER) none,
      avg(p.within_c) mean, max(p.within_c) strongest
    FROM json_each($1) h CROSS JOIN profile p
    ON p.tower_id = h.value->>0 AND p.t_end > (h.value->>1) - ${HOUR_S} AND p.t_end <= h.value->>1
    GROUP BY 1, 2) WHERE true
  ON CONFLICT DO UPDATE SET inversion_min = excluded.inversion_min, none_min = excluded.none_min,
    not_known_min = excluded.not_known_min, mean_strength_c = excluded.mean_strength_c,
    max_strength_c = excluded.max_strength_c`;

/** Hourly roll-ups of a tower's profiles; an hour is labelled by its end. */
@Injectable()
export class Hours {
  constructor(private readonly sql: Sql) {}

  /** Rolls up anew, in the caller's transaction, the hours that hold these blocks. */
  async rollUp(blocks: readonly (TowerBlock & { blockS: number })[]): Promise<void> {
    const hours = new Map<string, readonly [number, number, number]>();
    for (const { towerId, tEnd, blockS } of blocks) {
      const hourEnd = Math.ceil(tEnd / HOUR_S) * HOUR_S;
      hours.set(`${towerId} ${hourEnd}`, [towerId, hourEnd, blockS]);
    }
    if (hours.size > 0) await this.sql.run(ROLL_UP, [JSON.stringify([...hours.values()])]);
  }
}
