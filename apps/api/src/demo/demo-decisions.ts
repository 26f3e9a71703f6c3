import { Injectable } from '@nestjs/common';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { DistrictsService } from '../districts/districts.service';
import { NoticesService } from '../notices/notices.service';
import type { ProposalCard } from '../proposals/dto/proposal.dto';
import { ProposalsService } from '../proposals/proposals.service';
import type { DemoStaff } from './demo-office';
import type { DemoScenario } from './demo-scenario';
import { draw, pick } from './draw';

/** Share of proposals to begin that an analyst declines and that an officer sends back. */
const DECLINED_SHARE = 0.15;
const RETURNED_SHARE = 0.05;

/** The demo's people at work: each deed is one call of the proposals service, as a click on the screen would be. */
@Injectable()
export class DemoDecisions {
  constructor(
    private readonly proposals: ProposalsService,
    private readonly districts: DistrictsService,
    private readonly notices: NoticesService,
    private readonly clock: Clock,
  ) {}

  /** Everything that waits for somebody. */
  waiting({ analyst }: DemoStaff): Promise<ProposalCard[]> {
    return this.proposals.waiting(analyst);
  }

  /** The analyst on duty confirms or, now and then, declines. */
  async atTheDesk(card: ProposalCard, staff: DemoStaff, { words }: DemoScenario): Promise<void> {
    const { id, act, version, state } = card;
    const by = draw('duty', Math.floor(this.clock.now() / 86_400)) < 0.3 ? staff.deputy : staff.analyst;
    if (act === 'begin' && state === 'open' && draw('decline', id) < DECLINED_SHARE) {
      await this.proposals.decline(id, by, pick(words.declineBegin, 'reason', id), version);
      return;
    }
    const note = pick(act === 'begin' ? words.confirmBegin : words.confirmEnd, 'note', id);
    await this.proposals.confirm(id, by, note, version);
  }

  /** The analyst declines for now: what still holds is proposed anew after the rule's pause. */
  async holdOpen({ id, version }: ProposalCard, staff: DemoStaff, { words }: DemoScenario): Promise<void> {
    await this.proposals.decline(id, staff.analyst, pick(words.holdOpen, id), version);
  }

  /** The district's officer issues what they were shown or, now and then, sends it back; a ban makes an advisory idle. */
  async byTheOfficer(
    card: ProposalCard,
    staff: DemoStaff,
    { words, password }: DemoScenario,
  ): Promise<'issued' | 'returned' | 'nothing'> {
    const { id, act, version } = card;
    if (await this.banCovers(card)) return 'nothing';
    const by = await this.officerOf(card, staff);
    if (act === 'begin' && draw('return', id, version) < RETURNED_SHARE) {
      await this.proposals.return(id, by, pick(words.returnBegin, 'reason', id), version);
      return 'returned';
    }
    const { hash } = await this.proposals.preview(id, by);
    await this.proposals.issue(id, by, {
      previewHash: hash,
      version,
      password,
      requestKey: `demo-proposal-${id}`,
    });
    return 'issued';
  }

  private async banCovers({ act, kind, districtId }: ProposalCard): Promise<boolean> {
    if (act !== 'begin' || kind !== 'advisory') return false;
    return (await this.notices.inForce(districtId)).some((notice) => notice.kind === 'burnBan');
  }

  private async officerOf({ districtId }: ProposalCard, staff: DemoStaff): Promise<SignedIn> {
    const officers = [staff.floorOfficer, staff.benchOfficer];
    const found = officers.find((officer) => officer.districtIds.includes(districtId));
    if (found) return found;
    const { name } = await this.districts.get(districtId);
    throw new Error(
      `No officer of the demo has ${name}. Give the district to one in fixtures/demo/staff.json.`,
    );
  }
}
