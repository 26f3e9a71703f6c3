import type { Database } from 'sqlite3';

/** Hands each read to the read handle with the least to do. */
export class ReadPool {
  private readonly load: number[];

  constructor(private readonly readers: readonly Database[]) {
    this.load = readers.map(() => 0);
  }

  /** The handle for the next read and what to call when it is done. */
  take(): { reader: Database; done: () => void } {
    const k = this.load.indexOf(Math.min(...this.load));
    const reader = this.readers[k];
    if (!reader) throw new Error('No read handle is open.');
    this.load[k] = (this.load[k] ?? 0) + 1;
    return { reader, done: () => (this.load[k] = (this.load[k] ?? 0) - 1) };
  }
}
