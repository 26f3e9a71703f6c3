import { Injectable } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Sql } from '../../database/sql';
import { Attempts } from '../passwords/attempts';

/** Clears away sessions that are over, and attempts too old to count. */
@Injectable()
export class StaleSessions {
  constructor(
    private readonly sql: Sql,
    private readonly attempts: Attempts,
    private readonly clock: Clock,
  ) {}

  /** Resolves with what was cleared, in words. */
  async clear(): Promise<string> {
    const now = this.clock.now();
    const sessions = await this.sql.run('DELETE FROM session WHERE expires <= $1 OR absolute_end <= $1', [
      now,
    ]);
    return `${sessions} sessions, ${await this.attempts.clear()} attempts`;
  }
}
