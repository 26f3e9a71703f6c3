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

/** One whose span is known. */
type Spanned = Rework & Required<Pick<Rework, 't0' | 't1'>>;

interface Marked {
  readonly blocks: number;
  readonly first: number | null;
  readonly last: number | null;
}

const EVER_S = Number.MAX_SAFE_INTEGER;
const MARKED = `SELECT count(*) blocks, min(t) first, max(t) last FROM dirty
  WHERE stage = 1 AND subject = $1 AND t > $2 AND t <= $3`;
/** Towers whose neighbour a tower is, each with that tower's name. */
const HEARING = `SELECT n.tower_id id, t.name FROM tower_neighbour n JOIN tower t ON t.id = n.neighbour_id
  WHERE n.neighbour_id = $1 ORDER BY n.tower_id`;
const KEEP = `WITH one AS (SELECT 1)
  INSERT INTO rework (tower_id, cause, by_user, t0, t1, begun_at, blocks, past_seq, truths_before)
  SELECT $1, $2, $3, $4, $5, $6, $7, (SELECT coalesce(max(seq), 0) FROM profile_past), $8 FROM one RETURNING id`;

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
   * its id, or null where no block is marked and so nothing depends on the change yet. The towers whose neighbour it is
   * get a record of their own.
   */
  async begin(rework: Rework): Promise<number | null> {
    for (const { id, name } of await this.sql.all<{ id: number; name: string }>(HEARING, [rework.towerId])) {
      await this.beginOne({ ...rework, towerId: id, cause: `Neighbouring ${name}: ${rework.cause}` });
    }
    return this.beginOne(rework);
  }

  private async beginOne(rework: Rework): Promise<number | null> {
    const { towerId, t0 = 0, t1 = EVER_S } = rework;
    const span = [towerId, t0, Math.min(t1, this.clock.now())];
    const marked = await this.sql.get<Marked>(MARKED, span);
    if (!marked || marked.first === null || marked.last === null) return null;
    const tower = await this.sql.get<{ blockS: number }>('SELECT block_s blockS FROM tower WHERE id = $1', [
      towerId,
    ]);
    return this.keep({ ...rework, t0: marked.first - tower!.blockS, t1: marked.last }, marked.blocks);
  }

  /**
   * Keeps how things are before a change that takes several transactions; call it before the first mark, and `follow`
   * after the last.
   */
  prepare(rework: Spanned): Promise<number> {
    return this.keep(rework, 0);
  }

  /** Follows what was prepared: so many blocks have been marked. Where there are none nothing is kept of it. */
  async follow(id: number, blocks: number): Promise<void> {
    if (blocks > 0) await this.sql.run('UPDATE rework SET blocks = $2 WHERE id = $1', [id, blocks]);
    else await this.sql.run('DELETE FROM rework WHERE id = $1', [id]);
  }

  private async keep({ towerId, cause, byUser, t0, t1 }: Spanned, blocks: number): Promise<number> {
    const now = this.clock.now();
    const truths = await this.truths.before(towerId, t0, t1, now);
    const values = [towerId, cause, byUser ?? null, t0, t1, now, blocks, JSON.stringify(truths)];
    const [made] = await this.sql.returning<{ id: number }>(KEEP, values);
    return made!.id;
  }
}
