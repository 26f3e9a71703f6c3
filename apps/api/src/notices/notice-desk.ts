import { Injectable } from '@nestjs/common';
import { requireOwnDistrict } from '../auth/own-district';
import type { SignedIn } from '../auth/signed-in';
import { fromIso } from '../common/instants';
import { Problem } from '../common/problem';
import type { NoticeByHand, NoticeDraft, NoticeEnding } from './dto/notice-input.dto';
import type { NoticePreview } from './dto/notice-preview.dto';
import type { NoticeDetail } from './dto/notice.dto';
import { NoticeLogService } from './notice-log.service';
import { NoticesService } from './notices.service';

/** What an officer does without a proposal: a notice by hand, and ending one that is in force. */
@Injectable()
export class NoticeDesk {
  constructor(
    private readonly notices: NoticesService,
    private readonly log: NoticeLogService,
  ) {}

  /** A notice by hand exactly as it would go out. */
  preview({ districtId, kind, expiresAt }: NoticeDraft, by: SignedIn): Promise<NoticePreview> {
    requireOwnDistrict(by, districtId);
    return this.notices.preview({ districtId, kind, act: 'begin', expiresAt: readInstant(expiresAt) });
  }

  /** Issues a notice by hand. */
  async issue(notice: NoticeByHand, by: SignedIn): Promise<NoticeDetail> {
    requireOwnDistrict(by, notice.districtId);
    await this.notices.requirePassword(notice.kind, by, notice.password);
    const { districtId, kind, reason, previewHash, requestKey } = notice;
    const expiresAt = readInstant(notice.expiresAt);
    const { id } = await this.notices.issue({
      ...{ districtId, kind, origin: 'by hand', reason, by, expiresAt, previewHash, requestKey },
    });
    return this.log.detail(id);
  }

  /** The message that would tell subscribers of the end. */
  async previewEnd(id: number, by: SignedIn): Promise<NoticePreview> {
    requireOwnDistrict(by, (await this.notices.find(id)).districtId);
    return this.notices.previewEnd(id);
  }

  /** Ends a notice before its written end. */
  async end(noticeId: number, ending: NoticeEnding, by: SignedIn): Promise<NoticeDetail> {
    const { kind, districtId } = await this.notices.find(noticeId);
    requireOwnDistrict(by, districtId);
    await this.notices.requirePassword(kind, by, ending.password);
    const { reason, version, previewHash, requestKey } = ending;
    await this.notices.end({ noticeId, by, reason, version, previewHash, requestKey });
    return this.log.detail(noticeId);
  }
}

function readInstant(text: string): number {
  const instant = fromIso(text);
  if (instant !== undefined) return instant;
  const cure = 'Write an instant with its offset, such as 2026-01-15T11:00:00-07:00.';
  throw new Problem('invalid', cure, { errors: [{ field: 'expiresAt', text: cure }] });
}
