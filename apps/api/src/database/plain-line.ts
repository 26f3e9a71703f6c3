import { callOn, refuse, type SqliteCall } from './sqlite-call';
import { onlyReads } from './statement-kind';
import type { StoreHandles } from './store-handles';

/** Statements outside a transaction: reads go to a read handle and never wait for a write; a write takes its turn. */
export class PlainLine {
  constructor(private readonly store: StoreHandles) {}

  send(call: SqliteCall): void {
    if (onlyReads(call.sql)) this.read(call);
    else void this.write(call);
  }

  close(): Promise<void> {
    return this.store.close();
  }

  private read(call: SqliteCall): void {
    const { reader, done } = this.store.reads.take();
    callOn(reader, call, done);
  }

  private async write(call: SqliteCall): Promise<void> {
    try {
      const release = await this.store.enter();
      callOn(this.store.writer, call, release);
    } catch (error) {
      refuse(call, error);
    }
  }
}
