import { createHash } from 'node:crypto';
import { open, type FileHandle } from 'node:fs/promises';
import type { FilePosition } from '../../towers/source-positions';
import { NotTextError } from '../parse/decode-text';
import { HeaderError } from '../parse/parsed-readings';

/** New whole lines of a file. */
export interface NewLines {
  /** The lines up to and with the header, where the new lines come after it; empty where they hold it themselves. */
  readonly header: string;
  readonly lines: Buffer;
  /** Row of the file that the first new line is. */
  readonly firstRowNo: number;
  /** How far the file is read with them. */
  readonly after: FilePosition;
  /** Whether an unfinished line waits at the end. */
  readonly unfinished: boolean;
  /** Whether there is more to read. */
  readonly more: boolean;
  /** Whether the file is read from its beginning. */
  readonly anew: boolean;
}

/** How a file is read on. */
export interface ReadingOn {
  /** Rows up to and with the header; 0 where there is none. Left out: up to the first line that is not empty. */
  readonly headerRow?: number | undefined;
  /** What the file is known by; its inode where left out. */
  readonly inode?: number;
  /** Known again by all that was read of it, not by its first and last bytes alone: a change in the middle is seen. */
  readonly whole?: boolean;
  /** Whether a last line without its end is a line, too. */
  readonly takeUnfinished?: boolean;
}

/** Known again by so many bytes at the beginning and at the end of what was read. */
const KNOWN_BY_BYTES = 4096;
/** The byte that ends a line. */
export const NEWLINE = 0x0a;
const RETURN = 0x0d;
/** Read at a time, bytes. */
const SLICE = 1_000_000;
/** A line that is longer is no reading, bytes. */
export const LONGEST_LINE = 8_000_000;

const bytesOf = async (file: FileHandle, from: number, length: number): Promise<Buffer> => {
  const { buffer, bytesRead } = await file.read(Buffer.allocUnsafe(length), 0, length, from);
  return buffer.subarray(0, bytesRead);
};

/** Of what was read up to a position: all of it, or its beginning and its end. */
export const hashUpTo = async (file: FileHandle, position: number, whole: boolean): Promise<string> => {
  const hash = createHash('sha256');
  if (whole) {
    for (let at = 0; at < position; at += SLICE)
      hash.update(await bytesOf(file, at, Math.min(SLICE, position - at)));
  } else {
    const length = Math.min(KNOWN_BY_BYTES, position);
    hash.update(await bytesOf(file, 0, length)).update(await bytesOf(file, position - length, length));
  }
  return hash.digest('hex');
};

/** The slice from a position; longer where no line ends in it, so that a long line is not stuck for ever. */
const sliceOf = async (file: FileHandle, from: number, size: number): Promise<Buffer> => {
  for (let length = Math.min(SLICE, size - from + 1); ; length *= 2) {
    const slice = await bytesOf(file, from, length);
    if (slice.length < length || slice.includes(NEWLINE)) return slice;
    if (length > LONGEST_LINE)
      throw new NotTextError(
        'A line is longer than 8 MB. Look whether this is a file of readings, and at its line ends.',
      );
  }
};

/** How many lines end in some bytes. */
export const countLines = (bytes: Buffer): number => {
  let lines = 0;
  for (let at = bytes.indexOf(NEWLINE); at >= 0; at = bytes.indexOf(NEWLINE, at + 1)) lines += 1;
  return lines;
};

/** Where the header ends in the first lines of a file; throws a `HeaderError` where they do not reach that far. */
function headerEnd(lines: Buffer, headerRow: number | undefined): number {
  if (headerRow === 0) return 0;
  let row = 1;
  for (let at = 0; at < lines.length; row += 1) {
    const end = lines.indexOf(NEWLINE, at) + 1 || lines.length;
    if (row === headerRow) return end;
    if (headerRow === undefined && lines.subarray(at, end).toString('latin1').trim() !== '') return end;
    at = end;
  }
  if (headerRow === undefined) return 0;
  throw new HeaderError(
    `It ends after ${row - 1} lines; its header is looked for in row ${headerRow}. Correct that row.`,
  );
}

/** Whether what was read of a file still stands in it, and ends with a whole line. */
async function goesOn(
  file: FileHandle,
  { inode, size }: { inode: number; size: number },
  known: FilePosition,
  whole: boolean,
): Promise<boolean> {
  if (known.inode !== inode || known.position > size) return false;
  if (known.headSha256 !== (await hashUpTo(file, known.position, whole))) return false;
  const [before, next] = await bytesOf(file, Math.max(0, known.position - 1), 2);
  return before === NEWLINE || next === undefined || next === NEWLINE || next === RETURN;
}

/**
 * The new whole lines of a file since it was last read, perhaps none. What follows the last line end is left for the
 * next time. A file that is shorter than what was read, or reads otherwise, is read from its beginning.
 */
export async function newLines(
  path: string,
  known: FilePosition | undefined,
  on: ReadingOn = {},
): Promise<NewLines> {
  const { whole = false, takeUnfinished = false } = on;
  const file = await open(path, 'r');
  try {
    const { ino, size } = await file.stat();
    const inode = on.inode ?? ino;
    const before = known && (await goesOn(file, { inode, size }, known, whole)) ? known : undefined;
    const { position: from, rowNo } = before ?? { position: 0, rowNo: 0 };
    const slice = await sliceOf(file, from, size);
    const isLast = from + slice.length >= size;
    const end = takeUnfinished && isLast ? slice.length : slice.lastIndexOf(NEWLINE) + 1;
    const lines = slice.subarray(0, end);
    const position = from + end;
    const header =
      before?.header ?? (end > 0 ? lines.toString('utf8', 0, headerEnd(lines, on.headerRow)) : '');
    const headSha256 = await hashUpTo(file, position, whole);
    return {
      ...{ header: before ? header : '', lines, firstRowNo: rowNo + 1 },
      after: { inode, position, rowNo: rowNo + countLines(lines), header, headSha256 },
      unfinished: isLast && position < size,
      more: !isLast,
      anew: before === undefined,
    };
  } finally {
    await file.close();
  }
}
