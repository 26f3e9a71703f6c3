import { Injectable, Logger, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { ComputePool } from '../compute/compute-pool';
import { DirtyStages, type DirtyRow } from '../database/dirty';
import { UnitOfWork } from '../database/unit-of-work';
import { expectedReadings, type TowerLayout } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import type { KeptMean } from './block-facts';
import { graceS } from './grace';
import { hourMean, pm25SensorOf } from './hour-mean';
import { Hours } from './hours';
import { makeProfiles, makeProfilesTask } from './make-profiles.task';
import type { profileRow } from './profile-row';
import { ProfileStore, type MeansOfBlock } from './profile-store';

/** Blocks worked out at a time. */
const BATCH = 500;
/** So many are worked out here and now: the way to the compute thread would cost more. */
const AT_ONCE = 24;

interface Waiting extends MeansOfBlock {
  readonly row: DirtyRow;
  readonly tower: TowerLayout;
}

interface Made extends Waiting {
  /** Undefined where the block holds no reading. */
  readonly profile: ReturnType<typeof profileRow> | undefined;
}

/** Stage 2: makes a profile of every closed block whose means changed, and rolls its hour up. */
@Injectable()
export class ProfilesStage implements OnModuleInit {
  private readonly log = new Logger(ProfilesStage.name);

  constructor(
    private readonly dirty: DirtyStages,
    private readonly store: ProfileStore,
    private readonly hours: Hours,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly pool: ComputePool,
  ) {}

  onModuleInit(): void {
    this.dirty.registerStage(2, () => this.batch());
  }

  private async batch(): Promise<number> {
    const rows = await this.dirty.newest(2, BATCH, this.clock.now());
    const closed = rows.length === 0 ? [] : await this.closedOf(rows);
    if (closed.length === 0) return 0;
    const made = await this.make(closed, await this.pm25Hours(closed));
    await this.work.run(() => this.write(made), 'bulk');
    return made.length;
  }

  /** A block that cannot be worked out is logged and keeps its mark; the others go on. */
  private async make(closed: readonly Waiting[], hours: readonly (number | undefined)[]): Promise<Made[]> {
    const towers = [...new Set(closed.map(({ tower }) => tower))];
    const blocks = closed.map(({ row, means }, i) => ({
      ...{ towerId: row.subject, tEnd: row.t, means },
      pm25Hour: hours[i],
    }));
    const given = { towers, blocks };
    const found =
      blocks.length > AT_ONCE ? await this.pool.run(makeProfilesTask, given) : makeProfiles(given);
    return closed.flatMap((waiting, i): Made[] => {
      const each = found[i]!;
      if ('row' in each) return [{ ...waiting, profile: each.row }];
      const { subject, t } = waiting.row;
      this.log.error(
        `The block of tower ${subject} that ends at ${t} could not be worked out: ${each.fault}`,
      );
      return [];
    });
  }

  private async write(made: readonly Made[]): Promise<void> {
    const before = made.flatMap(({ hasProfile, profile }) => (hasProfile && profile ? [profile] : []));
    await this.store.keepPast(before, this.clock.now());
    const changed = await this.store.write(made.flatMap(({ profile }) => (profile ? [profile] : [])));
    const blockS = new Map(made.map(({ tower }) => [tower.id, tower.blockS]));
    await this.hours.rollUp(changed.map((block) => ({ ...block, blockS: blockS.get(block.towerId)! })));
    await this.dirty.markDistricts(changed.map(({ towerId, tEnd }) => [towerId, tEnd]));
    await this.dirty.settle(
      2,
      made.map(({ row }) => row),
    );
  }

  /** Those that are closed: all expected readings are in, or the grace after the block's end is over. */
  private async closedOf(rows: readonly DirtyRow[]): Promise<Waiting[]> {
    const towers = new Map<number, TowerLayout>();
    for (const id of new Set(rows.map((row) => row.subject))) towers.set(id, await this.layouts.of(id));
    const blocks = rows.map(({ subject, t }) => ({
      ...{ towerId: subject, tEnd: t },
      sensorIds: towers.get(subject)!.sensors.map(({ id }) => id),
    }));
    const found = await this.store.means(blocks);
    const now = this.clock.now();
    return rows.flatMap((row, i): Waiting[] => {
      const tower = towers.get(row.subject)!;
      const isClosed = row.t + graceS(tower.intervalS) <= now || isComplete(tower, found[i]!.means);
      return isClosed ? [{ row, tower, ...found[i]! }] : [];
    });
  }

  /** The PM2.5 mean of the hour that ends with each block, where its tower measures it and 75 % is there. */
  private async pm25Hours(closed: readonly Waiting[]): Promise<(number | undefined)[]> {
    const asked = closed.flatMap(({ row, tower }, at) => {
      const sensor = pm25SensorOf(tower);
      return sensor ? [{ at, tower, sensorId: sensor.id, tEnd: row.t }] : [];
    });
    const found = await this.store.hours(asked);
    const hours: (number | undefined)[] = [];
    found.forEach((means, i) => (hours[asked[i]!.at] = hourMean(means, asked[i]!.tower.blockS)));
    return hours;
  }
}

const isComplete = (tower: TowerLayout, means: readonly KeptMean[]): boolean =>
  tower.sensors.every(({ id, retiredAt }) => {
    const kept = means.find((each) => each.sensorId === id);
    return retiredAt !== null || (kept !== undefined && kept.n >= expectedReadings(tower));
  });
