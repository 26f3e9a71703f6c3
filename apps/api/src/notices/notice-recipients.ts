import type { NoticeKind } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import { OutboxService } from '../outbox/outbox.service';
import type { RecipientCount } from './dto/notice-preview.dto';
import type { NoticeTexts } from './dto/notice-text.dto';

/** Everybody who wants this kind of notice for this district and can be reached: $1 district, $2 kind. */
const REACHABLE = `FROM subscription s
  JOIN person p ON p.id = s.person_id AND p.left_at IS NULL
  JOIN contact c ON c.person_id = s.person_id AND c.confirmed_at IS NOT NULL AND c.stopped_at IS NULL AND c.address IS NOT NULL
  WHERE s.district_id = $1 AND s.kind = $2`;

const PRIORITY: Record<NoticeKind, number> = { burnBan: 2, advisory: 1 };

/** What goes to whom. */
export interface Mailing {
  noticeId: number;
  /** The event this is about; each event is sent once. */
  revision: number;
  districtId: number;
  kind: NoticeKind;
  texts: NoticeTexts;
  /** Not sent any more after this instant, UTC epoch seconds. */
  notAfter: number;
}

/** The messages of a notice. */
export const topicOf = (noticeId: number): string => `notice:${noticeId}`;

/** Who a notice goes to, and its way into the outbox. */
@Injectable()
export class NoticeRecipients {
  constructor(
    private readonly sql: Sql,
    private readonly outbox: OutboxService,
  ) {}

  /** How many people and addresses a notice would go to now. */
  async count(districtId: number, kind: NoticeKind): Promise<RecipientCount> {
    const row = await this.sql.get<RecipientCount>(
      `SELECT count(DISTINCT s.person_id) people, count(*) FILTER (WHERE c.channel = 'email') emails,
              count(*) FILTER (WHERE c.channel = 'sms') texts ${REACHABLE}`,
      [districtId, kind],
    );
    return row!;
  }

  /** Queues a notice's messages in the running transaction, in place of any that still wait; says how many. */
  async queue({ noticeId, revision, districtId, kind, texts, notAfter }: Mailing): Promise<number> {
    const topic = topicOf(noticeId);
    await this.outbox.suppressQueued(topic, revision, 'a newer message about this notice takes its place');
    return this.outbox.enqueueMany({
      topic,
      revision,
      payloads: (['en', 'es'] as const).flatMap((lang) => {
        const { subject, mailText, mailHtml, sms } = texts[lang];
        return [
          { channel: 'email' as const, lang, subject, text: mailText, html: mailHtml },
          { channel: 'sms' as const, lang, subject: null, text: sms, html: null },
        ];
      }),
      recipientsSql: `SELECT c.id contact_id, c.channel channel, p.lang lang ${REACHABLE}`,
      bind: [districtId, kind],
      priority: PRIORITY[kind],
      notAfter,
    });
  }
}
