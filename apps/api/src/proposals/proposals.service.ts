import { Injectable } from '@nestjs/common';
import type { SignedIn } from '../auth/signed-in';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import type { NoticePreview } from '../notices/dto/notice-preview.dto';
import type { NoticeDetail } from '../notices/dto/notice.dto';
import { ProfilesService } from '../profiles/profiles.service';
import type { ProfileDto } from '../profiles/dto/profile.dto';
import { EvidenceService, type EvidenceBody } from '../rules/evaluation/evidence.service';
import { RulesService } from '../rules/rules.service';
import type { IssueProposal, ProposalQuery } from './dto/decisions.dto';
import { showEvidence } from '../rules/dto/evidence.dto';
import type { ProposalCard, ProposalDetail, ProposalPage } from './dto/proposal.dto';
import type { Proposal } from './models/proposal.model';
import { ProposalCards } from './proposal-cards';
import { ProposalDecisions } from './proposal-decisions';
import { ProposalIssuing } from './proposal-issuing';
import { ProposalRecord } from './proposal-record';
import { suggestedEnd } from './written-end';

/** Proposals: seen, confirmed, declined, sent back, previewed and issued. */
@Injectable()
export class ProposalsService {
  constructor(
    private readonly cards: ProposalCards,
    private readonly decisions: ProposalDecisions,
    private readonly issuing: ProposalIssuing,
    private readonly evidence: EvidenceService,
    private readonly rules: RulesService,
    private readonly profiles: ProfilesService,
    private readonly record: ProposalRecord,
  ) {}

  /** A page of the proposals a person may see. */
  page(query: ProposalQuery, by: SignedIn): Promise<ProposalPage> {
    return this.cards.page(query, by);
  }

  /** Every proposal that waits for somebody and that a person may see. */
  waiting(by: SignedIn): Promise<ProposalCard[]> {
    return this.cards.waiting(by);
  }

  /** One proposal with its evidence, the profile at the time and what was done to it. */
  async detail(id: number, by: SignedIn): Promise<ProposalDetail> {
    const proposal = await this.readable(id, by);
    const evidence = await this.evidence.read(proposal.evidenceId);
    const { id: ruleId, version } = evidence.body.rule;
    const deeds = await this.record.of(id);
    return {
      ...(await this.cards.one(id)),
      rule: { id: ruleId, version },
      evidence: showEvidence(evidence),
      profile: await this.profileOf(evidence.body),
      history: deeds.map(({ at, actor, act, text }) => ({ at: toIso(at), by: actor, act, text })),
      suggestedExpiresAt: toIso(suggestedEnd(proposal, await this.rules.body(ruleId))),
    };
  }

  /** An analyst confirms, with a sentence for the officer. */
  async confirm(id: number, by: SignedIn, note: string, version: number): Promise<ProposalDetail> {
    await this.decisions.confirm(id, by, note, version);
    return this.detail(id, by);
  }

  /** An analyst declines, with a reason. */
  async decline(id: number, by: SignedIn, reason: string, version: number): Promise<ProposalDetail> {
    await this.decisions.decline(id, by, reason, version);
    return this.detail(id, by);
  }

  /** An officer sends a confirmed proposal back, with a reason. */
  async return(id: number, by: SignedIn, reason: string, version: number): Promise<ProposalDetail> {
    await this.decisions.sendBack(id, by, reason, version);
    return this.detail(id, by);
  }

  /** The notice exactly as it would go out. */
  async preview(id: number, by: SignedIn, expiresAt?: string): Promise<NoticePreview> {
    await this.readable(id, by);
    return this.issuing.preview(id, by, expiresAt);
  }

  /** An officer issues what they saw. */
  issue(id: number, by: SignedIn, wanted: IssueProposal): Promise<NoticeDetail> {
    return this.issuing.issue(id, by, wanted);
  }

  private async readable(id: number, by: SignedIn): Promise<Proposal> {
    const proposal = await this.decisions.find(id, by);
    if (by.role !== 'officer' || proposal.confirmedAt !== null) return proposal;
    throw new Problem('not-allowed', 'An analyst has not confirmed this proposal yet.');
  }

  /** The profile of the tower that spoke, the first where several did. */
  private async profileOf({ spoke, tEnd }: EvidenceBody): Promise<ProfileDto | null> {
    const towerId = Number(spoke?.split(':').at(-1)?.split(',')[0]);
    return Number.isInteger(towerId) ? ((await this.profiles.at(towerId, tEnd)) ?? null) : null;
  }
}
