import { isFresh, notKnown } from '@lidwatch/atmosphere';
import { Injectable } from '@nestjs/common';
import { groupBy } from '../../common/group-by';
import type { DirtyRow } from '../../database/dirty';
import { KnownForecasts, type ForecastBook } from '../../forecasts/known-forecasts';
import { graceS } from '../../profiles/grace';
import { blockAt, newestValidEnd } from './answering';
import { districtBlock, REACH_S, type DistrictBlock, type DistrictSources } from './district-block';
import { towerIdsOf, type DistrictPlan } from './district-plan';
import { DistrictRows } from './district-rows';
import { EPISODE_REACH_S, type StrengthAt } from './episode-minutes';
import { SMOKE_REACH_S } from './smoke';
import { TowerBlockRows, type MonitorHours, type TowerBlocks } from './tower-blocks';

/** District blocks that some marks touch, and the marks that are dealt with by them. */
export interface DistrictBatch {
  readonly blocks: readonly DistrictBlock[];
  readonly settled: readonly DirtyRow[];
}

/** One district's part of a batch: its marks, and the ends of the blocks they touch, in order of time. */
interface Part {
  readonly plan: DistrictPlan;
  readonly marks: readonly DirtyRow[];
  readonly ends: readonly number[];
}

/** What is kept of the stretch of time a batch is about. */
interface Kept {
  readonly blocks: TowerBlocks;
  readonly hours: MonitorHours;
  readonly forecasts: ForecastBook;
  readonly strengths: ReadonlyMap<number, Map<number, StrengthAt>>;
}

/** A tower counts as fresh for at least so many of its intervals. */
const FRESH_INTERVALS = 2.5;
const NO_BLOCK: StrengthAt = { spoke: null, strengthC: notKnown('no block is known') };

/** The end of the district's block that holds a tower's block end. */
const districtEnd = (t: number, { blockS }: DistrictPlan): number => Math.ceil(t / blockS) * blockS;

/** How far back a fresh tower's newest block may lie, s. */
function layersReachS(plan: DistrictPlan): number {
  const towers = [...plan.towers, plan.floor, plan.bench].filter((tower) => tower !== undefined);
  const reaches = towers.map(({ staleLimitS, blockS, intervalS }) =>
    Math.max(staleLimitS, blockS, FRESH_INTERVALS * intervalS),
  );
  return Math.max(plan.blockS, ...reaches);
}

/** Whether a tower that still speaks has not given its block for t yet and may still do so. */
function isAwaited(plan: DistrictPlan, blocks: TowerBlocks, t: number, now: number): boolean {
  return plan.towers.some((tower) => {
    if (t + graceS(tower.intervalS) <= now || blockAt(tower, blocks, t, plan.blockS)) return false;
    return isFresh(newestValidEnd(tower, blocks, t), tower.intervalS, t, tower.staleLimitS);
  });
}

/** Works out district blocks from what is kept. */
@Injectable()
export class DistrictBatches {
  constructor(
    private readonly towers: TowerBlockRows,
    private readonly rows: DistrictRows,
    private readonly forecasts: KnownForecasts,
  ) {}

  /**
   * The blocks that the marks touch: those that hold a marked time, and later ones already there whose values look
   * back on it. A block for which a tower is still awaited is left for later, with its marks; so are marks of blocks
   * that have not ended.
   */
  async of(
    plans: ReadonlyMap<number, DistrictPlan>,
    marks: readonly DirtyRow[],
    now: number,
  ): Promise<DistrictBatch> {
    const due = marks.filter(({ subject, t }) => districtEnd(t, plans.get(subject)!) <= now);
    if (due.length === 0) return { blocks: [], settled: [] };
    const parts = await this.partsOf(plans, due);
    const kept = await this.read(parts);
    const done = parts.map((part) => workOut(part, kept, now));
    return { blocks: done.flatMap(({ blocks }) => blocks), settled: done.flatMap(({ settled }) => settled) };
  }

  private async partsOf(plans: ReadonlyMap<number, DistrictPlan>, due: readonly DirtyRow[]): Promise<Part[]> {
    const first = Math.min(...due.map(({ t }) => t));
    const last = Math.max(...due.map(({ t }) => t));
    const later = await this.rows.ends(
      [...new Set(due.map(({ subject }) => subject))],
      first,
      last + REACH_S,
    );
    return [...groupBy(due, ({ subject }) => subject)].map(([districtId, marks]) => {
      const plan = plans.get(districtId)!;
      const marked = marks.map(({ t }) => districtEnd(t, plan));
      const [own, newest] = [Math.min(...marked), Math.max(...marked) + REACH_S];
      const after = (later.get(districtId) ?? []).filter((t) => t > own && t <= newest);
      return { plan, marks, ends: [...new Set([...marked, ...after])].sort((a, b) => a - b) };
    });
  }

  private async read(parts: readonly Part[]): Promise<Kept> {
    const first = Math.min(...parts.map(({ ends }) => ends[0]!));
    const until = Math.max(...parts.map(({ ends }) => ends.at(-1)!));
    const towerIds = [...new Set(parts.flatMap(({ plan }) => towerIdsOf(plan)))];
    const monitors = [...new Set(parts.flatMap(({ plan }) => (plan.pm25 ? [plan.pm25.id] : [])))];
    const reachS = Math.max(...parts.map(({ plan }) => layersReachS(plan)));
    const districtIds = parts.map(({ plan }) => plan.districtId);
    return {
      blocks: await this.towers.between(towerIds, first - reachS, until),
      hours: await this.towers.hours(monitors, first - SMOKE_REACH_S, until),
      forecasts: await this.forecasts.book(districtIds, first, until),
      strengths: await this.rows.strengths(districtIds, first - EPISODE_REACH_S, until),
    };
  }
}

/** One district's blocks, oldest first, so that each finds those before it as they are now. */
function workOut({ plan, marks, ends }: Part, kept: Kept, now: number): DistrictBatch {
  const strengths = kept.strengths.get(plan.districtId) ?? new Map<number, StrengthAt>();
  const sources: DistrictSources = {
    ...{ plan, blocks: kept.blocks, forecasts: kept.forecasts },
    hours: plan.pm25 && (kept.hours.get(plan.pm25.id) ?? []),
    earlier: (t) => strengths.get(t) ?? NO_BLOCK,
  };
  const awaited = new Set(ends.filter((t) => isAwaited(plan, kept.blocks, t, now)));
  const blocks = ends
    .filter((t) => !awaited.has(t))
    .map((t) => {
      const block = districtBlock(sources, t);
      const { spoke, values } = block;
      strengths.set(t, { spoke, strengthC: values.inversionStrengthC ?? NO_BLOCK.strengthC });
      return block;
    });
  return { blocks, settled: marks.filter(({ t }) => !awaited.has(districtEnd(t, plan))) };
}
