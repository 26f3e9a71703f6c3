import type { NoticeKind } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import { AuthService } from '../auth/auth.service';
import { requireOwnDistrict } from '../auth/own-district';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { UnitOfWork } from '../database/unit-of-work';
import type { NoticePreview } from './dto/notice-preview.dto';
import { Notice } from './models/notice.model';
import { NoticeComposer, type NoticeSubject } from './notice-composer';
import { NoticeEvents } from './notice-events';
import { NoticeExpiry } from './notice-expiry';
import { NoticeRecipients } from './notice-recipients';
import { refuseEnd, writtenEnd } from './written-end';
import { smsSize } from './texts/sms-segments';

/** A notice to be issued. */
export interface IssueOrder {
  districtId: number;
  kind: NoticeKind;
  origin: 'proposal' | 'by hand';
  reason: string;
  by: SignedIn;
  /** Written end, UTC epoch seconds. */
  expiresAt: number;
  evidenceId?: number | null;
  previewHash: string;
  requestKey: string;
}

/** A notice to be ended. */
export interface EndOrder {
  noticeId: number;
  by: SignedIn;
  reason: string;
  version: number;
  previewHash: string;
  requestKey: string;
}

const NAMES: Record<NoticeKind, string> = { advisory: 'advisory', burnBan: 'burn ban' };
const END_MESSAGE_S = 12 * 3600;

/** Notices: issued and ended by an officer, whole or not at all. */
@Injectable()
export class NoticesService {
  constructor(
    @InjectModel(Notice) private readonly notices: typeof Notice,
    private readonly composer: NoticeComposer,
    private readonly events: NoticeEvents,
    private readonly recipients: NoticeRecipients,
    private readonly expiry: NoticeExpiry,
    private readonly auth: AuthService,
    private readonly activity: ActivityService,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** The notices in force in a district now: at most one of each kind. */
  async inForce(districtId: number): Promise<Notice[]> {
    const all = await this.notices.findAll({ where: { districtId, state: 'in force' } });
    return all.filter(({ expiresAt }) => expiresAt > this.clock.now());
  }

  /** One notice; 404 without it. */
  async find(id: number): Promise<Notice> {
    const notice = await this.notices.findByPk(id);
    if (!notice) throw new Problem('not-found', `There is no notice ${id}.`);
    return notice;
  }

  /** A notice exactly as it would go out now, and to how many. */
  async preview(subject: NoticeSubject): Promise<NoticePreview> {
    if (subject.act === 'begin') refuseEnd(subject.expiresAt, this.clock.now());
    const { ref, texts, hash } = await this.composer.compose(subject);
    const { kind, act, districtId, expiresAt } = subject;
    return {
      ...{ kind, act, districtId, ref, hash, texts, expiresAt: toIso(expiresAt) },
      recipients: await this.recipients.count(districtId, kind),
      segments: { en: smsSize(texts.en.sms).segments, es: smsSize(texts.es.sms).segments },
      needsPassword: kind === 'burnBan',
    };
  }

  /** The preview of the message that a notice has ended. */
  async previewEnd(noticeId: number): Promise<NoticePreview> {
    const { districtId, kind, expiresAt, ref } = await this.find(noticeId);
    return this.preview({ districtId, kind, act: 'end', expiresAt, ref });
  }

  /** Asks for the officer's password again where the kind needs it. Call it before the transaction. */
  async requirePassword(kind: NoticeKind, by: SignedIn, password: string | undefined): Promise<void> {
    if (kind !== 'burnBan') return;
    if (!password) throw new Problem('password-needed', 'A burn ban asks for your password again.');
    if (!(await this.auth.verifyPassword(by.id, password)))
      throw new Problem('password-wrong', 'That is not your password. Nothing was sent.', {
        errors: [{ field: 'password', text: 'That is not your password.' }],
      });
  }

  /**
   * Issues a notice: its row, event, activity entry and one message per recipient in one transaction (the caller's,
   * if there is one). Throws 409 `already-done` when one of its kind is in force, 409 `preview-out-of-date` when the
   * words are no longer those that were seen. The same request key again gives the same notice.
   */
  issue(order: IssueOrder): Promise<Notice> {
    requireOwnDistrict(order.by, order.districtId);
    return this.work.run(async () => {
      const before = await this.events.noticeOf(order.requestKey);
      if (before !== undefined) return this.find(before);
      const now = this.clock.now();
      const expiresAt = writtenEnd(order.expiresAt, now);
      await this.expiry.closeDue();
      await this.makeRoom(order, now);
      const composed = await this.composer.compose({ ...order, act: 'begin', expiresAt });
      refuseOther(composed.hash, order.previewHash);
      const { districtId, kind, origin, reason, by, evidenceId = null } = order;
      const notice = await this.notices.create({
        ...{
          ref: composed.ref,
          districtId,
          kind,
          origin,
          reason,
          evidenceId,
          expiresAt,
          state: 'in force',
          version: 1,
        },
        ...{ issuedAt: now, issuedBy: by.id, effectiveAt: now, texts: JSON.stringify(composed.texts) },
      });
      const revision = await this.events.add(notice, 'issued', by, reason, order.requestKey);
      const queued = await this.recipients.queue({
        ...{ noticeId: notice.id, revision, districtId, kind, texts: composed.texts, notAfter: expiresAt },
      });
      await this.record(`issued an ${origin === 'by hand' ? 'unproposed ' : ''}${NAMES[kind]}`, notice, by, {
        reason,
        queued,
      });
      return notice;
    });
  }

  /**
   * Ends a notice before its written end and tells its subscribers, in one transaction (the caller's, if there is
   * one). Throws 409 `already-done` when it is no longer in force, 409 `changed-meanwhile` when it was changed.
   */
  end(order: EndOrder): Promise<Notice> {
    return this.work.run(async () => {
      const notice = await this.find(order.noticeId);
      requireOwnDistrict(order.by, notice.districtId);
      if ((await this.events.noticeOf(order.requestKey)) === notice.id) return notice;
      const { districtId, kind, expiresAt, ref } = notice;
      const { texts, hash } = await this.composer.compose({ districtId, kind, act: 'end', expiresAt, ref });
      const now = this.clock.now();
      const [changed] = await this.notices.update(
        {
          state: 'ended',
          endedAt: now,
          endedBy: order.by.id,
          endReason: order.reason,
          version: order.version + 1,
        },
        { where: { id: notice.id, version: order.version, state: 'in force' } },
      );
      if (changed === 0) throw await this.events.alreadyDone(notice);
      refuseOther(hash, order.previewHash);
      const revision = await this.events.add(notice, 'ended', order.by, order.reason, order.requestKey);
      await this.recipients.queue({
        ...{ noticeId: notice.id, revision, districtId, kind, texts, notAfter: now + END_MESSAGE_S },
      });
      await this.record(`ended the ${NAMES[kind]}`, notice, order.by, { reason: order.reason });
      return this.find(notice.id);
    });
  }

  /** A burn ban takes an advisory's place; nothing takes a burn ban's, and one of a kind is enough. */
  private async makeRoom({ districtId, kind, by }: IssueOrder, now: number): Promise<void> {
    for (const other of await this.notices.findAll({ where: { districtId, state: 'in force' } })) {
      if (other.kind === kind) throw await this.events.alreadyDone(other);
      if (other.kind === 'burnBan')
        throw new Problem(
          'not-possible-now',
          `The burn ban ${other.ref} is in force here; an advisory would say less than it does.`,
        );
      await other.update({ state: 'replaced', endedAt: now, endedBy: by.id, version: other.version + 1 });
      await this.events.add(other, 'replaced', by, 'A burn ban took its place.');
      await this.events.silence(other);
    }
  }

  private async record(act: string, notice: Notice, by: SignedIn, body: object): Promise<void> {
    const { id, ref, districtId } = notice;
    await this.activity.record({
      actor: by,
      act,
      subject: `notice ${id}`,
      districtId,
      body: { ref, ...body },
    });
  }
}

function refuseOther(hash: string, seen: string): void {
  if (hash === seen) return;
  throw new Problem(
    'preview-out-of-date',
    'The text has changed since you saw it. Read it again, then decide. Nothing was sent.',
  );
}
