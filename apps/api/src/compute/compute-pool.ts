import path from 'node:path';
import { Injectable, Logger, type OnApplicationShutdown } from '@nestjs/common';
import { Piscina } from 'piscina';
import { ComputeFault } from './compute-fault';
import type { ComputeTask, ThreadCall } from './compute-task';

/** Memory of the thread, MB: work that needs more fails alone, not the service. */
const MOST_MEMORY_MB = 512;
/** Of it for what lives shortly, as most of a computation does. */
const YOUNG_MEMORY_MB = 96;
const THREAD = path.join(__dirname, 'thread.js');
/** A crash of the thread, as opposed to an error that the work threw. */
const isCrash = (error: unknown): boolean =>
  /^(ERR_WORKER_OUT_OF_MEMORY|ERR_WORKER_INIT_FAILED)$/.test((error as NodeJS.ErrnoException).code ?? '') ||
  /worker exited|terminating worker/i.test((error as Error).message ?? '');

/**
 * Heavy computing beside the service: one thread of low priority, started when first needed, that takes one task after
 * the other. It only computes; whoever asked writes what came out. Where the code is not built (unit tests), tasks run
 * in this thread.
 */
@Injectable()
export class ComputePool implements OnApplicationShutdown {
  private readonly log = new Logger(ComputePool.name);
  private pool: Piscina | undefined;
  private readonly going = new Set<Promise<unknown>>();

  /**
   * Runs a task. An error that the task throws is thrown on.
   *
   * @throws ComputeFault where the thread itself ended; the next task gets a new one.
   */
  async run<Given, Result>(
    task: ComputeTask<Given, Result>,
    given: Given,
    transfer: ArrayBuffer[] = [],
  ): Promise<Result> {
    if (!task.file.endsWith('.js')) {
      await new Promise((resolve) => setImmediate(resolve));
      return task.work(given);
    }
    const call: ThreadCall = { file: task.file, name: task.name, given };
    const going = this.started().run(call, { transferList: transfer }) as Promise<Result>;
    this.going.add(going);
    try {
      return await going;
    } catch (error) {
      if (isCrash(error)) throw new ComputeFault(task.name, error);
      throw error;
    } finally {
      this.going.delete(going);
    }
  }

  /** Lets the tasks at hand end (they are short), then the thread. */
  async onApplicationShutdown(): Promise<void> {
    await Promise.allSettled(this.going);
    await this.pool?.destroy();
  }

  private started(): Piscina {
    if (this.pool) return this.pool;
    this.pool = new Piscina({
      filename: THREAD,
      ...{ minThreads: 1, maxThreads: 1 },
      resourceLimits: { maxOldGenerationSizeMb: MOST_MEMORY_MB, maxYoungGenerationSizeMb: YOUNG_MEMORY_MB },
    });
    this.pool.on('error', (error) => this.log.error('The compute thread failed', error));
    this.log.log('Heavy computing has a thread of its own.');
    return this.pool;
  }
}
