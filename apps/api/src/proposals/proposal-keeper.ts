import { openProposalStates } from '@lidwatch/contracts';
import { mayBeginAt, NOTICE_KINDS, type NoticeKind } from '@lidwatch/rules';
import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op } from 'sequelize';
import { ActivityService } from '../activity/activity.service';
import { Clock } from '../common/clock';
import { NoticesService } from '../notices/notices.service';
import { EvidenceService } from '../rules/evaluation/evidence.service';
import { LiveEvaluation, type DistrictEvaluation } from '../rules/evaluation/live-evaluation';
import { localMoment } from '../rules/findings/local-time';
import { Proposal } from './models/proposal.model';
import { ProposalNews } from './proposal-news';

type Act = 'begin' | 'end';

/** What bears on whether one proposal should be open: the evaluation, and what is in force. */
interface Situation {
  readonly evaluation: DistrictEvaluation;
  readonly kind: NoticeKind;
  readonly inForce: ReadonlySet<string>;
}

/**
 * Opens proposals when the rule in force begins to hold for a district's newest block, and lets them lapse when it
 * turns false. Not known does neither. All of it in the transaction of the block itself.
 */
@Injectable()
export class ProposalKeeper implements OnModuleInit {
  constructor(
    @InjectModel(Proposal) private readonly proposals: typeof Proposal,
    private readonly evaluations: LiveEvaluation,
    private readonly evidence: EvidenceService,
    private readonly notices: NoticesService,
    private readonly activity: ActivityService,
    private readonly news: ProposalNews,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.evaluations.onNewest((evaluation) => this.consider(evaluation));
  }

  private async consider(evaluation: DistrictEvaluation): Promise<void> {
    if (!evaluation.fresh) return;
    const { districtId } = evaluation;
    const inForce = new Set((await this.notices.inForce(districtId)).map(({ kind }) => kind as string));
    const waiting = await this.proposals.findAll({
      where: { districtId, state: { [Op.in]: [...openProposalStates] } },
    });
    for (const kind of NOTICE_KINDS) {
      for (const act of ['begin', 'end'] as const) {
        const situation = { evaluation, kind, inForce };
        const open = waiting.find((proposal) => proposal.kind === kind && proposal.act === act);
        if (open) await this.reconsider(open, situation);
        else if (await this.shouldOpen(act, situation)) await this.open(act, situation);
      }
    }
  }

  private async reconsider(proposal: Proposal, { evaluation, kind, inForce }: Situation): Promise<void> {
    const found = evaluation.kinds.get(kind);
    const reason = !found
      ? 'The rule in force says nothing of this kind of notice any more.'
      : (idleBecause(proposal.act, kind, inForce) ??
        (found[proposal.act].truth === 'false' ? 'The condition no longer holds.' : undefined));
    if (reason === undefined) return;
    const { id, version, districtId } = proposal;
    await proposal.update({ state: 'lapsed', closedAt: this.clock.now(), reason, version: version + 1 });
    await this.activity.record({
      ...{ actor: 'service', act: 'let a proposal lapse', subject: `proposal ${id}`, districtId },
      body: { text: reason, tEnd: evaluation.tEnd },
    });
    this.news.changed(proposal);
  }

  private async shouldOpen(act: Act, { evaluation, kind, inForce }: Situation): Promise<boolean> {
    const rule = evaluation.rule.body[kind];
    const found = evaluation.kinds.get(kind);
    if (!rule || found?.[act].truth !== 'true' || idleBecause(act, kind, inForce) !== undefined) return false;
    if (act === 'begin' && !mayBeginAt(rule, localMoment(evaluation.timeZone, evaluation.tEnd))) return false;
    return !(await this.isTooSoon(evaluation.districtId, kind, act, rule.earliestReproposalMinutes));
  }

  /** Whether the same was declined or lapsed so lately that the rule does not propose it again yet. */
  private async isTooSoon(districtId: number, kind: NoticeKind, act: Act, minutes = 0): Promise<boolean> {
    if (minutes === 0) return false;
    const since = this.clock.now() - minutes * 60;
    const state = { [Op.in]: ['declined', 'lapsed'] };
    return (
      (await this.proposals.count({
        where: { districtId, kind, act, state, closedAt: { [Op.gt]: since } },
      })) > 0
    );
  }

  private async open(act: Act, { evaluation, kind }: Situation): Promise<void> {
    const { districtId, tEnd, rule } = evaluation;
    const kept = await this.evidence.keep(evaluation, kind, act, evaluation.kinds.get(kind)![act]);
    const proposal = await this.proposals.create({
      ...{ districtId, kind, act, tEnd, state: 'open', ruleId: rule.id, evidenceId: kept.id },
      ...{ openedAt: this.clock.now(), version: 1 },
    });
    await this.activity.record({
      ...{ actor: 'service', act: 'opened a proposal', subject: `proposal ${proposal.id}`, districtId },
      body: { kind, act, tEnd, rule: rule.id, evidence: kept.sha256 },
    });
    this.news.changed(proposal);
  }
}

/** Why there is nothing to propose, given what is in force: a burn ban covers an advisory. */
function idleBecause(act: Act, kind: NoticeKind, inForce: ReadonlySet<string>): string | undefined {
  if (act === 'end') return inForce.has(kind) ? undefined : 'The notice is no longer in force.';
  if (inForce.has(kind)) return 'A notice of this kind is in force already.';
  return kind === 'advisory' && inForce.has('burnBan') ? 'A burn ban is in force already.' : undefined;
}
