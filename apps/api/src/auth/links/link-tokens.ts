import { Injectable } from '@nestjs/common';
import { randomBytes } from 'node:crypto';
import { sha256 } from '../../activity/digest';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { Settings } from '../../config/settings';
import { Sql } from '../../database/sql';

/** What a link is for. */
export type LinkPurpose = 'first-administrator' | 'invitation' | 'password';

/** A link that still works. */
export interface LiveLink {
  purpose: LinkPurpose;
  userId: number | null;
}

const lifetimeS: Record<LinkPurpose, number> = {
  'first-administrator': 24 * 3600,
  invitation: 7 * 24 * 3600,
  password: 24 * 3600,
};

/** Links that work once: only their hash is kept, so a copy of the database opens no account. */
@Injectable()
export class LinkTokens {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
    private readonly settings: Settings,
  ) {}

  /** Makes a link; earlier ones for the same purpose and person stop working. */
  async make(purpose: LinkPurpose, userId: number | null): Promise<string> {
    const token = randomBytes(32).toString('base64url');
    const now = this.clock.now();
    await this.sql.run('DELETE FROM link_token WHERE purpose = $1 AND user_id IS $2 AND used_at IS NULL', [
      purpose,
      userId,
    ]);
    await this.sql.run(
      'INSERT INTO link_token (token_hash, purpose, user_id, created_at, expires_at) VALUES ($1, $2, $3, $4, $5)',
      [sha256(token), purpose, userId, now, now + lifetimeS[purpose]],
    );
    return `${this.settings.publicUrl}/welcome/${token}`;
  }

  /** What a link is for; throws 410 `link-not-valid` when it was never made, was used, or is too old. */
  async look(token: string): Promise<LiveLink> {
    const link = await this.sql.get<LiveLink>(
      'SELECT purpose, user_id AS userId FROM link_token WHERE token_hash = $1 AND used_at IS NULL AND expires_at > $2',
      [sha256(token), this.clock.now()],
    );
    if (link) return link;
    throw new Problem(
      'link-not-valid',
      'This link was used already or is too old. Ask your administrator for a new one.',
    );
  }

  /** Marks a link as used, in the transaction of what it is used for; throws 410 when somebody was quicker. */
  async use(token: string): Promise<void> {
    const used = await this.sql.run(
      'UPDATE link_token SET used_at = $2 WHERE token_hash = $1 AND used_at IS NULL AND expires_at > $2',
      [sha256(token), this.clock.now()],
    );
    if (used === 0) await this.look(token);
  }
}
