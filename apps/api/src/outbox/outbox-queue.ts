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

const MESSAGE = `SELECT o.id, o.message_id messageId, o.channel, o.topic, o.contact_id contactId, c.person_id personId,
  coalesce(u.email, c.address) address, c.user_id IS NOT NULL isToStaff, o.payload_id payloadId, o.created_at createdAt, o.attempts
  FROM json_each($1) j CROSS JOIN outbox o ON o.id = j.value CROSS JOIN contact c ON c.id = o.contact_id
    LEFT JOIN user u ON u.id = c.user_id
  ORDER BY o.priority DESC, o.next_at, o.id`;

const PAYLOAD = `SELECT id payloadId, lang, subject, text, html FROM payload WHERE id IN (SELECT value FROM json_each($1))`;

const CLAIM = `UPDATE outbox SET state = 'sending', attempts = attempts + 1
  WHERE id IN (SELECT id FROM outbox WHERE state = 'queued' AND channel = $2 AND next_at <= $1
    ORDER BY priority DESC, next_at, id LIMIT $3)
  RETURNING id`;

/** Of what was claimed, closes what must not go out any more: too late, silenced, or to somebody who left. */
const CLOSE = `WITH claimed AS (
    SELECT o.id, o.not_after < $1 late, c.stopped_at IS NOT NULL OR coalesce(u.email, c.address) IS NULL
      OR u.retired_at IS NOT NULL gone,
      o.revision < coalesce(t.silent_before, 0) silent
    FROM json_each($2) j CROSS JOIN outbox o ON o.id = j.value CROSS JOIN contact c ON c.id = o.contact_id
      LEFT JOIN user u ON u.id = c.user_id LEFT JOIN outbox_topic t ON t.topic = o.topic)
  UPDATE outbox SET settled_at = $1, attempts = attempts - 1,
    state = CASE WHEN claimed.late THEN 'expired' ELSE 'suppressed' END,
    detail = CASE WHEN claimed.late THEN 'it was too late to send it' WHEN claimed.gone THEN 'the recipient left or stopped'
      ELSE 'the notice is no longer in force' END
  FROM claimed WHERE outbox.id = claimed.id AND (claimed.late OR claimed.gone OR claimed.silent)
  RETURNING outbox.id`;

const INTERRUPTED = `SELECT 1 FROM outbox WHERE state = 'sending' AND channel = $1 LIMIT 1`;
const KEEP_INTERRUPTED = `INSERT INTO attempt (outbox_id, n, at, outcome, detail)
  SELECT id, attempts, $1, 'interrupted', 'the service stopped while it was under way'
  FROM outbox WHERE state = 'sending' AND channel = $2 ON CONFLICT DO NOTHING`;

/** Writes results: [id, state, next_at|null, provider_id|null, detail|null]. A receipt that came first stays. */
const SETTLE = `UPDATE outbox SET state = j.value->>1, next_at = coalesce(j.value->>2, next_at),
    provider_id = coalesce(provider_id, (SELECT j.value->>3 WHERE NOT EXISTS (
      SELECT 1 FROM outbox other WHERE other.provider_id = j.value->>3))), detail = j.value->>4,
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

  /** Takes up to `limit` due messages of a channel, the most urgent first; an empty list means that none is due. */
  async take(channel: Channel, limit: number): Promise<OutboundMessage[]> {
    for (;;) {
      const claimed = await this.work.run(() => this.claim(channel, limit), 'bulk');
      if (claimed.all === 0) return [];
      if (claimed.open.length > 0) return this.messages(claimed.open);
    }
  }

  /**
   * Puts messages back that were under way when a process died or could not write its results; says how many. Call it
   * only while nothing is sent by the channel: one process owns the store, so what is *sending* then is interrupted.
   */
  async putBackInterrupted(channel: Channel): Promise<number> {
    const any = await this.sql.get(INTERRUPTED, [channel]);
    if (!any) return 0;
    return this.work.run(async () => {
      await this.sql.run(KEEP_INTERRUPTED, [this.clock.now(), channel]);
      return this.sql.run("UPDATE outbox SET state = 'queued' WHERE state = 'sending' AND channel = $1", [
        channel,
      ]);
    }, 'bulk');
  }

  /** Gives messages back that were taken and not tried. */
  async release(messages: readonly OutboundMessage[]): Promise<void> {
    if (messages.length === 0) return;
    await this.sql.run(
      `UPDATE outbox SET state = 'queued', attempts = attempts - 1
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

  private async claim(channel: Channel, limit: number): Promise<{ all: number; open: number[] }> {
    const now = this.clock.now();
    const rows = await this.sql.returning<{ id: number }>(CLAIM, [now, channel, limit]);
    const ids = rows.map(({ id }) => id);
    const closed = await this.sql.returning<{ id: number }>(CLOSE, [now, JSON.stringify(ids)]);
    const shut = new Set(closed.map(({ id }) => id));
    return { all: ids.length, open: ids.filter((id) => !shut.has(id)) };
  }

  /** The words are read once for the many messages that share them. */
  private async messages(ids: number[]): Promise<OutboundMessage[]> {
    type Words = Pick<OutboundMessage, 'lang' | 'subject' | 'text' | 'html'>;
    type Row = Omit<OutboundMessage, keyof Words | 'isToStaff'> & { payloadId: number; isToStaff: 0 | 1 };
    const rows = await this.sql.all<Row>(MESSAGE, [JSON.stringify(ids)]);
    const wanted = [...new Set(rows.map(({ payloadId }) => payloadId))];
    const payloads = await this.sql.all<Words & { payloadId: number }>(PAYLOAD, [JSON.stringify(wanted)]);
    const words = new Map(payloads.map(({ payloadId, ...rest }) => [payloadId, rest]));
    return rows.map(({ payloadId, isToStaff, ...row }) => ({
      ...row,
      isToStaff: isToStaff === 1,
      ...words.get(payloadId)!,
    }));
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
