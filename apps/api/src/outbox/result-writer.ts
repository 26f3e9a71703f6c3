import { Logger } from '@nestjs/common';
import type { Result } from './outbox-queue';

/** Results are written this often, so that a crash leaves few messages in doubt and the store few transactions. */
const EVERY_MS = 150;

/** Gathers how attempts went and writes it many at a time; what could not be written is tried again. */
export class ResultWriter {
  private readonly logger = new Logger(ResultWriter.name);
  private results: Result[] = [];
  private writing = Promise.resolve();
  private readonly timer: NodeJS.Timeout;

  constructor(private readonly settle: (results: Result[]) => Promise<void>) {
    this.timer = setInterval(() => (this.writing = this.writing.then(() => this.writeLogged())), EVERY_MS);
  }

  /** Takes a result to be written soon. */
  add(result: Result): void {
    this.results.push(result);
  }

  /** Writes the rest. Rejects when that fails; the messages then stay *sending* until they are looked into. */
  async close(): Promise<void> {
    clearInterval(this.timer);
    await this.writing;
    await this.write();
  }

  private async write(): Promise<void> {
    const batch = this.results;
    this.results = [];
    try {
      await this.settle(batch);
    } catch (error) {
      this.results = [...batch, ...this.results];
      throw error;
    }
  }

  private writeLogged(): Promise<void> {
    return this.write().catch((error: unknown) =>
      this.logger.error(error, 'Results are written again shortly'),
    );
  }
}
