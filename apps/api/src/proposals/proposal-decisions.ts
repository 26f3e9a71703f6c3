import { after, statesBefore, proposalLifecycle, type ProposalAct } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op } from 'sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { requireOwnDistrict } from '../auth/own-district';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { UnitOfWork } from '../database/unit-of-work';
import { Proposal } from './models/proposal.model';
import { alreadyDone } from './already-done';
import { ProposalNews } from './proposal-news';
import { ProposalRecord } from './proposal-record';

/** How each decision is written in the record. */
const DEEDS: Readonly<Record<Exclude<ProposalAct, 'lapse'>, string>> = {
  confirm: 'confirmed a proposal',
  decline: 'declined a proposal',
  return: 'sent a proposal back',
  issue: 'issued a proposal',
};

/** What a decision writes besides the state. */
type Written = Partial<
  Pick<Proposal, 'confirmedAt' | 'confirmedBy' | 'note' | 'closedAt' | 'closedBy' | 'reason' | 'noticeId'>
>;

/** Takes proposals from one state to the next, once, whoever comes first. */
@Injectable()
export class ProposalDecisions {
  constructor(
    @InjectModel(Proposal) private readonly proposals: typeof Proposal,
    private readonly activity: ActivityService,
    private readonly record: ProposalRecord,
    private readonly news: ProposalNews,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** One proposal; 404 without it, 403 for an officer of other districts. */
  async find(id: number, by: SignedIn): Promise<Proposal> {
    const proposal = await this.proposals.findByPk(id);
    if (!proposal) throw new Problem('not-found', `There is no proposal ${id}.`);
    requireOwnDistrict(by, proposal.districtId);
    return proposal;
  }

  /** An analyst's confirmation. */
  confirm(id: number, by: SignedIn, note: string, version: number): Promise<void> {
    const confirmed = { confirmedAt: this.clock.now(), confirmedBy: by.id, note, reason: null };
    return this.decide(id, by, 'confirm', version, confirmed, note);
  }

  /** An analyst's refusal. */
  decline(id: number, by: SignedIn, reason: string, version: number): Promise<void> {
    return this.decide(id, by, 'decline', version, { ...this.closedBy(by), reason }, reason);
  }

  /** An officer sends a confirmed proposal back to the analysts. */
  sendBack(id: number, by: SignedIn, reason: string, version: number): Promise<void> {
    return this.decide(id, by, 'return', version, { reason }, reason);
  }

  /** Who closed it, and when. */
  closedBy(by: SignedIn): Written {
    return { closedAt: this.clock.now(), closedBy: by.id };
  }

  /** One step of the lifecycle with its entry in the record, in one transaction; a step that came too late says who was first. */
  decide(
    id: number,
    by: SignedIn,
    act: Exclude<ProposalAct, 'lapse'>,
    version: number,
    written: Written,
    text: string,
  ): Promise<void> {
    return this.work.run(async () => {
      const before = await this.find(id, by);
      const state = after(proposalLifecycle, before.state, act);
      if (state === undefined) throw await this.tooLate(before, act);
      const [changed] = await this.proposals.update(
        { ...written, state, version: version + 1 },
        { where: { id, version, state: { [Op.in]: statesBefore(proposalLifecycle, act) } } },
      );
      if (changed === 0) {
        throw new Problem(
          'changed-meanwhile',
          'This proposal was changed since you opened it. Read it again first.',
        );
      }
      await this.activity.record({
        ...{ actor: by, act: DEEDS[act], subject: `proposal ${id}`, districtId: before.districtId },
        body: { text },
      });
      this.news.changed(before);
    });
  }

  private async tooLate(proposal: Proposal, act: ProposalAct): Promise<Problem> {
    const [last] = (await this.record.of(proposal.id)).slice(-1);
    return alreadyDone(proposal, act, last);
  }
}
