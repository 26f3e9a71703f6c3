import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Logger } from 'nestjs-pino';
import { AppModule } from '../app.module';
import { configureApp } from '../app.setup';
import { SetClock, SystemClock } from '../common/clock';
import { runUnder } from '../common/common.module';
import { StartFault } from '../common/start-fault';
import { readSettings } from '../config/read-settings';
import type { Settings } from '../config/settings';
import { lockDataDir } from '../database/process-lock';
import { DistrictsService } from '../districts/districts.service';
import { ListImportService } from '../subscribers/list-import.service';
import { DemoHistory } from './demo-history';
import { demoState, markDemo, removeHalfDemo } from './demo-mark';
import { DemoOffice } from './demo-office';
import { bouncingMail, demoPeople } from './demo-people';
import { demoScenario } from './demo-scenario';
import { FeedingGate } from './feeding-gate';
import { historySpans } from './history-spans';
import { LoggerClient } from './logger-client';

/** The office is set up this long before its first winter, s. */
const SET_UP_BEFORE_S = 14 * 86_400;

/** Pauses between a text's call-backs while history is lived through, and afterwards, ms. */
const HURRIED_MS = 1;
const USUAL_MS = 400;

/** Where the local services are unless the environment says otherwise. */
const USUAL_LOCAL_SERVICES = 'http://127.0.0.1:3001';

const loggersOf = ({ localServices }: Settings): LoggerClient =>
  new LoggerClient(localServices.url ?? USUAL_LOCAL_SERVICES);

/**
 * At the first start with the demo on: makes the demo's office and lives through its winters under a set clock, before
 * the service itself is made. Later starts return at once, and so does a data folder that holds an installation
 * without the demo. A start that was cut off is begun anew, and says so.
 */
export async function feedDemo(): Promise<void> {
  const settings = readSettings((name) => process.env[name]);
  if (!settings.demo) return;
  const state = demoState(settings.dataDir);
  if (state === 'fed') return;
  if (state === 'without demo') {
    console.log(`${settings.dataDir} holds an installation without the demo; it is left as it is.`);
    return;
  }
  if (state === 'cut off') {
    console.log('The last first start was cut off while the demo was fed in; it is fed in anew.');
    const unlock = await lockDataDir(settings.dataDir);
    removeHalfDemo(settings.dataDir);
    await unlock();
  }
  await feed(settings);
}

/**
 * Has the demo's loggers write on by themselves; what fell due while nobody was there is written at once. Without the
 * local services the demo still runs, only no new readings come.
 */
export async function wakeDemoLoggers(settings: Settings): Promise<void> {
  if (!settings.demo || demoState(settings.dataDir) !== 'fed') return;
  try {
    await loggersOf(settings).live();
  } catch (error) {
    if (!(error instanceof StartFault)) throw error;
    console.warn(`No new readings will come: ${error.message}`);
  }
}

async function feed(settings: Settings): Promise<void> {
  const scenario = demoScenario();
  const timeZone = scenario.districts[0]!.timeZone;
  const now = new SystemClock().now();
  const spans = historySpans(now, timeZone);
  const loggers = loggersOf(settings);
  await loggers.begin(now);
  await loggers.statusDelay(HURRIED_MS);
  markDemo(settings.dataDir, 'being fed');

  const gate = new FeedingGate();
  runUnder(new SetClock(spans[0]!.from - SET_UP_BEFORE_S));
  const app = await gatedApp(gate, settings.port);
  try {
    const staff = await app.get(DemoOffice, { strict: false }).setUp(scenario);
    const people = demoPeople(scenario.list);
    await loggers.bouncing(bouncingMail(scenario.list, people));
    const list = app.get(ListImportService, { strict: false });
    await list.add(people.slice(0, scenario.list.duringHistory), scenario.list.origin);
    const districts = await app.get(DistrictsService, { strict: false }).list();
    await app.get(DemoHistory, { strict: false }).live({
      ...{ scenario, staff, loggers, spans, timeZone },
      districtIds: new Map(districts.map(({ slug, id }) => [slug, id])),
      onStep: (t, share) => (gate.progress = progressOf(t, share, timeZone)),
    });
    await list.add(people, scenario.list.origin);
  } finally {
    await app.close();
    runUnder(new SystemClock());
  }
  await loggers.statusDelay(USUAL_MS);
  markDemo(settings.dataDir, 'fed');
}

async function gatedApp(gate: FeedingGate, port: number): Promise<NestExpressApplication> {
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    bodyParser: false,
    bufferLogs: true,
    abortOnError: false,
  });
  app.useLogger(app.get(Logger));
  app.use(gate.pass);
  configureApp(app);
  await app.listen(port);
  return app;
}

function progressOf(t: number, share: number, timeZone: string): string {
  const day = new Intl.DateTimeFormat('en-US', { dateStyle: 'long', timeZone }).format(t * 1000);
  return `The demo's winters are fed in: ${Math.floor(share * 100)} % (${day})`;
}
