import { openProposalStates, type ProposalState } from '@lidwatch/contracts';
import type { NoticeKind } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import type { SignedIn } from '../auth/signed-in';
import { toIso } from '../common/instants';
import { offsetOf } from '../common/paging';
import { Sql } from '../database/sql';
import type { EvidenceBody } from '../rules/evaluation/evidence.service';
import type { ProposalQuery } from './dto/decisions.dto';
import { summaryOf } from '../rules/dto/evidence.dto';
import type { ProposalCard, ProposalPage } from './dto/proposal.dto';

interface Row {
  id: number;
  districtId: number;
  districtName: string;
  kind: NoticeKind;
  act: 'begin' | 'end';
  state: ProposalState;
  openedAt: number;
  tEnd: number;
  evidence: string;
  confirmedBy: string | null;
  confirmedAt: number | null;
  note: string | null;
  reason: string | null;
  closedBy: string | null;
  closedAt: number | null;
  noticeId: number | null;
  version: number;
}

const FROM = `FROM proposal p JOIN district d ON d.id = p.district_id JOIN evidence e ON e.id = p.evidence_id
  LEFT JOIN user c ON c.id = p.confirmed_by LEFT JOIN user x ON x.id = p.closed_by
  WHERE ($states IS NULL OR p.state IN (SELECT value FROM json_each($states)))
    AND ($districts IS NULL OR p.district_id IN (SELECT value FROM json_each($districts)))
    AND ($confirmed = 0 OR p.confirmed_at IS NOT NULL) AND ($id IS NULL OR p.id = $id)`;
const CARDS = `SELECT p.id, p.district_id districtId, d.name districtName, p.kind, p.act, p.state, p.opened_at openedAt,
  p.t_end tEnd, e.body evidence, c.name confirmedBy, p.confirmed_at confirmedAt, p.note, p.reason, x.name closedBy,
  p.closed_at closedAt, p.notice_id noticeId, p.version ${FROM} ORDER BY p.opened_at DESC, p.id DESC
  LIMIT $limit OFFSET $offset`;

/** Which proposals a person may see: officers those of their districts that an analyst has confirmed. */
const seenBy = (user: SignedIn) => ({
  confirmed: Number(user.role === 'officer'),
  own: user.role === 'officer' ? user.districtIds : null,
});

/** Proposals as lists show them. */
@Injectable()
export class ProposalCards {
  constructor(private readonly sql: Sql) {}

  /** A page of the proposals a person may see, newest first. */
  async page(query: ProposalQuery, user: SignedIn): Promise<ProposalPage> {
    const { page, pageSize } = query;
    const { confirmed, own } = seenBy(user);
    const wanted = query.districtId === undefined ? null : [query.districtId];
    const districts = own && wanted ? own.filter((id) => id === wanted[0]) : (own ?? wanted);
    const states = query.state === 'waiting' ? openProposalStates : query.state && [query.state];
    const bind = {
      states: states ? JSON.stringify(states) : null,
      districts: districts && JSON.stringify(districts),
      ...{ confirmed, id: null },
    };
    const counted = await this.sql.get<{ n: number }>(`SELECT count(*) n ${FROM}`, bind);
    const rows = await this.sql.all<Row>(CARDS, { ...bind, limit: pageSize, offset: offsetOf(query) });
    return { items: rows.map(cardOf), total: counted?.n ?? 0, page, pageSize };
  }

  /** Every proposal that waits for somebody and that a person may see, newest first. */
  async waiting(user: SignedIn): Promise<ProposalCard[]> {
    const query = { state: 'waiting' as const, page: 1, pageSize: 200 };
    return (await this.page(query, user)).items;
  }

  /** One proposal as a card, whoever asks. */
  async one(id: number): Promise<ProposalCard> {
    const bind = { states: null, districts: null, confirmed: 0, id, limit: 1, offset: 0 };
    const [row] = await this.sql.all<Row>(CARDS, bind);
    if (!row)
      throw new Error(`Proposal ${id} lost its district or evidence. Restore the store from a backup.`);
    return cardOf(row);
  }
}

function cardOf(row: Row): ProposalCard {
  const {
    evidence,
    openedAt,
    tEnd,
    confirmedBy,
    confirmedAt,
    note,
    reason,
    closedBy,
    closedAt,
    noticeId,
    ...same
  } = row;
  return {
    ...same,
    ...{
      openedAt: toIso(openedAt),
      tEnd: toIso(tEnd),
      summary: summaryOf(JSON.parse(evidence) as EvidenceBody),
    },
    ...(confirmedBy !== null && { confirmedBy }),
    ...(confirmedAt !== null && { confirmedAt: toIso(confirmedAt) }),
    ...(note && { note }),
    ...(reason && { reason }),
    ...(closedBy !== null && { closedBy }),
    ...(closedAt !== null && { closedAt: toIso(closedAt) }),
    ...(noticeId !== null && { noticeId }),
  };
}
