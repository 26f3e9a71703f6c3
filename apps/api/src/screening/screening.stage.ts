import { Injectable, type OnModuleInit } from '@nestjs/common';
import { groupBy } from '../common/group-by';
import { ComputePool } from '../compute/compute-pool';
import { DirtyStages, type DirtyRow } from '../database/dirty';
import { UnitOfWork } from '../database/unit-of-work';
import { TowerLayouts } from '../towers/tower-layouts';
import { ReadingWindows, type Wanted } from './reading-windows';
import {
  reachOf,
  screenParts,
  screenPartsTask,
  sensorsHeard,
  type Found,
  type Part,
} from './screen-parts.task';
import { contextOf } from './screen-tower';
import { ScreeningStore } from './screening-store';
import { stretchesOf } from './stretches';

/** Blocks worked out at a time. */
const BATCH = 500;
/** So many are worked out here and now: the way to the compute thread would cost more. */
const AT_ONCE = 24;
const EVER = Number.MAX_SAFE_INTEGER;
const HOUR_S = 3600;

/** Stage 1: screens the readings that changed with all that they can influence, and averages their blocks. */
@Injectable()
export class ScreeningStage implements OnModuleInit {
  constructor(
    private readonly dirty: DirtyStages,
    private readonly windows: ReadingWindows,
    private readonly store: ScreeningStore,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly pool: ComputePool,
  ) {}

  onModuleInit(): void {
    this.dirty.registerStage(1, () => this.batch());
  }

  private async batch(): Promise<number> {
    const rows = await this.dirty.newest(1, BATCH, EVER);
    if (rows.length === 0) return 0;
    const parts = await this.partsOf(rows);
    const sensorIds = [...new Set(parts.flatMap(({ tower }) => tower.sensors.map(({ id }) => id)))];
    const spans = await this.windows.setSpans(sensorIds);
    const series = await this.windows.read(parts.flatMap(wantedOf));
    const given = { parts, series, spans };
    const found = rows.length > AT_ONCE ? await this.pool.run(screenPartsTask, given) : screenParts(given);
    await this.work.run(() => this.write(rows, parts, found), 'bulk');
    return rows.length;
  }

  private async partsOf(rows: readonly DirtyRow[]): Promise<Part[]> {
    const parts: Part[] = [];
    for (const [towerId, own] of groupBy(rows, (row) => row.subject)) {
      const tower = await this.layouts.of(towerId);
      const ends = own.map((row) => row.t);
      const neighbours = await Promise.all(tower.neighbourIds.map((id) => this.layouts.of(id)));
      const context = contextOf(tower, neighbours);
      for (const stretch of stretchesOf(ends, tower.blockS, context.beforeS + context.afterS)) {
        const blocks = ends.filter((t) => t > stretch.t0 && t <= stretch.t1);
        parts.push({ tower, neighbours, stretch, blocks, context });
      }
    }
    return parts;
  }

  private async write(
    rows: readonly DirtyRow[],
    parts: readonly Part[],
    found: readonly Found[],
  ): Promise<void> {
    await this.store.writeFlags(found.flatMap(({ flags }) => flags));
    const changed = await this.store.writeMeans(found.flatMap(({ means }) => means));
    const towers = new Map(
      parts.flatMap(({ tower }) => tower.sensors.map((sensor) => [sensor.id, tower] as const)),
    );
    const blocks = new Map<string, readonly [number, number]>();
    for (const { sensorId, tEnd } of changed) {
      const tower = towers.get(sensorId)!;
      const until = tEnd + HOUR_S - tower.blockS;
      const isHourly = tower.sensors.some(({ id, quantity }) => id === sensorId && quantity === 'pm2.5');
      for (let t = tEnd; t <= (isHourly ? until : tEnd); t += tower.blockS) {
        blocks.set(`${tower.id} ${t}`, [tower.id, t]);
      }
    }
    await this.dirty.mark(2, [...blocks.values()]);
    await this.dirty.settle(1, rows);
  }
}

/** What must be read to judge what a part can alter. */
const wantedOf = (part: Part): Wanted[] => {
  const { t0, t1 } = reachOf(part);
  const { beforeS, afterS } = part.context;
  return sensorsHeard(part).map(({ id }) => ({ sensorId: id, t0: t0 - beforeS, t1: t1 + afterS }));
};
