import {
  Injectable,
  Logger,
  type BeforeApplicationShutdown,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import { SchedulerRegistry } from '@nestjs/schedule';
import { Clock, SetClock } from '../common/clock';
import type { Job } from './job';
import { JobRows } from './job-rows';

/**
 * Runs jobs every so often, each one at a time: a turn that comes while the last is still running is left out. The
 * row of each job keeps when it last began and ended and how. Under a set clock nothing runs until `start`.
 */
@Injectable()
export class JobsService implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(JobsService.name);
  private readonly jobs = new Map<string, Job>();
  private readonly running = new Map<string, Promise<void>>();
  private started = false;

  constructor(
    private readonly registry: SchedulerRegistry,
    private readonly rows: JobRows,
    private readonly clock: Clock,
  ) {}

  /** Makes a job known; call it in `onModuleInit`. Once started it runs at once and then every so many seconds. */
  register(name: string, everySeconds: number, run: Job['run']): void {
    if (this.jobs.has(name)) throw new Error(`There are two jobs by the name "${name}".`);
    const job = { name, everySeconds, run };
    this.jobs.set(name, job);
    if (this.started) this.begin(job);
  }

  /** Starts every job. */
  start(): void {
    if (this.started) return;
    this.started = true;
    for (const job of this.jobs.values()) this.begin(job);
  }

  /** Runs a job now, or waits for the run under way. */
  runNow(name: string): Promise<void> {
    const job = this.jobs.get(name);
    if (!job) throw new Error(`There is no job by the name "${name}".`);
    return this.turn(job);
  }

  onApplicationBootstrap(): void {
    if (!(this.clock instanceof SetClock)) this.start();
  }

  /** Starts no job any more and waits for those under way. */
  async beforeApplicationShutdown(): Promise<void> {
    for (const name of this.registry.getIntervals()) this.registry.deleteInterval(name);
    await Promise.all(this.running.values());
  }

  private begin(job: Job): void {
    const interval = setInterval(() => void this.turn(job), job.everySeconds * 1000);
    this.registry.addInterval(job.name, interval);
    void this.turn(job);
  }

  private turn(job: Job): Promise<void> {
    const already = this.running.get(job.name);
    if (already) return already;
    const run = this.runOnce(job).finally(() => this.running.delete(job.name));
    this.running.set(job.name, run);
    return run;
  }

  private async runOnce(job: Job): Promise<void> {
    const startedAt = this.clock.now();
    try {
      const result = (await job.run()) ?? 'done';
      await this.rows.ended(job, startedAt, this.clock.now(), result);
    } catch (error) {
      this.logger.error(error, `Job "${job.name}"`);
      await this.rows
        .failed(job, startedAt, this.clock.now(), error)
        .catch((fault: unknown) => this.logger.error(fault));
    }
  }
}
