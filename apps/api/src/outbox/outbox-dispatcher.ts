import { randomUUID } from 'node:crypto';
import { Injectable, Logger, type BeforeApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import { Clock } from '../common/clock';
import { JobsService } from '../scheduler/jobs.service';
import type { Channel, OutboundMessage, Outcome, SendingChannel } from './channel';
import { OutboxQueue, type Result } from './outbox-queue';

const SWEEP_S = 5;
const BATCH = 400;
/** Results are written down this often while a batch is under way, so that a crash leaves few in doubt. */
const WRITE_EVERY_MS = 150;

/**
 * Sends what is due: each channel one batch after the other, so many messages at once. Woken when something is
 * queued, and every few seconds for later attempts.
 */
@Injectable()
export class OutboxDispatcher implements OnModuleInit, BeforeApplicationShutdown {
  private readonly logger = new Logger(OutboxDispatcher.name);
  private readonly owner = randomUUID();
  private readonly channels = new Map<Channel, SendingChannel>();
  private readonly running = new Map<Channel, Promise<void>>();
  private readonly recalled = new Set<Channel>();
  private closing = false;

  constructor(
    private readonly queue: OutboxQueue,
    private readonly clock: Clock,
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
    const sending = this.channels.get(channel)!;
    if (!this.recalled.has(channel)) await this.recallOrphans(channel, sending);
    while (!this.closing) {
      const messages = await this.queue.take(channel, this.owner, BATCH);
      if (messages.length === 0) return;
      await this.sendAll(sending, messages);
    }
  }

  /** After a crash: asks the other side what became of each message that was under way before sending it again. */
  private async recallOrphans(channel: Channel, sending: SendingChannel): Promise<void> {
    const orphans = await this.queue.orphans(channel, this.owner);
    if (orphans.length > 0)
      this.logger.warn(`${orphans.length} ${channel} messages were under way when the service last stopped`);
    const lost: OutboundMessage[] = [];
    const known: Result[] = [];
    for (const message of orphans) {
      const outcome = await sending.recall?.(message);
      if (outcome) known.push({ message, outcome });
      else lost.push(message);
    }
    await this.queue.settle(known);
    await this.queue.putBack(lost);
    this.recalled.add(channel);
  }

  private async sendAll(sending: SendingChannel, messages: readonly OutboundMessage[]): Promise<void> {
    const waiting = [...messages];
    let results: Result[] = [];
    const write = async (): Promise<void> => {
      const batch = results;
      results = [];
      try {
        await this.queue.settle(batch);
      } catch (error) {
        results = [...batch, ...results];
        throw error;
      }
    };
    const writeNow = (): Promise<void> =>
      write().catch((error: unknown) => this.logger.error(error, 'Results are written again shortly'));
    const one = async (): Promise<void> => {
      for (let message = waiting.shift(); message; message = waiting.shift()) {
        const outcome = await this.attempt(sending, message);
        results.push({ message, outcome });
      }
    };
    let writing = Promise.resolve();
    const timer = setInterval(() => (writing = writing.then(writeNow)), WRITE_EVERY_MS);
    try {
      await Promise.all(Array.from({ length: sending.atOnce }, one));
    } finally {
      clearInterval(timer);
    }
    await writing;
    await write();
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
