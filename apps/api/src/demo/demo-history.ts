import { Injectable } from '@nestjs/common';
import { Clock, SetClock } from '../common/clock';
import { UnitOfWork } from '../database/unit-of-work';
import { NoticeExpiry } from '../notices/notice-expiry';
import { NoticeLogService } from '../notices/notice-log.service';
import { PipelineService } from '../profiles/pipeline.service';
import type { ProposalCard } from '../proposals/dto/proposal.dto';
import { ReadingsCollector } from '../readings/collector/readings-collector';
import { DemoDecisions } from './demo-decisions';
import { DemoDelivery } from './demo-delivery';
import { DemoForecasts } from './demo-forecasts';
import type { DemoStaff } from './demo-office';
import type { DemoScenario } from './demo-scenario';
import type { Span } from './history-spans';
import {
  CONFIRMED_BEFORE_S,
  HELD_BEFORE_S,
  lastDays,
  LEFT_OPEN,
  LEFT_TO_THE_OFFICER,
  type LastDays,
} from './last-days';
import { nextStep } from './history-steps';
import type { LoggerClient } from './logger-client';
import { confirmingAt, decidingAt } from './staff-hours';

/** Readings of a step are in this long after its end, s. */
const COLLECTED_AFTER_S = 90;

/** All that a step of the history needs. */
export interface HistoryOrder {
  readonly scenario: DemoScenario;
  readonly staff: DemoStaff;
  readonly loggers: LoggerClient;
  readonly spans: readonly Span[];
  readonly timeZone: string;
  /** Ids of the districts by address part. */
  readonly districtIds: ReadonlyMap<string, number>;
  /** Told how far the history is, as an instant, after every step. */
  readonly onStep: (t: number, shareDone: number) => void;
}

interface Deed {
  readonly at: number;
  readonly proposalId: number;
  readonly kind: 'desk' | 'officer' | 'hold';
}

/**
 * Lives through the past step by step: the loggers write, the readings are collected, everything that follows from
 * them is worked out, and the demo's people decide when such people would. The clock is set; nothing else is.
 */
@Injectable()
export class DemoHistory {
  private deeds: Deed[] = [];
  private readonly planned = new Set<string>();

  constructor(
    private readonly clock: Clock,
    private readonly collector: ReadingsCollector,
    private readonly pipeline: PipelineService,
    private readonly expiry: NoticeExpiry,
    private readonly decisions: DemoDecisions,
    private readonly delivery: DemoDelivery,
    private readonly forecasts: DemoForecasts,
    private readonly notices: NoticeLogService,
    private readonly work: UnitOfWork,
  ) {}

  /** Lives through all spans, the last of which ends now. */
  async live(order: HistoryOrder): Promise<void> {
    const end = order.spans.at(-1)?.to ?? 0;
    const total = order.spans.reduce((sum, { from, to }) => sum + to - from, 0);
    let done = 0;
    let quiet = true;
    this.pipeline.waitToBeAsked();
    for (const { from, to } of order.spans) {
      await order.loggers.skip(from);
      for (let t = from; t < to;) {
        const next = Math.min(to, nextStep(t, end, quiet));
        quiet = await this.step(next, order, lastDays(end));
        done += next - t;
        t = next;
        order.onStep(t, done / total);
      }
    }
  }

  /** Says whether all is quiet at its end: nothing waits for anybody and nothing is in force. */
  private async step(t: number, order: HistoryOrder, last: LastDays): Promise<boolean> {
    await this.decideUntil(t, order);
    await this.forecasts.enterUntil(t, last.now, order.staff, order.timeZone);
    this.setClock(t);
    await order.loggers.write(t);
    this.setClock(Math.min(t + COLLECTED_AFTER_S, last.now));
    await this.work.run(() => this.collector.collect());
    await this.pipeline.drainAll();
    await this.expiry.closeDue();
    const waiting = await this.decisions.waiting(order.staff);
    for (const card of waiting) this.plan(card, order, last);
    return waiting.length === 0 && (await this.notices.inForce(this.clock.now())).length === 0;
  }

  /** The people's deeds that fall before an instant, in their order. */
  private async decideUntil(t: number, order: HistoryOrder): Promise<void> {
    const due = this.deeds.filter(({ at }) => at < t).sort((a, b) => a.at - b.at);
    if (due.length === 0) return;
    this.deeds = this.deeds.filter(({ at }) => at >= t);
    for (const deed of due) {
      const card = (await this.decisions.waiting(order.staff)).find(({ id }) => id === deed.proposalId);
      if (!card) continue;
      this.setClock(Math.max(deed.at, this.clock.now()));
      await this.carryOut(deed, card, order);
    }
  }

  private async carryOut(
    { kind }: Deed,
    card: ProposalCard,
    { staff, scenario }: HistoryOrder,
  ): Promise<void> {
    if (kind === 'hold') await this.decisions.holdOpen(card, staff, scenario);
    else if (kind === 'desk') await this.decisions.atTheDesk(card, staff, scenario);
    else if (
      card.state === 'confirmed' &&
      (await this.decisions.byTheOfficer(card, staff, scenario)) === 'issued'
    )
      await this.delivery.settle();
  }

  /** Plans once when somebody will look at a proposal in its present state. */
  private plan(card: ProposalCard, order: HistoryOrder, last: LastDays): void {
    const key = `${card.id} ${card.state} ${card.version}`;
    if (this.planned.has(key)) return;
    this.planned.add(key);
    const deed = this.leftUndone(card, order, last) ?? this.usual(card, order);
    if (deed !== 'nothing') this.deeds.push({ ...deed, proposalId: card.id });
  }

  private usual(card: ProposalCard, { timeZone }: HistoryOrder): Omit<Deed, 'proposalId'> {
    const planned = { id: card.id, act: card.act, openedAt: Date.parse(card.openedAt) / 1000 };
    if (card.state === 'confirmed')
      return { at: decidingAt(planned, this.clock.now(), timeZone), kind: 'officer' };
    return { at: confirmingAt({ ...planned, openedAt: this.clock.now() }, timeZone), kind: 'desk' };
  }

  /** What is kept waiting at the first start, in the two districts chosen for it. */
  private leftUndone(
    card: ProposalCard,
    { districtIds }: HistoryOrder,
    { from, now }: LastDays,
  ): Omit<Deed, 'proposalId'> | 'nothing' | undefined {
    if (this.clock.now() < from || card.act !== 'begin') return undefined;
    if (card.districtId === districtIds.get(LEFT_OPEN)) {
      const held = now - HELD_BEFORE_S;
      return this.clock.now() < held ? { at: held, kind: 'hold' } : 'nothing';
    }
    if (card.districtId !== districtIds.get(LEFT_TO_THE_OFFICER)) return undefined;
    if (card.state === 'confirmed') return 'nothing';
    return { at: Math.max(this.clock.now(), now - CONFIRMED_BEFORE_S), kind: 'desk' };
  }

  private setClock(t: number): void {
    if (!(this.clock instanceof SetClock))
      throw new Error('The demo’s history needs a clock that can be set.');
    this.clock.set(t);
  }
}
