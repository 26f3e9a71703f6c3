import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import type { NoticePreview } from '../notices/dto/notice-preview.dto';
import type { NoticeDetail } from '../notices/dto/notice.dto';
import { NoticeLogService } from '../notices/notice-log.service';
import type { Notice } from '../notices/models/notice.model';
import { NoticesService } from '../notices/notices.service';
import { RulesService } from '../rules/rules.service';
import type { IssueProposal } from './dto/decisions.dto';
import { Proposal } from './models/proposal.model';
import { ProposalDecisions } from './proposal-decisions';
import { writtenEnd } from './written-end';

/** Turns a confirmed proposal into a notice in force, or into the end of one. */
@Injectable()
export class ProposalIssuing {
  constructor(
    @InjectModel(Proposal) private readonly proposals: typeof Proposal,
    private readonly decisions: ProposalDecisions,
    private readonly notices: NoticesService,
    private readonly log: NoticeLogService,
    private readonly rules: RulesService,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** What would go out, to whom, and its hash. */
  async preview(id: number, by: SignedIn, expiresAt?: string): Promise<NoticePreview> {
    const proposal = await this.decisions.find(id, by);
    const { districtId, kind, act, evidenceId } = proposal;
    if (act === 'end') return this.notices.previewEnd((await this.noticeToEnd(proposal)).id);
    const end = writtenEnd(proposal, await this.rules.body(proposal.ruleId), expiresAt, this.clock.now());
    return this.notices.preview({ districtId, kind, act, expiresAt: end, evidenceId });
  }

  /**
   * Issues (or ends) what was previewed: the proposal, the notice, its event, its messages and the record in one
   * transaction. A burn ban asks for the officer's password again.
   */
  async issue(id: number, by: SignedIn, wanted: IssueProposal): Promise<NoticeDetail> {
    const proposal = await this.decisions.find(id, by);
    if (proposal.state === 'issued') return this.issuedBefore(proposal, by, wanted);
    await this.notices.requirePassword(proposal.kind, by, wanted.password);
    const noticeId = await this.work.run(async () => {
      const closed = this.decisions.closedBy(by);
      await this.decisions.decide(id, by, 'issue', wanted.version, closed, reasonOf(proposal));
      const notice =
        proposal.act === 'begin'
          ? await this.begin(proposal, by, wanted)
          : await this.end(proposal, by, wanted);
      await this.proposals.update({ noticeId: notice.id }, { where: { id } });
      return notice.id;
    });
    return this.log.detail(noticeId);
  }

  private async begin(proposal: Proposal, by: SignedIn, wanted: IssueProposal): Promise<{ id: number }> {
    const { districtId, kind, evidenceId } = proposal;
    const { previewHash, requestKey } = wanted;
    const expiresAt = writtenEnd(
      proposal,
      await this.rules.body(proposal.ruleId),
      wanted.expiresAt,
      this.clock.now(),
    );
    return this.notices.issue({
      ...{ districtId, kind, evidenceId, expiresAt, previewHash, requestKey, by },
      ...{ origin: 'proposal', reason: reasonOf(proposal) },
    });
  }

  private async end(proposal: Proposal, by: SignedIn, wanted: IssueProposal): Promise<{ id: number }> {
    const notice = await this.noticeToEnd(proposal);
    const { previewHash, requestKey } = wanted;
    await this.notices.end({
      ...{ noticeId: notice.id, version: notice.version, by, previewHash, requestKey },
      reason: reasonOf(proposal),
    });
    return notice;
  }

  /** The same request again gets the same answer; anybody else is told who was first. */
  private async issuedBefore(proposal: Proposal, by: SignedIn, wanted: IssueProposal): Promise<NoticeDetail> {
    const { id, noticeId } = proposal;
    const same = await this.sql.get(
      'SELECT 1 FROM notice_event WHERE notice_id = $1 AND request_key = $2 AND by_user = $3',
      [noticeId, wanted.requestKey, by.id],
    );
    if (!same) await this.decisions.decide(id, by, 'issue', wanted.version, {}, '');
    return this.log.detail(noticeId!);
  }

  private async noticeToEnd({ districtId, kind }: Proposal): Promise<Notice> {
    const notice = (await this.notices.inForce(districtId)).find((each) => each.kind === kind);
    if (notice) return notice;
    throw new Problem('not-possible-now', 'The notice this would end is no longer in force.');
  }
}

/** The reason that goes with the notice: the analyst's sentence, or that the rule's condition held. */
const reasonOf = ({ note, act }: Proposal): string =>
  note || (act === 'begin' ? "The rule's condition to begin held." : "The rule's condition to end held.");
