import { Injectable } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { OutboxService } from '../outbox/outbox.service';
import type { NoticeEventDto } from './dto/notice.dto';
import type { Notice } from './models/notice.model';
import { topicOf } from './notice-recipients';

type Kind = 'issued' | 'ended' | 'expired' | 'replaced';

const SELECT = `SELECT e.seq, e.kind, e.at, u.name, e.body FROM notice_event e LEFT JOIN user u ON u.id = e.by_user
  WHERE e.notice_id = $1 ORDER BY e.seq`;
const DONE: Record<string, string> = {
  issued: 'Already issued',
  ended: 'Already ended',
  expired: 'Already over',
  replaced: 'Already replaced',
};

/** What happened to each notice, append-only. */
@Injectable()
export class NoticeEvents {
  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly outbox: OutboxService,
    private readonly emitter: EventEmitter2,
    private readonly clock: Clock,
  ) {}

  /** Adds an event in the running transaction and tells the house after its commit; returns its number. */
  async add(
    notice: Notice,
    kind: Kind,
    by: SignedIn | null,
    text: string,
    requestKey?: string,
  ): Promise<number> {
    const last = await this.sql.get<{ seq: number }>(
      'SELECT coalesce(max(seq), 0) seq FROM notice_event WHERE notice_id = $1',
      [notice.id],
    );
    const seq = (last?.seq ?? 0) + 1;
    await this.sql.run(
      `INSERT INTO notice_event (notice_id, seq, kind, at, by_user, body, request_key) VALUES ($1, $2, $3, $4, $5, $6, $7)`,
      [notice.id, seq, kind, this.clock.now(), by?.id ?? null, JSON.stringify({ text }), requestKey ?? null],
    );
    this.work.afterCommit(() =>
      this.emitter.emit('notice.changed', { noticeId: notice.id, districtId: notice.districtId }),
    );
    return seq;
  }

  /** The notice a request key was used on; undefined when it was not used. */
  async noticeOf(requestKey: string): Promise<number | undefined> {
    const row = await this.sql.get<{ id: number }>(
      'SELECT notice_id id FROM notice_event WHERE request_key = $1',
      [requestKey],
    );
    return row?.id;
  }

  /** Every event of a notice, oldest first. */
  async list(noticeId: number): Promise<NoticeEventDto[]> {
    const rows = await this.sql.all<{
      seq: number;
      kind: string;
      at: number;
      name: string | null;
      body: string;
    }>(SELECT, [noticeId]);
    return rows.map(({ seq, kind, at, name, body }) => ({
      ...{ seq, kind, at: toIso(at), by: name ?? 'the service' },
      text: (JSON.parse(body) as { text: string }).text,
    }));
  }

  /** What to tell the second of two people: what the first did, who and when. */
  async alreadyDone(notice: Notice): Promise<Problem> {
    const last = (await this.list(notice.id)).at(-1);
    if (!last)
      return new Problem('changed-meanwhile', 'This notice was changed. Load it again, then decide.');
    const said = `${DONE[last.kind] ?? 'Already done'} by ${last.by} at ${last.at}.`;
    return new Problem('already-done', said, { by: last.by, at: last.at, noticeId: notice.id });
  }

  /** Sends nothing more of what still waits about a notice. */
  async silence({ id }: Notice): Promise<void> {
    await this.outbox.suppressQueued(
      topicOf(id),
      Number.MAX_SAFE_INTEGER,
      'the notice is no longer in force',
    );
  }
}
