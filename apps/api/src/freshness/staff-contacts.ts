import { Injectable } from '@nestjs/common';
import { sha256 } from '../activity/digest';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';

const ANALYSTS = `SELECT u.id, u.email, c.id contactId, c.address_hash hash FROM user u
  LEFT JOIN contact c ON c.user_id = u.id AND c.channel = 'email'
  WHERE u.role = 'analyst' AND u.retired_at IS NULL AND u.password_hash IS NOT NULL`;

/** The SELECT of those to write to, for the outbox. */
export const ANALYSTS_TO_TELL = `SELECT c.id contact_id, 'email' channel, 'en' lang FROM contact c JOIN user u ON u.id = c.user_id
  WHERE c.channel = 'email' AND c.stopped_at IS NULL AND u.role = 'analyst' AND u.retired_at IS NULL
    AND u.password_hash IS NOT NULL`;

/**
 * The ways to write to those who work here. Their address stays in their account alone, so that a changed e-mail is
 * followed and a retired account gets nothing; residents' lists and words never find these contacts.
 */
@Injectable()
export class StaffContacts {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** Gives every analyst a contact, in the running transaction; one whose e-mail was changed is written to again. */
  async keepUp(): Promise<void> {
    const rows = await this.sql.all<{
      id: number;
      email: string;
      contactId: number | null;
      hash: string | null;
    }>(ANALYSTS);
    for (const { id, email, contactId, hash } of rows) {
      const wanted = sha256(`user ${id} ${email.toLowerCase()}`);
      if (contactId === null) await this.add(id, wanted);
      else if (hash !== wanted)
        await this.sql.run(
          'UPDATE contact SET address_hash = $2, stopped_at = NULL, stop_reason = NULL WHERE id = $1',
          [contactId, wanted],
        );
    }
  }

  private async add(userId: number, hash: string): Promise<void> {
    const now = this.clock.now();
    const [person] = await this.sql.returning<{ id: number }>(
      "WITH one AS (SELECT 1) INSERT INTO person (lang, created_at) SELECT 'en', $1 FROM one RETURNING id",
      [now],
    );
    await this.sql.run(
      `INSERT INTO contact (person_id, channel, address_hash, confirmed_at, created_at, user_id)
       VALUES ($1, 'email', $2, $3, $3, $4)`,
      [person!.id, hash, now, userId],
    );
  }
}
