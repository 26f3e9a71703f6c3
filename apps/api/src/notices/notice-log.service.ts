import type { NoticeKind, NoticeState } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { requireOwnDistrict } from '../auth/own-district';
import type { SignedIn } from '../auth/signed-in';
import { fromIso, toIso } from '../common/instants';
import { offsetOf, type Page } from '../common/paging';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import type { OutboxRow } from '../outbox/dto/outbox-row.dto';
import { OutboxService } from '../outbox/outbox.service';
import { showEvidence } from '../rules/dto/evidence.dto';
import { EvidenceService } from '../rules/evaluation/evidence.service';
import type { DeliveryQuery, NoticeQuery } from './dto/notice-input.dto';
import type { NoticeTexts } from './dto/notice-text.dto';
import type { NoticeBrief, NoticeDetail } from './dto/notice.dto';
import { NoticeEvents } from './notice-events';
import { topicOf } from './notice-recipients';

interface Row {
  id: number;
  ref: string;
  districtId: number;
  districtName: string;
  kind: NoticeKind;
  state: NoticeState;
  issuedAt: number;
  issuedBy: string;
  effectiveAt: number;
  expiresAt: number;
  endedAt: number | null;
  endedBy: string | null;
  endReason: string | null;
  version: number;
  origin: 'proposal' | 'by hand';
  reason: string;
  texts: string;
  evidenceId: number | null;
}

const FROM = `FROM notice n JOIN district d ON d.id = n.district_id JOIN user i ON i.id = n.issued_by
  LEFT JOIN user e ON e.id = n.ended_by`;
const SELECT = `SELECT n.id, n.ref, n.district_id districtId, d.name districtName, n.kind, n.state, n.issued_at issuedAt,
  i.name issuedBy, n.effective_at effectiveAt, n.expires_at expiresAt, n.ended_at endedAt, e.name endedBy,
  n.end_reason endReason, n.version, n.origin, n.reason, n.texts, n.evidence_id evidenceId ${FROM}`;
const WHERE = `WHERE ($districtId IS NULL OR n.district_id = $districtId) AND ($kind IS NULL OR n.kind = $kind)
  AND ($state IS NULL OR n.state = $state) AND ($from IS NULL OR n.issued_at >= $from) AND ($to IS NULL OR n.issued_at < $to)
  AND ($q IS NULL OR instr(lower(n.ref || ' ' || n.reason || ' ' || coalesce(n.end_reason, '') || ' ' || n.texts), lower($q)) > 0)`;

/** The notice log: what was issued, how it ended, who got it. */
@Injectable()
export class NoticeLogService {
  constructor(
    private readonly sql: Sql,
    private readonly events: NoticeEvents,
    private readonly evidence: EvidenceService,
    private readonly outbox: OutboxService,
  ) {}

  /** One page of notices, newest first. */
  async page(query: NoticeQuery): Promise<Page<NoticeBrief>> {
    const { districtId = null, kind = null, state = null, page, pageSize } = query;
    const bind = {
      ...{ districtId, kind, state, q: query.q?.trim() || null },
      ...{ from: instantOf(query.from, 'from'), to: instantOf(query.to, 'to') },
    };
    const counted = await this.sql.get<{ n: number }>(`SELECT count(*) n ${FROM} ${WHERE}`, bind);
    const rows = await this.sql.all<Row>(
      `${SELECT} ${WHERE} ORDER BY n.issued_at DESC, n.id DESC LIMIT $limit OFFSET $offset`,
      { ...bind, limit: pageSize, offset: offsetOf(query) },
    );
    return { items: rows.map(brief), total: counted?.n ?? 0, page, pageSize };
  }

  /** Notices of a district that were in force at some time in [from, to], UTC epoch seconds, oldest first. */
  async between(districtId: number, from: number, to: number): Promise<NoticeBrief[]> {
    const rows = await this.sql.all<Row>(
      `${SELECT} WHERE n.district_id = $1 AND n.effective_at <= $3 AND coalesce(n.ended_at, n.expires_at) >= $2
       ORDER BY n.effective_at LIMIT 500`,
      [districtId, from, to],
    );
    return rows.map(brief);
  }

  /** Notices in force now, by district. */
  async inForce(now: number): Promise<NoticeBrief[]> {
    const rows = await this.sql.all<Row>(
      `${SELECT} WHERE n.state = 'in force' AND n.expires_at > $1 ORDER BY d.name, n.kind DESC`,
      [now],
    );
    return rows.map(brief);
  }

  /** One notice with its texts, events, evidence and delivery; 404 without it. */
  async detail(id: number): Promise<NoticeDetail> {
    const row = await this.sql.get<Row>(`${SELECT} WHERE n.id = $1`, [id]);
    if (!row) throw new Problem('not-found', `There is no notice ${id}.`);
    return {
      ...brief(row),
      ...{ origin: row.origin, reason: row.reason, texts: JSON.parse(row.texts) as NoticeTexts },
      ...(row.evidenceId !== null && { evidence: showEvidence(await this.evidence.read(row.evidenceId)) }),
      events: await this.events.list(id),
      delivery: await this.outbox.counts(topicOf(id)),
    };
  }

  /** One page of a notice's messages with masked addresses; officers see their own districts'. */
  async deliveries(id: number, query: DeliveryQuery, by: SignedIn): Promise<Page<OutboxRow>> {
    const { districtId } = await this.detail(id);
    requireOwnDistrict(by, districtId);
    return this.outbox.page(topicOf(id), query);
  }
}

function brief(row: Row): NoticeBrief {
  const { id, ref, districtId, districtName, kind, state, issuedBy, version } = row;
  return {
    ...{ id, ref, districtId, districtName, kind, state, issuedBy, version },
    ...{
      issuedAt: toIso(row.issuedAt),
      effectiveAt: toIso(row.effectiveAt),
      expiresAt: toIso(row.expiresAt),
    },
    ...(row.endedAt !== null && { endedAt: toIso(row.endedAt) }),
    ...(row.endedBy !== null && { endedBy: row.endedBy }),
    ...(row.endReason !== null && { endReason: row.endReason }),
  };
}

function instantOf(text: string | undefined, field: string): number | null {
  if (text === undefined) return null;
  const instant = fromIso(text);
  if (instant !== undefined) return instant;
  const cure = 'Write an instant with its offset, such as 2026-01-15T00:00:00-07:00.';
  throw new Problem('invalid', cure, { errors: [{ field, text: cure }] });
}
