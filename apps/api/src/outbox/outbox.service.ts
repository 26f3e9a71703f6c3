import { Injectable } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { maskedAddress } from '../common/masked-address';
import { offsetOf, type Page, type PageQuery } from '../common/paging';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import type { Channel } from './channel';
import type { OutboxRow, OutboxState } from './dto/outbox-row.dto';

/** The words of a message in one channel and language, kept once for all who get them. */
export interface Payload {
  channel: Channel;
  lang: string;
  subject: string | null;
  text: string;
  html: string | null;
}

/** One revision of a topic, to everybody a query names. */
export interface Broadcast {
  topic: string;
  revision: number;
  payloads: Payload[];
  /** A SELECT giving `contact_id`, `channel` and `lang`. */
  recipientsSql: string;
  /** Values for its `$1 $2 …`. */
  bind: unknown[];
  /** Higher goes first. */
  priority: number;
  /** Not sent any more after this instant, UTC epoch seconds. */
  notAfter: number;
}

/** One message to one contact. */
export interface Letter {
  topic: string;
  contactId: number;
  channel: Channel;
  lang: string;
  message: { subject: string; text: string; html?: string };
  notAfter: number;
}

const LETTER_PRIORITY = 3;
const KEEP_PAYLOADS = `INSERT INTO payload (topic, revision, channel, lang, subject, text, html)
  SELECT $1, $2, value->>'channel', value->>'lang', value->>'subject', value->>'text', value->>'html' FROM json_each($3)`;
const COLUMNS =
  'topic, revision, contact_id, payload_id, channel, priority, state, created_at, next_at, not_after, message_id';

/** Messages that wait to be sent, are under way, or were sent; it knows topics, not what they are about. */
@Injectable()
export class OutboxService {
  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly events: EventEmitter2,
  ) {}

  /** Queues a revision of a topic for every recipient, in the running transaction; says how many. */
  async enqueueMany(broadcast: Broadcast): Promise<number> {
    const { topic, revision, payloads, recipientsSql, bind, priority, notAfter } = broadcast;
    await this.sql.run(KEEP_PAYLOADS, [topic, revision, JSON.stringify(payloads)]);
    const n = bind.length;
    const queued = await this.sql.run(
      `INSERT INTO outbox (${COLUMNS})
       SELECT $${n + 1}, $${n + 2}, r.contact_id, p.id, r.channel, $${n + 3}, 'queued', $${n + 4}, $${n + 4}, $${n + 5}, lower(hex(randomblob(16)))
       FROM (${recipientsSql}) r
       JOIN payload p ON p.topic = $${n + 1} AND p.revision = $${n + 2} AND p.channel = r.channel AND p.lang = r.lang`,
      [...bind, topic, revision, priority, this.clock.now(), notAfter],
    );
    this.announce();
    return queued;
  }

  /** Queues one message as the next revision of its topic, in the running transaction. */
  async enqueueOne({ topic, contactId, channel, lang, message, notAfter }: Letter): Promise<void> {
    const last = await this.sql.get<{ revision: number }>(
      'SELECT coalesce(max(revision), 0) revision FROM payload WHERE topic = $1',
      [topic],
    );
    const { subject, text, html = null } = message;
    await this.enqueueMany({
      ...{ topic, revision: (last?.revision ?? 0) + 1, priority: LETTER_PRIORITY, notAfter },
      payloads: [{ channel, lang, subject, text, html }],
      recipientsSql: 'SELECT $1 contact_id, $2 channel, $3 lang',
      bind: [contactId, channel, lang],
    });
  }

  /** How many messages of a topic were queued since an instant. */
  async countSince(topic: string, since: number): Promise<number> {
    const row = await this.sql.get<{ n: number }>(
      'SELECT count(*) n FROM outbox WHERE topic = $1 AND created_at >= $2',
      [topic, since],
    );
    return row?.n ?? 0;
  }

  /** Sends no message of a topic any more that is older than a revision: neither what waits nor a later attempt. */
  async suppressQueued(topic: string, beforeRevision: number, detail: string): Promise<void> {
    await this.sql.run(
      `INSERT INTO outbox_topic (topic, silent_before) VALUES ($1, $2)
       ON CONFLICT DO UPDATE SET silent_before = max(silent_before, excluded.silent_before)`,
      [topic, beforeRevision],
    );
    await this.sql.run(
      `UPDATE outbox SET state = 'suppressed', settled_at = $3, detail = $4
       WHERE topic = $1 AND revision < $2 AND state = 'queued'`,
      [topic, beforeRevision, this.clock.now(), detail],
    );
  }

  /** How many messages of a topic stand where, by channel. */
  counts(topic: string): Promise<{ channel: Channel; state: OutboxState; count: number }[]> {
    return this.sql.all(
      'SELECT channel, state, count(*) count FROM outbox WHERE topic = $1 GROUP BY channel, state ORDER BY channel, state',
      [topic],
    );
  }

  /** One page of a topic's messages, newest revision first, with masked addresses. */
  async page(
    topic: string,
    query: PageQuery & { state?: OutboxState; channel?: Channel },
  ): Promise<Page<OutboxRow>> {
    const { state = null, channel = null, page, pageSize } = query;
    const where = 'o.topic = $1 AND ($2 IS NULL OR o.state = $2) AND ($3 IS NULL OR o.channel = $3)';
    const counted = await this.sql.get<{ n: number }>(`SELECT count(*) n FROM outbox o WHERE ${where}`, [
      topic,
      state,
      channel,
    ]);
    const rows = await this.sql.all<
      Omit<OutboxRow, 'to' | 'lastAt'> & { address: string | null; at: number | null }
    >(
      `SELECT o.id, o.channel, coalesce(u.email, c.address) address, o.state, o.attempts, o.detail,
         coalesce(o.settled_at, (SELECT max(a.at) FROM attempt a WHERE a.outbox_id = o.id)) at
       FROM outbox o JOIN contact c ON c.id = o.contact_id LEFT JOIN user u ON u.id = c.user_id WHERE ${where}
       ORDER BY o.revision DESC, o.id LIMIT $4 OFFSET $5`,
      [topic, state, channel, pageSize, offsetOf(query)],
    );
    const items = rows.map(({ address, at, ...row }) => ({
      ...row,
      ...{ to: maskedAddress(row.channel, address), lastAt: at === null ? null : toIso(at) },
    }));
    return { items, total: counted?.n ?? 0, page, pageSize };
  }

  private announce(): void {
    this.work.afterCommit(() => this.events.emit('outbox.queued'));
  }
}
