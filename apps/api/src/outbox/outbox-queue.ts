import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { backoffS } from './backoff';
import type { Channel, OutboundMessage, Outcome } from './channel';

/** A message and how its attempt went. */
export interface Result {
  readonly message: OutboundMessage;
  readonly outcome: Outcome;
}

/** A lease is only looked at after a crash: one process owns the store, so nobody else sends meanwhile. */
const LEASE_S = 600;

const MESSAGE = `SELECT o.id, o.message_id messageId, o.channel, o.topic, o.contact_id contactId, c.person_id personId,
  c.address, p.lang, p.subject, p.text, p.html, o.created_at createdAt, o.attempts
  FROM outbox o JOIN contact c ON c.id = o.contact_id JOIN payload p ON p.id = o.payload_id`;

/** Closes what is due but must not go out any more: too late, silenced, or to somebody who left. $1 now, $2 channel. */
const CLOSE_DUE = `WITH due AS (
    SELECT o.id, o.not_after < $1 late, c.stopped_at IS NOT NULL OR c.address IS NULL gone,
      o.revision < coalesce(t.silent_before, 0) silent
    FROM outbox o JOIN contact c ON c.id = o.contact_id LEFT JOIN outbox_topic t ON t.topic = o.topic
    WHERE o.state = 'queued' AND o.channel = $2 AND o.next_at <= $1)
  UPDATE outbox SET settled_at = $1, state = CASE WHEN due.late THEN 'expired' ELSE 'suppressed' END,
    detail = CASE WHEN due.late THEN 'it was too late to send it' WHEN due.gone THEN 'the recipient left or stopped'
      ELSE 'the notice is no longer in force' END
  FROM due WHERE outbox.id = due.id AND (due.late OR due.gone OR due.silent)`;

const CLAIM = `UPDATE outbox SET state = 'sending', attempts = attempts + 1, lease_by = $3, lease_until = $1 + ${LEASE_S}
  WHERE id IN (SELECT id FROM outbox WHERE state = 'queued' AND channel = $2 AND next_at <= $1
    ORDER BY priority DESC, next_at, id LIMIT $4)
  RETURNING id`;

/** Writes results: [id, state, next_at|null, provider_id|null, detail|null]. A receipt that came first stays. */
const SETTLE = `UPDATE outbox SET state = j.value->>1, next_at = coalesce(j.value->>2, next_at),
    provider_id = coalesce(provider_id, j.value->>3), detail = j.value->>4, lease_by = NULL, lease_until = NULL,
    settled_at = CASE WHEN j.value->>1 = 'queued' THEN NULL ELSE $1 END
  FROM json_each($2) j WHERE outbox.id = j.value->>0 AND outbox.state = 'sending'`;

const KEEP_ATTEMPTS = `INSERT INTO attempt (outbox_id, n, at, outcome, code, detail)
  SELECT value->>0, value->>1, $1, value->>2, value->>3, value->>4 FROM json_each($2) WHERE true
  ON CONFLICT DO NOTHING`;

/** The outbox as a queue: take what is due, write back how it went, many rows at a time. */
@Injectable()
export class OutboxQueue {
  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** Takes up to `limit` due messages of a channel, the most urgent first. */
  async take(channel: Channel, owner: string, limit: number): Promise<OutboundMessage[]> {
    const now = this.clock.now();
    const ids = await this.work.run(async () => {
      await this.sql.run(CLOSE_DUE, [now, channel]);
      return this.sql.returning<{ id: number }>(CLAIM, [now, channel, owner, limit]);
    }, 'bulk');
    return this.messages(ids.map(({ id }) => id));
  }

  /** Messages of a channel that were under way in a process that died. */
  async orphans(channel: Channel, owner: string): Promise<OutboundMessage[]> {
    return this.sql.all<OutboundMessage>(
      `${MESSAGE} WHERE o.state = 'sending' AND o.channel = $1 AND o.lease_by IS NOT $2 ORDER BY o.id`,
      [channel, owner],
    );
  }

  /** Puts orphans the other side knows nothing of back into the queue. */
  async putBack(messages: readonly OutboundMessage[]): Promise<void> {
    await this.sql.run(
      `UPDATE outbox SET state = 'queued', lease_by = NULL, lease_until = NULL
       WHERE state = 'sending' AND id IN (SELECT value FROM json_each($1))`,
      [JSON.stringify(messages.map(({ id }) => id))],
    );
  }

  /** Writes down how attempts went, and which contacts are not to be written to again. */
  async settle(results: readonly Result[]): Promise<void> {
    if (results.length === 0) return;
    const now = this.clock.now();
    const rows = results.map(({ message, outcome }) => settledRow(message, outcome, now));
    const attempts = results.map(({ message, outcome }) => [
      ...[message.id, message.attempts, outcome.kind],
      ...(outcome.kind === 'accepted' ? [null, null] : [outcome.code, outcome.detail]),
    ]);
    const stopped = results.flatMap(({ message, outcome }) =>
      outcome.kind === 'failed' && outcome.stopContact ? [[message.contactId, outcome.stopContact]] : [],
    );
    await this.work.run(async () => {
      await this.sql.run(SETTLE, [now, JSON.stringify(rows)]);
      await this.sql.run(KEEP_ATTEMPTS, [now, JSON.stringify(attempts)]);
      if (stopped.length > 0) await this.stopContacts(stopped, now);
    }, 'bulk');
  }

  /** When the next message of a channel is due, UTC epoch seconds; undefined when none waits. */
  async nextDue(channel: Channel): Promise<number | undefined> {
    const row = await this.sql.get<{ at: number | null }>(
      "SELECT min(next_at) at FROM outbox WHERE state = 'queued' AND channel = $1",
      [channel],
    );
    return row?.at ?? undefined;
  }

  private messages(ids: number[]): Promise<OutboundMessage[]> {
    return this.sql.all<OutboundMessage>(
      `${MESSAGE} WHERE o.id IN (SELECT value FROM json_each($1)) ORDER BY o.priority DESC, o.id`,
      [JSON.stringify(ids)],
    );
  }

  private async stopContacts(stopped: (string | number)[][], now: number): Promise<void> {
    await this.sql.run(
      `UPDATE contact SET stopped_at = $1, stop_reason = j.value->>1 FROM json_each($2) j
       WHERE contact.id = j.value->>0 AND contact.stopped_at IS NULL`,
      [now, JSON.stringify(stopped)],
    );
  }
}

function settledRow({ id, attempts }: OutboundMessage, outcome: Outcome, now: number): unknown[] {
  if (outcome.kind === 'accepted') return [id, 'accepted', null, outcome.providerId ?? null, null];
  if (outcome.kind === 'failed') return [id, 'failed', null, null, outcome.detail];
  return [id, 'queued', now + backoffS(attempts, Math.random()), null, outcome.detail];
}
