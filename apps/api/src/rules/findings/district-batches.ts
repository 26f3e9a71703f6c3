import { isFresh, notKnown } from '@lidwatch/atmosphere';
import { Injectable } from '@nestjs/common';
import type { DirtyRow } from '../../database/dirty';
import { graceS } from '../../profiles/profiles.stage';
import { blockAt, newestValidEnd } from './answering';
import { districtBlock, REACH_S, type DistrictBlock } from './district-block';
import { towerIdsOf, type DistrictPlan } from './district-plan';
import { DistrictRows } from './district-rows';
import { EPISODE_REACH_S, type StrengthAt } from './episode-minutes';
import { SMOKE_REACH_S } from './smoke';
import { TowerBlockRows, type TowerBlocks } from './tower-blocks';

/** A district's blocks that some marks touch, and the marks that are dealt with by them. */
export interface DistrictBatch {
  readonly blocks: readonly DistrictBlock[];
  readonly settled: readonly DirtyRow[];
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

/** Works out districts' blocks from what is kept. */
@Injectable()
export class DistrictBatches {
  constructor(
    private readonly towers: TowerBlockRows,
    private readonly rows: DistrictRows,
  ) {}

  /**
   * The blocks of a district that the marks touch: those that hold a marked time, and later ones already there whose
   * values look back on it. A block for which a tower is still awaited is left for later, with its marks.
   */
  async of(plan: DistrictPlan, marks: readonly DirtyRow[], now: number): Promise<DistrictBatch> {
    const due = marks.filter(({ t }) => districtEnd(t, plan) <= now);
    if (due.length === 0) return { blocks: [], settled: [] };
    const marked = new Set(due.map(({ t }) => districtEnd(t, plan)));
    const first = Math.min(...marked);
    const last = Math.max(...marked);
    const later = await this.rows.ends(plan.districtId, first, last + REACH_S);
    const ends = [...new Set([...marked, ...later])].sort((a, b) => a - b);
    const until = ends.at(-1)!;
    const blocks = await this.towers.between(towerIdsOf(plan), first - layersReachS(plan), until);
    const hours = plan.pm25 && (await this.towers.hours([plan.pm25.id], first - SMOKE_REACH_S, until));
    const strengths = await this.rows.strengths(plan.districtId, first - EPISODE_REACH_S, until);
    const sources = {
      ...{ plan, blocks },
      hours: plan.pm25 && (hours?.get(plan.pm25.id) ?? []),
      earlier: (t: number) => strengths.get(t) ?? NO_BLOCK,
    };
    const awaited = new Set(ends.filter((t) => isAwaited(plan, blocks, t, now)));
    const made = ends
      .filter((t) => !awaited.has(t))
      .map((t) => {
        const block = districtBlock(sources, t);
        const { spoke, values } = block;
        strengths.set(t, { spoke, strengthC: values.inversionStrengthC ?? NO_BLOCK.strengthC });
        return block;
      });
    return { blocks: made, settled: due.filter(({ t }) => !awaited.has(districtEnd(t, plan))) };
  }
}
