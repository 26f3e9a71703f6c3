import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { DistrictTruthsChangedDto } from './dto/rework.dto';
import { DISTRICTS_OF_TOWER, REACH_S } from './reach';

/** Older blocks are left as their rule judged them when they were new, s. */
const JUDGED_ANEW_S = 24 * 3600;

/** What a district's rule said of one block: district id, end of the block, truths by kind of notice as kept. */
export type KeptTruth = readonly [number, number, string];

const KEPT = `SELECT district_id districtId, t_end tEnd, truths FROM evaluation
  WHERE district_id IN (${DISTRICTS_OF_TOWER}) AND t_end > $2 AND t_end <= $3`;
const CHANGED = `SELECT d.id districtId, d.name,
    sum(e.truths IS NOT j.value->>2) truthsChanged
  FROM json_each($1) j JOIN district d ON d.id = j.value->>0
  LEFT JOIN evaluation e ON e.district_id = j.value->>0 AND e.t_end = j.value->>1
  GROUP BY d.id ORDER BY d.name`;

/** What rules say of the blocks that are judged anew, before and after a change. */
@Injectable()
export class RuleTruths {
  constructor(private readonly sql: Sql) {}

  /** What the rules say now of the blocks of a tower's districts that a change within [first, last] can alter. */
  async before(towerId: number, first: number, last: number, now: number): Promise<KeptTruth[]> {
    const after = Math.max(first - REACH_S, now - JUDGED_ANEW_S);
    const rows = await this.sql.all<{ districtId: number; tEnd: number; truths: string }>(KEPT, [
      ...[towerId, after, last + REACH_S],
    ]);
    return rows.map(({ districtId, tEnd, truths }) => [districtId, tEnd, truths]);
  }

  /** For how many of those blocks each district's rule says otherwise now; `kept` as JSON. */
  changed(kept: string): Promise<DistrictTruthsChangedDto[]> {
    return this.sql.all<DistrictTruthsChangedDto>(CHANGED, [kept]);
  }
}
