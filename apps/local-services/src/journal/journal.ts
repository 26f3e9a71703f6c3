import { open, type FileHandle } from 'node:fs/promises';

const READ_CHUNK_BYTES = 1 << 20;
const NEWLINE = 10;

/**
 * An append-only file of JSON lines. Memory holds one number per line (where it begins); lines are read back from the
 * disk when asked for. Appends made in the same turn go out in one write; an append resolves when it is written.
 */
export class Journal<T> {
  private starts = new Float64Array(1024);
  private end = 0;
  private lines = 0;
  private waiting: string[] = [];
  private flushing: Promise<void> | undefined;

  private constructor(private readonly file: FileHandle) {}

  /**
   * Opens or creates the file, and hands every line already there to `visit` in order. A last line without its end
   * (the process died while writing it) was never acknowledged and is cut off.
   */
  static async open<T>(path: string, visit: (record: T) => void = () => undefined): Promise<Journal<T>> {
    const journal = new Journal<T>(await open(path, 'a+'));
    await journal.load(visit);
    return journal;
  }

  /** Number of lines. */
  get count(): number {
    return this.lines;
  }

  /** Adds a record; resolves with its number (from 0) when it is on its way to the disk. */
  async append(record: T): Promise<number> {
    const line = JSON.stringify(record) + '\n';
    const index = this.note(Buffer.byteLength(line));
    this.waiting.push(line);
    this.flushing ??= Promise.resolve().then(() => this.flush());
    await this.flushing;
    return index;
  }

  /** The record with this number, once it is written. @throws RangeError when there is none. */
  async read(index: number): Promise<T> {
    if (!Number.isInteger(index) || index < 0 || index >= this.lines)
      throw new RangeError(`There is no record ${index}: the last one is ${this.lines - 1}.`);
    await this.flushing;
    const start = this.starts[index]!;
    const stop = index + 1 < this.lines ? this.starts[index + 1]! : this.end;
    const { buffer } = await this.file.read(Buffer.alloc(stop - start), 0, stop - start, start);
    return JSON.parse(buffer.toString()) as T;
  }

  /** Writes what waits and closes the file. */
  async close(): Promise<void> {
    await this.flushing;
    await this.file.close();
  }

  private async flush(): Promise<void> {
    try {
      while (this.waiting.length > 0) {
        const text = this.waiting.join('');
        this.waiting = [];
        await this.file.appendFile(text);
      }
    } finally {
      this.flushing = undefined;
    }
  }

  private note(bytes: number): number {
    if (this.lines === this.starts.length) {
      const longer = new Float64Array(this.starts.length * 2);
      longer.set(this.starts);
      this.starts = longer;
    }
    this.starts[this.lines] = this.end;
    this.end += bytes;
    return this.lines++;
  }

  private async load(visit: (record: T) => void): Promise<void> {
    let rest = Buffer.alloc(0);
    for (let position = 0; ;) {
      const { bytesRead, buffer } = await this.file.read(
        Buffer.alloc(READ_CHUNK_BYTES),
        0,
        READ_CHUNK_BYTES,
        position,
      );
      if (bytesRead === 0) break;
      position += bytesRead;
      rest = this.takeLines(Buffer.concat([rest, buffer.subarray(0, bytesRead)]), visit);
    }
    if (rest.length > 0) await this.file.truncate(this.end);
  }

  private takeLines(chunk: Buffer, visit: (record: T) => void): Buffer<ArrayBuffer> {
    let from = 0;
    for (let at = chunk.indexOf(NEWLINE); at >= 0; at = chunk.indexOf(NEWLINE, from)) {
      visit(JSON.parse(chunk.subarray(from, at).toString()) as T);
      this.note(at + 1 - from);
      from = at + 1;
    }
    return Buffer.from(chunk.subarray(from));
  }
}
