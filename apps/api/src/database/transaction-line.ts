import type { Release } from './gate';
import { callOn, refuse, type SqliteCall } from './sqlite-call';
import { transactionStep } from './statement-kind';
import type { StoreHandles } from './store-handles';

/** A transaction's statements: BEGIN waits at the gate; COMMIT, ROLLBACK and closing give the write handle back. */
export class TransactionLine {
  private release: Release | undefined;

  constructor(private readonly store: StoreHandles) {}

  send(call: SqliteCall): void {
    const step = transactionStep(call.sql);
    if (step === 'begin') void this.begin(call);
    else if (!this.release) refuse(call, new Error('This transaction is over; the statement came too late.'));
    else if (step === 'commit')
      callOn(this.store.writer, call, (error) => (error ? this.undo() : this.giveBack()));
    else if (step === 'rollback') callOn(this.store.writer, call, () => this.giveBack());
    else callOn(this.store.writer, call, () => undefined);
  }

  close(): Promise<void> {
    this.undo();
    return Promise.resolve();
  }

  private async begin(call: SqliteCall): Promise<void> {
    try {
      this.release = await this.store.enter();
      callOn(this.store.writer, call, (error) => error && this.giveBack());
    } catch (error) {
      refuse(call, error);
    }
  }

  /** Rolls back what a failed COMMIT or an unfinished transaction left open, before anybody else may write. */
  private undo(): void {
    if (this.release) this.store.writer.run('ROLLBACK', () => this.giveBack());
  }

  private giveBack(): void {
    this.release?.();
    this.release = undefined;
  }
}
