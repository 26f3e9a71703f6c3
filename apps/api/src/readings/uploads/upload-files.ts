import { createHash, randomUUID } from 'node:crypto';
import { createReadStream, createWriteStream, existsSync } from 'node:fs';
import { mkdir, open, readdir, rename, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { Injectable } from '@nestjs/common';
import { Problem } from '../../common/problem';
import { Settings } from '../../config/settings';

/** Largest file of text that is taken, bytes. */
export const LARGEST_TEXT = 200_000_000;
/** Largest spreadsheet that is taken, bytes. */
export const LARGEST_WORKBOOK = 20_000_000;

/** A file as it came, not yet belonging to an upload. */
export interface ReceivedFile {
  /** Its name for now, within the folder of uploads. */
  readonly part: string;
  readonly kind: 'text' | 'workbook';
  readonly bytes: number;
  readonly sha256: string;
}

const PART = '.part';
const ZIP = Buffer.from([0x50, 0x4b, 0x03, 0x04]);

const tooLarge = (kind: ReceivedFile['kind']): Problem => {
  const limit = (kind === 'workbook' ? LARGEST_WORKBOOK : LARGEST_TEXT) / 1e6;
  const what = kind === 'workbook' ? 'A spreadsheet' : 'A file';
  return new Problem(
    'too-large',
    `${what} may have up to ${limit} MB. Split it by time, and send the parts.`,
  );
};

/** Counts, hashes and limits what passes; a file that begins as an archive does is a workbook. */
class Watched extends Transform {
  kind: ReceivedFile['kind'] = 'text';
  bytes = 0;
  private head = Buffer.alloc(0);
  private readonly hash = createHash('sha256');

  override _transform(
    chunk: Buffer,
    _: BufferEncoding,
    done: (error?: Error | null, data?: Buffer) => void,
  ): void {
    if (this.head.length < ZIP.length) {
      this.head = Buffer.concat([this.head, chunk]).subarray(0, ZIP.length);
      if (this.head.equals(ZIP)) this.kind = 'workbook';
    }
    this.bytes += chunk.length;
    if (this.bytes > LARGEST_TEXT + LARGEST_WORKBOOK) return done(tooLarge(this.kind));
    if (this.isTooLarge) return done();
    this.hash.update(chunk);
    done(null, chunk);
  }

  /** What comes beyond the limit is not kept; it is let pass for a while, since who still sends hears no answer. */
  get isTooLarge(): boolean {
    return this.bytes > (this.kind === 'workbook' ? LARGEST_WORKBOOK : LARGEST_TEXT);
  }

  digest(): string {
    return this.hash.digest('hex');
  }
}

/** What a fault of the disk or the connection means to who sent a file; other faults stay as they are. */
export const faultOf = (error: unknown): unknown => {
  const { code } = error as NodeJS.ErrnoException;
  if (code === 'ENOSPC' || code === 'EDQUOT') {
    return new Problem(
      'no-room',
      'The disk of the service is full. Make room there, then send the file again.',
    );
  }
  if (code === 'ECONNRESET' || code === 'ERR_STREAM_PREMATURE_CLOSE') {
    return new Problem('bad-request', 'The connection broke before the whole file was here. Send it again.');
  }
  return error;
};

/** The files that were uploaded, in the folder `uploads` of the data folder, each by the number of its upload. */
@Injectable()
export class UploadFiles {
  constructor(private readonly settings: Settings) {}

  /**
   * Keeps what a request sends, for now by a name of its own.
   *
   * @throws Problem `too-large`, `no-room`, or `bad-request` where the connection broke; nothing is left behind then.
   */
  async receive(body: Readable): Promise<ReceivedFile> {
    await mkdir(this.folder, { recursive: true });
    const part = `${randomUUID()}${PART}`;
    const file = path.join(this.folder, part);
    const watched = new Watched();
    try {
      await pipeline(body, watched, createWriteStream(file));
      if (watched.isTooLarge) throw tooLarge(watched.kind);
    } catch (error) {
      await rm(file, { force: true });
      throw faultOf(error);
    }
    return { part, kind: watched.kind, bytes: watched.bytes, sha256: watched.digest() };
  }

  /** Gives a received file to an upload. */
  async give(part: string, uploadId: number): Promise<void> {
    await rename(path.join(this.folder, part), this.pathOf(uploadId));
  }

  /** Where an upload's file lies. */
  pathOf(uploadId: number): string {
    return path.join(this.folder, String(uploadId));
  }

  /** Where the sheets of a workbook lie as text. */
  sheetsPathOf(uploadId: number): string {
    return `${this.pathOf(uploadId)}.sheets`;
  }

  /** A whole file as a stream of bytes. */
  stream(file: string, pieceBytes: number): Readable {
    return createReadStream(file, { highWaterMark: pieceBytes });
  }

  /** Bytes of a file from a place on, fewer at its end. */
  async slice(name: string, from: number, length: number): Promise<Buffer> {
    const file = await open(name, 'r');
    try {
      const { buffer, bytesRead } = await file.read(Buffer.alloc(length), 0, length, from);
      return buffer.subarray(0, bytesRead);
    } finally {
      await file.close();
    }
  }

  /** Takes an upload's file away. */
  async remove(uploadId: number): Promise<void> {
    await rm(this.pathOf(uploadId), { force: true });
    await rm(this.sheetsPathOf(uploadId), { recursive: true, force: true });
  }

  /** Whether an upload's file is still kept. */
  has(uploadId: number): boolean {
    return existsSync(this.pathOf(uploadId));
  }

  /** Takes a received file away that no upload wanted. */
  async discard(part: string): Promise<void> {
    await rm(path.join(this.folder, part), { force: true });
  }

  /** Takes away what broken connections of a former run of the service left behind. */
  async sweepParts(olderThanMs: number): Promise<void> {
    const names = await readdir(this.folder).catch((error: unknown) => {
      if ((error as NodeJS.ErrnoException).code === 'ENOENT') return [];
      throw error;
    });
    for (const name of names.filter((each) => each.endsWith(PART))) {
      const file = path.join(this.folder, name);
      if ((await stat(file)).mtimeMs < olderThanMs) await rm(file, { force: true });
    }
  }

  private get folder(): string {
    return path.join(this.settings.dataDir, 'uploads');
  }
}
