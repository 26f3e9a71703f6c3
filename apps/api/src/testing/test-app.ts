import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';

import type { Server } from 'node:http';
import request, { type Agent } from 'supertest';
import { AppModule } from '../app.module';
import { configureApp } from '../app.setup';
import { Clock, SetClock } from '../common/clock';
import { Settings } from '../config/settings';
import { Sql } from '../database/sql';
import { temporaryFolder } from './temporary-folder';
import { testSettings } from './test-settings';

/** 2026-01-15 18:00 in Mountain time: a winter evening for tests to begin with. */
export const testNow = Date.UTC(2026, 0, 16, 1, 0, 0) / 1000;

/** What a test may set. */
export interface TestAppOptions {
  clock?: SetClock;
  settings?: Partial<Settings>;
  /** A data folder to go on with; without it a new one, removed by `close`. */
  dataDir?: string;
}

/** A running service for a test. */
export interface TestApp {
  app: NestExpressApplication;
  /** Sends requests without a session. */
  http: Agent;
  sql: Sql;
  clock: SetClock;
  settings: Settings;
  close: () => Promise<void>;
}

/** The whole service on a data folder of its own with the real schema, under a set clock, its jobs not started. */
export async function createTestApp(options: TestAppOptions = {}): Promise<TestApp> {
  const { folder, remove } = options.dataDir
    ? { folder: options.dataDir, remove: () => undefined }
    : temporaryFolder();
  const clock = options.clock ?? new SetClock(testNow);
  const settings = testSettings(folder, options.settings);
  const app = await startApp(settings, clock);
  const close = async (): Promise<void> => {
    await app.close();
    remove();
  };
  return {
    app,
    http: request.agent(app.getHttpServer() as Server),
    sql: app.get(Sql),
    clock,
    settings,
    close,
  };
}

async function startApp(settings: Settings, clock: SetClock): Promise<NestExpressApplication> {
  const module = await Test.createTestingModule({ imports: [AppModule] })
    .overrideProvider(Settings)
    .useValue(settings)
    .overrideProvider(Clock)
    .useValue(clock)
    .compile();
  const app = module.createNestApplication<NestExpressApplication>({ bodyParser: false, logger: false });
  configureApp(app);
  await app.init();
  return app;
}
