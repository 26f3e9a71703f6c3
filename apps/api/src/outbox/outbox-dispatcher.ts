import { Injectable, Logger, type BeforeApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import { JobsService } from '../scheduler/jobs.service';
import type { Channel, OutboundMessage, Outcome, SendingChannel } from './channel';
import { OutboxQueue } from './outbox-queue';
import { ResultWriter } from './result-writer';
import { Supply } from './supply';

const SWEEP_S = 5;
const BATCH = 250;

/**
 * Sends what is due: one run per channel at a time, so many messages at once. Woken when something is queued, and
 * every few seconds for later attempts.
 */
@Injectable()
export class OutboxDispatcher implements OnModuleInit, BeforeApplicationShutdown {
  private readonly logger = new Logger(OutboxDispatcher.name);
  private readonly channels = new Map<Channel, SendingChannel>();
  private readonly running = new Map<Channel, Promise<void>>();
  private closing = false;

  constructor(
    private readonly queue: OutboxQueue,
    private readonly jobs: JobsService,
  ) {}

  onModuleInit(): void {
    this.jobs.register('outbox', SWEEP_S, async () => {
      await this.dispatch();
      return 'sent what was due';
    });
  }

  /** Says who sends the messages of a channel; call it in `onModuleInit`. */
  registerChannel(channel: Channel, sending: SendingChannel): void {
    this.channels.set(channel, sending);
  }

  /** Begins to send after something was queued. */
  @OnEvent('outbox.queued')
  wake(): void {
    this.dispatch().catch((error: unknown) => this.logger.error(error));
  }

  /** Sends everything that is due now and resolves when nothing due is left. */
  async dispatch(): Promise<void> {
    await Promise.all([...this.channels.keys()].map((channel) => this.once(channel)));
  }

  /** Finishes the messages under way and takes no more. */
  async beforeApplicationShutdown(): Promise<void> {
    this.closing = true;
    await Promise.allSettled(this.running.values());
  }

  private async once(channel: Channel): Promise<void> {
    const before = this.running.get(channel);
    if (before) await before;
    const again = this.running.get(channel);
    if (again) return again;
    const run = this.drain(channel).finally(() => this.running.delete(channel));
    this.running.set(channel, run);
    return run;
  }

  private async drain(channel: Channel): Promise<void> {
    if (this.closing) return;
    const interrupted = await this.queue.putBackInterrupted(channel);
    if (interrupted > 0)
      this.logger.warn(`${interrupted} ${channel} messages were interrupted and are looked into again`);
    const sending = this.channels.get(channel)!;
    const supply = new Supply(() => this.queue.take(channel, BATCH), sending.atOnce);
    const results = new ResultWriter((batch) => this.queue.settle(batch));
    const one = async (): Promise<void> => {
      while (!this.closing) {
        const message = await supply.next();
        if (!message) return;
        results.add({ message, outcome: await this.attempt(sending, message) });
      }
    };
    const takers = await Promise.allSettled(Array.from({ length: sending.atOnce }, one));
    await results.close();
    await this.queue.release(await supply.close());
    for (const taker of takers) if (taker.status === 'rejected') throw taker.reason;
  }

  private async attempt(sending: SendingChannel, message: OutboundMessage): Promise<Outcome> {
    try {
      return await sending.send(message);
    } catch (error) {
      this.logger.error(error, `Message ${message.id}`);
      return { kind: 'retry', code: 'unexpected', detail: (error as Error).message };
    }
  }
}
