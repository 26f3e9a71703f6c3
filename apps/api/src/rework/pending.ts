import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { DISTRICTS_OF_TOWER, REACH_S } from './reach';

/** Blocks that a change can alter and that still wait. */
export interface PendingBlocks {
  readonly blocks: number;
  readonly districtBlocks: number;
}

/** A block this young may wait for readings that are still to come; it holds up no record, s. */
const STILL_OPEN_S = 600;
/** By then what need not wait for readings has been taken up, s. */
const TAKEN_UP_S = 5;

/** What is followed: a tower's blocks that end in (t0, t1], since an instant; UTC epoch seconds. */
export interface Followed {
  readonly towerId: number;
  readonly t0: number;
  readonly t1: number;
  readonly begunAt: number;
}

const PENDING = `SELECT
  (SELECT count(DISTINCT t) FROM dirty WHERE stage IN (1, 2) AND subject = $1 AND t > $2 AND t <= $3) blocks,
  (SELECT count(*) FROM dirty WHERE stage = 3 AND subject IN (${DISTRICTS_OF_TOWER}) AND t > $2 AND t <= $3)
    districtBlocks`;

/** Counts what still waits of a change. */
@Injectable()
export class Pending {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** What waits of those blocks and of those around them that the change can reach. */
  async of({ towerId, t0, t1, begunAt }: Followed): Promise<PendingBlocks> {
    const now = this.clock.now();
    const until = Math.min(t1 + REACH_S, now - begunAt < TAKEN_UP_S ? now : now - STILL_OPEN_S);
    return (await this.sql.get<PendingBlocks>(PENDING, [towerId, t0 - REACH_S, until]))!;
  }
}
