import { randomUUID } from 'node:crypto';
import type { ComputePool } from '../../compute/compute-pool';
import { NotTextError } from '../parse/decode-text';
import { HeaderError } from '../parse/parsed-readings';
import type { FileToRead, HowToRead, PieceRead } from './file-reading';
import { closeFileTask, readPieceTask } from './read-piece.task';

/** A piece of a file, read. */
export interface ReadWithBytes {
  readonly read: PieceRead;
  /** Bytes of the file that it is. */
  readonly bytes: number;
}

/** A file that is read in the compute thread, one piece ahead of whoever writes what came out. */
export class FileInThread {
  private readonly id = randomUUID();
  private begun = false;
  private last: Promise<unknown> = Promise.resolve();

  constructor(
    private readonly pool: ComputePool,
    private readonly toRead: FileToRead,
  ) {}

  /** Reads the file piece by piece; `how` is asked for each how its rows are treated. */
  async *pieces(pieces: AsyncIterable<Buffer>, how: () => HowToRead): AsyncGenerator<ReadWithBytes> {
    let ahead: Promise<ReadWithBytes> | undefined;
    try {
      for await (const piece of pieces) {
        const before = ahead;
        ahead = this.read(piece, how());
        // Awaited below; a failure must not count as unhandled until then.
        ahead.catch(() => undefined);
        if (before) yield await before;
      }
      if (ahead) yield await ahead;
      ahead = undefined;
      yield await this.read(undefined, how());
    } finally {
      await ahead?.catch(() => undefined);
    }
  }

  /** Lets the thread forget the file. */
  async close(): Promise<void> {
    if (this.begun) await this.pool.run(closeFileTask, this.id);
  }

  /** A piece is handed over when the one before is done: the pool may take two that wait in either order. */
  private read(piece: Buffer | undefined, how: HowToRead): Promise<ReadWithBytes> {
    const read = this.last.then(() => this.readNow(piece, how));
    this.last = read;
    return read;
  }

  private async readNow(piece: Buffer | undefined, how: HowToRead): Promise<ReadWithBytes> {
    const begin = this.begun ? undefined : this.toRead;
    this.begun = true;
    const read = await this.pool.run(readPieceTask, { id: this.id, begin, piece, how });
    if (read.fault?.kind === 'header') throw new HeaderError(read.fault.message);
    if (read.fault) throw new NotTextError(read.fault.message);
    return { read, bytes: piece?.length ?? 0 };
  }
}
