import { createHash } from 'node:crypto';
import { open, type FileHandle } from 'node:fs/promises';

/** How far a file has been read, and by what it is known again. */
export interface FilePosition {
  readonly inode: number;
  /** Bytes read, up to the end of a line. */
  readonly position: number;
  /** Lines read. */
  readonly rowNo: number;
  /** The header line, without which later lines mean nothing. */
  readonly header: string;
  /** Of the first bytes that were read: a file that was replaced under its name begins otherwise. */
  readonly headSha256: string;
}

/** New whole lines of a file. */
export interface NewLines {
  /** Header line and new lines. */
  readonly bytes: Buffer;
  /** The row number the header line counts as, so that the new lines have theirs. */
  readonly headerRowNo: number;
  /** How far the file is read with them. */
  readonly after: FilePosition;
  /** Whether the file was read from its beginning although it was known: cut off, or another one. */
  readonly anew: boolean;
  /** Whether an unfinished line waits at the end. */
  readonly unfinished: boolean;
  /** Whether there is more to read. */
  readonly more: boolean;
}

const HEAD_BYTES = 256;
const NEWLINE = 0x0a;
/** Read at a time, bytes. */
const SLICE = 1_000_000;
const LONGEST_LINE = 8_000_000;

const bytesOf = async (file: FileHandle, from: number, length: number): Promise<Buffer> => {
  const { buffer, bytesRead } = await file.read(Buffer.alloc(length), 0, length, from);
  return buffer.subarray(0, bytesRead);
};

const headOf = async (file: FileHandle, position: number): Promise<string> => {
  const head = await bytesOf(file, 0, Math.min(HEAD_BYTES, position));
  return createHash('sha256').update(head).digest('hex');
};

/** The slice from a position; longer where no line ends in it, so that a long line is not stuck for ever. */
const sliceOf = async (file: FileHandle, from: number): Promise<Buffer> => {
  for (let length = SLICE; ; length *= 2) {
    const slice = await bytesOf(file, from, length);
    if (slice.length < length || slice.includes(NEWLINE) || length > LONGEST_LINE) return slice;
  }
};

const countLines = (bytes: Buffer): number => {
  let lines = 0;
  for (let at = bytes.indexOf(NEWLINE); at >= 0; at = bytes.indexOf(NEWLINE, at + 1)) lines += 1;
  return lines;
};

const isSame = async (file: FileHandle, inode: number, size: number, known: FilePosition): Promise<boolean> =>
  known.inode === inode &&
  known.position <= size &&
  known.headSha256 === (await headOf(file, known.position));

/**
 * The new whole lines of a file since it was last read. What follows the last line end is left for the next time. A
 * file that is shorter than what was read, or begins otherwise, is read from its beginning.
 */
export async function newLines(path: string, known: FilePosition | undefined): Promise<NewLines | undefined> {
  const file = await open(path, 'r');
  try {
    const { ino: inode, size } = await file.stat();
    const goesOn = known !== undefined && (await isSame(file, inode, size, known));
    const from = goesOn ? known.position : 0;
    const slice = await sliceOf(file, from);
    const end = slice.lastIndexOf(NEWLINE) + 1;
    if (end === 0) return undefined;
    const lines = slice.subarray(0, end);
    const header = goesOn ? Buffer.from(known.header) : lines.subarray(0, lines.indexOf(NEWLINE) + 1);
    const position = from + end;
    const rowNo = (goesOn ? known.rowNo : 0) + countLines(lines);
    const headSha256 = await headOf(file, position);
    return {
      bytes: goesOn ? Buffer.concat([header, lines]) : lines,
      headerRowNo: goesOn ? known.rowNo : 1,
      after: { inode, position, rowNo, header: header.toString('utf8'), headSha256 },
      anew: known !== undefined && !goesOn,
      unfinished: position < size && slice.length < SLICE,
      more: slice.length >= SLICE,
    };
  } finally {
    await file.close();
  }
}
