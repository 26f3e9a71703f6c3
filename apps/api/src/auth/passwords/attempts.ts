import { Injectable } from '@nestjs/common';
import { sha256 } from '../../activity/digest';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { Sql } from '../../database/sql';
import { UnitOfWork } from '../../database/unit-of-work';

/** Whose attempts are counted, and how many are allowed within the window. */
export interface Counted {
  key: string;
  most: number;
}

const windowS = 15 * 60;

const accountOf = (email: string): string => email.trim().toLowerCase();

/**
 * Attempts on one account from one address: enough for a person who mistypes, few enough against guessing. Whoever
 * guesses locks out their own address, not the account's owner.
 */
export const onAccountFrom = (email: string, address: string): Counted => ({
  key: `account ${accountOf(email)} from ${address}`,
  most: 8,
});
/**
 * Attempts on one account from everywhere: far more than one address can make, so that it takes a dozen of them to
 * keep the owner out, and still few against guessing from many (common practice; OWASP Authentication Cheat Sheet).
 */
export const onAccount = (email: string): Counted => ({ key: `account ${accountOf(email)}`, most: 100 });
/** Attempts from one address, which a whole office may share. */
export const fromAddress = (address: string): Counted => ({ key: `address ${address}`, most: 40 });
/** Passwords asked again of somebody signed in. */
export const again = (userId: number): Counted => ({ key: `again ${userId}`, most: 8 });

/** Counts attempts in the store, so that a restart forgets none. Keys are kept hashed. */
@Injectable()
export class Attempts {
  constructor(
    private readonly sql: Sql,
    private readonly units: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * Counts an attempt before it is made, so that attempts side by side are counted too. Throws 429 when there were
   * too many within a quarter of an hour.
   */
  begin(...counted: Counted[]): Promise<void> {
    return this.units.run(async () => {
      const now = this.clock.now();
      for (const { key, most } of counted) await this.refuseBeyond(sha256(key), most, now);
      for (const { key } of counted)
        await this.sql.run('INSERT INTO sign_in_failure (key, at) VALUES ($1, $2)', [sha256(key), now]);
    });
  }

  /** Forgets the attempts of those who turned out to be right. */
  async forget(...counted: Counted[]): Promise<void> {
    for (const { key } of counted)
      await this.sql.run('DELETE FROM sign_in_failure WHERE key = $1', [sha256(key)]);
  }

  /** Takes back one attempt that was right where the others still count. */
  async takeBack({ key }: Counted): Promise<void> {
    await this.sql.run(
      'DELETE FROM sign_in_failure WHERE rowid = (SELECT max(rowid) FROM sign_in_failure WHERE key = $1)',
      [sha256(key)],
    );
  }

  /** Removes what is too old to count; resolves with how many. */
  clear(): Promise<number> {
    return this.sql.run('DELETE FROM sign_in_failure WHERE at <= $1', [this.clock.now() - windowS]);
  }

  private async refuseBeyond(key: string, most: number, now: number): Promise<void> {
    const found = await this.sql.get<{ n: number; since: number }>(
      'SELECT count(*) AS n, min(at) AS since FROM sign_in_failure WHERE key = $1 AND at > $2',
      [key, now - windowS],
    );
    if (!found || found.n < most) return;
    const minutes = Math.max(1, Math.ceil((found.since + windowS - now) / 60));
    throw new Problem('too-many-attempts', `There were too many attempts. Try again in ${minutes} min.`, {
      retryAfterSeconds: found.since + windowS - now,
    });
  }
}
