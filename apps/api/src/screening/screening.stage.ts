import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { ScreeningContext } from '@lidwatch/atmosphere';
import { groupBy } from '../common/group-by';
import { DirtyStages, type DirtyRow } from '../database/dirty';
import { UnitOfWork } from '../database/unit-of-work';
import { blockEndOf, type TowerLayout } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import { blockMean, type BlockMean } from './block-means';
import { ReadingWindows, type Wanted } from './reading-windows';
import { contextOf, screenStretch } from './screen-tower';
import { ScreeningStore, type ChangedFlag } from './screening-store';
import { firstAfter, type Flags, type Series, type SetSpan, type Stretch } from './series';
import { stretchesOf } from './stretches';

/** Blocks worked out at a time. */
const BATCH = 500;
const EVER = Number.MAX_SAFE_INTEGER;
const HOUR_S = 3600;

interface Part {
  readonly tower: TowerLayout;
  readonly stretch: Stretch;
  readonly blocks: readonly number[];
  readonly context: ScreeningContext;
}

interface Found {
  readonly flags: ChangedFlag[];
  readonly means: BlockMean[];
}

/** Stage 1: screens the readings that changed with all that they can influence, and averages their blocks. */
@Injectable()
export class ScreeningStage implements OnModuleInit {
  constructor(
    private readonly dirty: DirtyStages,
    private readonly windows: ReadingWindows,
    private readonly store: ScreeningStore,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
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
    let at = 0;
    const found = parts.map((part) => {
      const own = series.slice(at, (at += part.tower.sensors.length));
      return screenPart(part, own, spans);
    });
    await this.work.run(() => this.write(rows, parts, found), 'bulk');
    return rows.length;
  }

  private async partsOf(rows: readonly DirtyRow[]): Promise<Part[]> {
    const parts: Part[] = [];
    for (const [towerId, own] of groupBy(rows, (row) => row.subject)) {
      const tower = await this.layouts.of(towerId);
      const ends = own.map((row) => row.t);
      const context = contextOf(tower);
      for (const stretch of stretchesOf(ends, tower.blockS, context.beforeS + context.afterS)) {
        const blocks = ends.filter((t) => t > stretch.t0 && t <= stretch.t1);
        parts.push({ tower, stretch, blocks, context });
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

/** The readings whose flags a change within the part can alter, whole blocks of them. */
const reachOf = ({ tower, stretch, context }: Part): Stretch => ({
  t0: blockEndOf(stretch.t0 - context.afterS, tower.blockS) - tower.blockS,
  t1: blockEndOf(stretch.t1 + context.beforeS, tower.blockS),
});

/** What must be read to judge those. */
const wantedOf = (part: Part): Wanted[] => {
  const { t0, t1 } = reachOf(part);
  const { beforeS, afterS } = part.context;
  return part.tower.sensors.map(({ id }) => ({ sensorId: id, t0: t0 - beforeS, t1: t1 + afterS }));
};

function screenPart(part: Part, series: readonly Series[], spans: readonly SetSpan[]): Found {
  const { tower, blocks } = part;
  const flags = screenStretch(tower, series, reachOf(part), spans);
  const changed = series.flatMap((each, i) => changedFlags(each, flags[i]!));
  const ends = new Set([...blocks, ...changed.map(({ tEnd }) => blockEndOf(tEnd, tower.blockS))]);
  const means = tower.sensors.flatMap((sensor, i) =>
    [...ends].flatMap((tEnd) => blockMean(tower, sensor, series[i]!, flags[i]!, tEnd) ?? []),
  );
  return { flags: changed, means };
}

function changedFlags(series: Series, flags: Flags): ChangedFlag[] {
  if (flags.tEnd.length === 0) return [];
  const shift = firstAfter(series.tEnd, flags.tEnd[0]! - 1);
  const changed: ChangedFlag[] = [];
  flags.tEnd.forEach((tEnd, i) => {
    const [quality, checks] = [flags.quality[i]!, flags.checks[i]!];
    if (quality !== series.quality[i + shift] || checks !== series.checks[i + shift]) {
      changed.push({ sensorId: series.sensorId, tEnd, quality, checks });
    }
  });
  return changed;
}
