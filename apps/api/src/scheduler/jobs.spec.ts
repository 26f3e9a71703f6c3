import { SchedulerRegistry } from '@nestjs/schedule';
import { SetClock, SystemClock, type Clock } from '../common/clock';
import { migrate } from '../database/migrate';
import { openTestStore, signal, type TestStore } from '../testing/test-store';
import { JobRows } from './job-rows';
import { JobsService } from './jobs.service';

const now = 1_768_525_200;

describe('jobs', () => {
  let store: TestStore;
  let rows: JobRows;
  beforeEach(async () => {
    store = await openTestStore();
    await migrate(store.sequelize);
    rows = new JobRows(store.sql);
  });
  afterEach(() => store.close());

  const service = (clock: Clock) => new JobsService(new SchedulerRegistry(), rows, clock);

  it('keep when they last ran and how', async () => {
    const clock = new SetClock(now);
    const jobs = service(clock);
    jobs.register('collect', 60, async () => {
      clock.advance(5);
      return '12 readings';
    });
    await jobs.runNow('collect');
    await jobs.runNow('collect');
    expect(await rows.list()).toEqual([
      {
        name: 'collect',
        lastStartedAt: now + 5,
        lastEndedAt: now + 10,
        lastResult: '12 readings',
        nextAt: now + 65,
        runs: 2,
        failures: 0,
      },
    ]);
  });

  it('run one at a time: who asks meanwhile waits for the run under way', async () => {
    const jobs = service(new SetClock(now));
    const go = signal();
    let runs = 0;
    jobs.register('slow', 60, async () => {
      runs++;
      await go.given;
    });
    const all = [jobs.runNow('slow'), jobs.runNow('slow'), jobs.runNow('slow')];
    go.give();
    await Promise.all(all);
    expect(runs).toBe(1);
    await jobs.runNow('slow');
    expect(runs).toBe(2);
  });

  it('keep a failure, and run again', async () => {
    const jobs = service(new SetClock(now));
    let fails = true;
    jobs.register('shaky', 60, async () => {
      if (fails) throw new Error('the folder is gone');
    });
    await jobs.runNow('shaky');
    expect((await rows.list())[0]).toMatchObject({
      lastResult: 'failed: the folder is gone',
      failures: 1,
      runs: 1,
    });
    fails = false;
    await jobs.runNow('shaky');
    expect((await rows.list())[0]).toMatchObject({ lastResult: 'done', failures: 1, runs: 2 });
  });

  it.each([
    ['a set clock', new SetClock(now), 0],
    ['the computer’s clock', new SystemClock(), 1],
  ])('under %s begin by themselves or not', async (_, clock, runs) => {
    const jobs = service(clock);
    let ran = 0;
    jobs.register('count', 3600, async () => void ran++);
    jobs.onApplicationBootstrap();
    await jobs.beforeApplicationShutdown();
    expect(ran).toBe(runs);
  });

  it('have a name each', () => {
    const jobs = service(new SetClock(now));
    jobs.register('twin', 60, async () => undefined);
    expect(() => jobs.register('twin', 60, async () => undefined)).toThrow('two jobs by the name "twin"');
    expect(() => jobs.runNow('nobody')).toThrow('no job by the name');
  });
});
