import { createReadStream } from 'node:fs';
import { open } from 'node:fs/promises';
import type { FilePosition } from '../../towers/source-positions';
import { NotTextError } from '../parse/decode-text';
import { countLines, hashUpTo, LONGEST_LINE, NEWLINE, type ReadingOn } from './new-lines';

/**
 * The whole lines of a large file from its beginning, piece by piece. What follows the last line end is left for the next
 * time, unless it is to be taken, too.
 */
export class WholeFile {
  private position = 0;
  private rowNo = 0;
  private rest: Buffer = Buffer.alloc(0);

  constructor(
    private readonly path: string,
    private readonly on: ReadingOn,
  ) {}

  /** Its bytes, once. */
  async *bytes(): AsyncGenerator<Buffer> {
    for await (const piece of createReadStream(this.path) as AsyncIterable<Buffer>) {
      const bytes = this.rest.length === 0 ? piece : Buffer.concat([this.rest, piece]);
      const end = bytes.lastIndexOf(NEWLINE) + 1;
      this.rest = bytes.subarray(end);
      if (this.rest.length > LONGEST_LINE)
        throw new NotTextError('A line is longer than 8 MB. Look at its line ends.');
      if (end > 0) yield this.passed(bytes.subarray(0, end));
    }
    if (!this.on.takeUnfinished || this.rest.length === 0) return;
    yield this.passed(this.rest);
    this.rest = Buffer.alloc(0);
  }

  /** Whether an unfinished line waits at the end, once all bytes were read. */
  get unfinished(): boolean {
    return this.rest.length > 0;
  }

  /** How far the file is read, once all bytes were; `header` is its lines up to and with the header. */
  async after(header: string): Promise<FilePosition> {
    const { position, rowNo } = this;
    const { inode, whole = false } = this.on;
    const file = await open(this.path, 'r');
    try {
      const { ino } = await file.stat();
      const headSha256 = await hashUpTo(file, position, whole);
      return { inode: inode ?? ino, position, rowNo, header, headSha256 };
    } finally {
      await file.close();
    }
  }

  private passed(bytes: Buffer): Buffer {
    this.position += bytes.length;
    this.rowNo += countLines(bytes);
    return bytes;
  }
}
