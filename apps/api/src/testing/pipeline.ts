import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Global, Module } from '@nestjs/common';
import { Test, type TestingModule } from '@nestjs/testing';
import { Clock, SetClock } from '../common/clock';
import { ComputePool } from '../compute/compute-pool';
import { Settings } from '../config/settings';
import { DatabaseModule } from '../database/database.module';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { Hours } from '../profiles/hours';
import { ProfileStore } from '../profiles/profile-store';
import { ProfilesStage } from '../profiles/profiles.stage';
import { ReadingWindows } from '../screening/reading-windows';
import { ScreeningStage } from '../screening/screening.stage';
import { ScreeningStore } from '../screening/screening-store';
import { TowerLayouts } from '../towers/tower-layouts';
import { ImportStore } from '../readings/importing/import-store';
import { ReadingTaker } from '../readings/importing/reading-taker';
import { ReadingsService } from '../readings/readings.service';
import { ReadingsStore } from '../readings/readings-store';

/** The way of a reading on a store of its own, without the rest of the house. */
export interface Pipeline {
  readonly sql: Sql;
  readonly clock: SetClock;
  readonly readings: ReadingsService;
  readonly dirty: DirtyStages;
  readonly work: UnitOfWork;
  /** Makes a tower with these sensors and gives their ids. */
  makeTower(tower: TestTower): Promise<{ towerId: number; sensorIds: number[] }>;
  close(): Promise<void>;
}

/** A tower to test on. */
export interface TestTower {
  readonly intervalS: number;
  readonly blockS: number;
  readonly sensors: readonly { readonly name: string; readonly quantity: string; readonly heightM: number }[];
  readonly screening?: 'full' | 'report-only';
}

const pieces = [
  ...[ComputePool, TowerLayouts, ReadingsStore, ImportStore, ReadingTaker, ReadingsService],
  ...[ReadingWindows, ScreeningStore, ScreeningStage],
  ...[ProfileStore, Hours, ProfilesStage],
];

async function open(dataDir: string, clock: SetClock): Promise<TestingModule> {
  @Global()
  @Module({
    providers: [
      { provide: Settings, useValue: Object.assign(new Settings(), { dataDir }) },
      { provide: Clock, useValue: clock },
    ],
    exports: [Settings, Clock],
  })
  class Surroundings {}
  const module = await Test.createTestingModule({
    imports: [Surroundings, DatabaseModule],
    providers: pieces,
  }).compile();
  return module.init();
}

async function makeTower(sql: Sql, tower: TestTower): Promise<{ towerId: number; sensorIds: number[] }> {
  const { intervalS, blockS, screening = 'full' } = tower;
  const [made] = await sql.returning<{ id: number }>(
    `WITH one AS (SELECT 1) INSERT INTO tower (slug, name, elevation_m, latitude, longitude, interval_s, block_s,
       screening, created_at)
     SELECT 'mast-' || (SELECT count(*) FROM tower), 'Mast', 1150, 45, -110, $1, $2, $3, 0 FROM one RETURNING id`,
    [intervalS, blockS, screening],
  );
  const towerId = made!.id;
  const sensorIds: number[] = [];
  for (const { name, quantity, heightM } of tower.sensors) {
    const [sensor] = await sql.returning<{ id: number }>(
      `WITH one AS (SELECT 1) INSERT INTO sensor (tower_id, name, quantity, unit)
       SELECT $1, $2, $3, '' FROM one RETURNING id`,
      [towerId, name, quantity],
    );
    await sql.run('INSERT INTO sensor_version (sensor_id, from_t, height_m, sigma) VALUES ($1, 0, $2, 0.1)', [
      sensor!.id,
      heightM,
    ]);
    sensorIds.push(sensor!.id);
  }
  return { towerId, sensorIds };
}

/** Opens a store in a temporary folder with the way of a reading over it, under a clock that stands at `nowS`. */
export async function openPipeline(nowS: number): Promise<Pipeline> {
  const dataDir = await mkdtemp(path.join(tmpdir(), 'lidwatch-pipeline-'));
  const clock = new SetClock(nowS);
  const module = await open(dataDir, clock);
  const sql = module.get(Sql);
  return {
    ...{ sql, clock },
    readings: module.get(ReadingsService),
    dirty: module.get(DirtyStages),
    work: module.get(UnitOfWork),
    makeTower: (tower) => makeTower(sql, tower),
    close: async () => {
      await module.close();
      await rm(dataDir, { recursive: true });
    },
  };
}
