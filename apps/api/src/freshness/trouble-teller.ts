import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Settings } from '../config/settings';
import { Sql } from '../database/sql';
import { OutboxService } from '../outbox/outbox.service';
import { ANALYSTS_TO_TELL, StaffContacts } from './staff-contacts';
import { troubleMail, type ToldTrouble } from './trouble-mail';

const TOPIC = 'tower troubles';
/** A trouble waits so long for others, s, so that a network that fails is one mail and not one for each tower. */
const GATHER_S = 5 * 60;
const PRIORITY = 3;
const WORTH_SENDING_S = 86_400;

const TROUBLE = `SELECT b.id, b.tower_id towerId, t.name towerName, b.kind, b.text, b.since_t since, b.ended_at endedAt
  FROM tower_trouble b JOIN tower t ON t.id = b.tower_id`;
const OPENED = `${TROUBLE} WHERE b.told_at IS NULL AND b.ended_at IS NULL AND b.clear_since IS NULL ORDER BY b.since_t, b.id`;
const OVER = `${TROUBLE} WHERE b.told_at IS NOT NULL AND b.ended_at IS NOT NULL AND b.end_told_at IS NULL ORDER BY b.ended_at, b.id`;
const OLDEST = `SELECT min(seen_at) at FROM tower_trouble WHERE told_at IS NULL AND ended_at IS NULL AND clear_since IS NULL`;

/** Tells the analysts by mail: each trouble once when it opens and once when it is over, several in one mail. */
@Injectable()
export class TroubleTeller {
  constructor(
    private readonly staff: StaffContacts,
    private readonly outbox: OutboxService,
    private readonly sql: Sql,
    private readonly clock: Clock,
    private readonly settings: Settings,
  ) {}

  /** Queues what is to be told, in the running transaction; says how many mails. */
  async tell(): Promise<number> {
    const now = this.clock.now();
    const oldest = (await this.sql.get<{ at: number | null }>(OLDEST))?.at ?? null;
    const isDue = oldest !== null && oldest <= now - GATHER_S;
    const opened = isDue ? await this.sql.all<ToldTrouble>(OPENED) : [];
    const over = await this.sql.all<ToldTrouble>(OVER);
    if (opened.length + over.length === 0) return 0;
    await this.staff.keepUp();
    const revision = await this.nextRevision();
    const message = troubleMail(opened, over, this.settings.publicUrl);
    const queued = await this.outbox.enqueueMany({
      ...{ topic: TOPIC, revision, priority: PRIORITY, notAfter: now + WORTH_SENDING_S },
      payloads: [{ channel: 'email', lang: 'en', ...message, html: null }],
      ...{ recipientsSql: ANALYSTS_TO_TELL, bind: [] },
    });
    await this.sql.run(
      'UPDATE tower_trouble SET told_at = $2, mail_revision = $3 WHERE id IN (SELECT value FROM json_each($1))',
      [idsOf(opened), now, revision],
    );
    await this.sql.run(
      'UPDATE tower_trouble SET end_told_at = $2 WHERE id IN (SELECT value FROM json_each($1))',
      [idsOf(over), now],
    );
    return queued;
  }

  private async nextRevision(): Promise<number> {
    const row = await this.sql.get<{ n: number }>(
      'SELECT coalesce(max(revision), 0) + 1 n FROM payload WHERE topic = $1',
      [TOPIC],
    );
    return row!.n;
  }
}

const idsOf = (troubles: readonly ToldTrouble[]): string => JSON.stringify(troubles.map(({ id }) => id));
