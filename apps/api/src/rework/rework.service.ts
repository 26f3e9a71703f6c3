import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { RuleTruths } from './rule-truths';

/** Something that was changed about a tower's readings, sensors or settings. */
export interface Rework {
  readonly towerId: number;
  /** What was changed, in words for the record: `sensor "T 30 m" set aside`. */
  readonly cause: string;
  /** The id of who changed it; left out for the service itself. */
  readonly byUser?: number;
  /** The blocks concerned end in (t0, t1], UTC epoch seconds; left out, the whole record. */
  readonly t0?: number;
  readonly t1?: number;
}

interface Marked {
  readonly blocks: number;
  readonly first: number | null;
  readonly last: number | null;
}

const MARKED = `SELECT count(*) blocks, min(t) first, max(t) last FROM dirty
  WHERE stage = 1 AND subject = $1 AND t > $2 AND t <= $3`;
const BEGIN = `WITH one AS (SELECT 1)
  INSERT INTO rework (tower_id, cause, by_user, t0, t1, begun_at, blocks, past_seq, truths_before)
  SELECT $1, $2, $3, $4 - block_s, $5, $6, $7, (SELECT coalesce(max(seq), 0) FROM profile_past), $8
  FROM one JOIN tower ON tower.id = $1 RETURNING id`;

/** Keeps what was changed and has it followed until everything that depends on it is worked out anew. */
@Injectable()
export class ReworkService {
  constructor(
    private readonly sql: Sql,
    private readonly truths: RuleTruths,
    private readonly clock: Clock,
  ) {}

  /**
   * Begins the record of a change, in the caller's transaction and after its blocks were marked (`DirtyStages`). Gives
   * its id, or null where no block is marked and so nothing depends on the change yet.
   */
  async begin({
    towerId,
    cause,
    byUser,
    t0 = 0,
    t1 = Number.MAX_SAFE_INTEGER,
  }: Rework): Promise<number | null> {
    const now = this.clock.now();
    const marked = await this.sql.get<Marked>(MARKED, [towerId, t0, Math.min(t1, now)]);
    if (!marked || marked.first === null || marked.last === null) return null;
    const { first, last, blocks } = marked;
    const truths = await this.truths.before(towerId, first, last, now);
    const values = [towerId, cause, byUser ?? null, first, last, now, blocks, JSON.stringify(truths)];
    const [made] = await this.sql.returning<{ id: number }>(BEGIN, values);
    return made!.id;
  }
}
