import type { Database } from 'sqlite3';
import { Gate, type Release } from './gate';
import { closeHandles, type Handles } from './handles';
import { ReadPool } from './read-pool';
import { unitHere } from './unit-context';

/** The handles of one database file with the gate before the writer: what all of sequelize's connections share. */
export class StoreHandles {
  readonly reads: ReadPool;
  readonly writer: Database;
  private closing: Promise<void> | undefined;

  constructor(
    private readonly handles: Handles,
    private readonly gate: Gate,
  ) {
    this.reads = new ReadPool(handles.readers);
    this.writer = handles.writer;
  }

  /**
   * Waits for the write handle. Rejects at once when the asking context holds it already (it would wait for itself),
   * and when it belongs to a unit that was rolled back (its write would survive what it was part of).
   */
  async enter(): Promise<Release> {
    const unit = unitHere();
    if (unit?.state === 'open')
      throw new Error('This context already holds the write handle: it must write in its own transaction.');
    if (unit?.state === 'rolled back')
      throw new Error(
        'This write belongs to a transaction that was rolled back: begin a new one with UnitOfWork.run.',
      );
    return this.gate.enter(unit?.lane ?? 'people');
  }

  /** Lets those who wait at the gate finish, then closes every handle; asked again, it waits for the same. */
  close(): Promise<void> {
    this.closing ??= this.gate.close().then(() => closeHandles(this.handles));
    return this.closing;
  }
}
