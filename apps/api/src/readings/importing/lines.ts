import { linesOf } from '../parse/records';
import { headFault, textOf } from '../parse/decode-text';
import { refusedRow, type RefusedRow } from '../refusal';

/** Whole lines of a file, without their line ends. */
export interface Lines {
  readonly lines: string[];
  /** Row of the file that the first of them is. */
  readonly firstRowNo: number;
  /** Lines that could not be read as text, or were too long to be held. */
  readonly refused: RefusedRow[];
}

/** Lines longer than this, in bytes, are refused without being held: no logger writes them. */
const LONGEST_LINE = 1_000_000;
/** So many bytes of a line that is too long are kept for its refusal. */
const SHOWN_BYTES = 200;
const [LF, CR] = [0x0a, 0x0d];
const NOTHING = Buffer.alloc(0);
/** So many bytes are awaited before a file is judged by its beginning. */
const HEAD_BYTES = 4;

/**
 * Cuts bytes that come piece by piece into whole lines (LF, CRLF or CR) of UTF-8 text, with or without a byte order
 * mark. A line or a character may lie across pieces. A line that is no text is refused alone; a file that begins like
 * no text at all throws a `NotTextError`. Holds one unfinished line of at most a million bytes.
 */
export class LineCutter {
  private rest: Buffer = NOTHING;
  private atBeginning: boolean;
  /** Bytes of a too long line that were let go so far; 0 where the line at hand is none. */
  private letGo = 0;

  /** @param nextRowNo the row of the file that comes first; from a later one on nothing is judged by its beginning */
  constructor(private nextRowNo = 1) {
    this.atBeginning = nextRowNo === 1;
  }

  /** The lines that a further piece completes. */
  push(piece: Buffer): Lines {
    const more = this.letGo > 0 && this.rest.at(-1) !== CR ? this.afterLongLine(piece) : piece;
    let bytes = this.rest.length === 0 ? more : Buffer.concat([this.rest, more]);
    if (this.atBeginning && bytes.length < HEAD_BYTES) {
      this.rest = Buffer.from(bytes);
      return this.cut(NOTHING);
    }
    bytes = this.begin(bytes);
    const end = endOfLines(bytes);
    const cut = this.cut(bytes.subarray(0, end));
    this.keepRest(bytes.subarray(end));
    return cut;
  }

  /** The last line, where the file ends without a line end. */
  end(): Lines {
    const bytes = this.begin(this.rest);
    this.rest = NOTHING;
    return this.cut(bytes.length === 0 ? NOTHING : Buffer.concat([bytes, Buffer.of(LF)]));
  }

  /** Refuses a file that begins like no text, and takes the byte order mark off. */
  private begin(bytes: Buffer): Buffer {
    if (!this.atBeginning) return bytes;
    this.atBeginning = false;
    const fault = headFault(bytes);
    if (fault) throw fault;
    return bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf ? bytes.subarray(3) : bytes;
  }

  private cut(whole: Buffer): Lines {
    const [firstRowNo, refused] = [this.nextRowNo, [] as RefusedRow[]];
    if (whole.length === 0) return { lines: [], firstRowNo, refused };
    const text = textOf(whole) ?? lineByLine(whole, firstRowNo, refused);
    const lines = linesOf(text);
    lines.pop();
    this.nextRowNo += lines.length;
    lines.forEach((line, i) => {
      const length = line.length + (i === 0 ? this.letGo : 0);
      if (length <= LONGEST_LINE) return;
      refused.push(tooLong(firstRowNo + i, length, line));
      lines[i] = '';
    });
    this.letGo = 0;
    return { lines, firstRowNo, refused };
  }

  /** What follows the line at hand, of which only the beginning is held. */
  private afterLongLine(piece: Buffer): Buffer {
    const ends = [piece.indexOf(LF), piece.indexOf(CR)].filter((at) => at >= 0);
    const end = ends.length === 0 ? -1 : Math.min(...ends);
    this.letGo += end < 0 ? piece.length : end;
    return end < 0 ? NOTHING : piece.subarray(end);
  }

  /** Keeps an unfinished line, as a copy, so that it does not keep its whole piece; of one too long the beginning. */
  private keepRest(rest: Buffer): void {
    const isLong = rest.length > LONGEST_LINE;
    this.rest = isLong ? beginningOf(rest) : Buffer.from(rest);
    if (isLong) this.letGo = rest.length - this.rest.length;
  }
}

/** The first bytes of a line, cut between characters. */
const beginningOf = (line: Buffer): Buffer => {
  let end = SHOWN_BYTES;
  while (end > 0 && (line[end]! & 0xc0) === 0x80) end -= 1;
  return Buffer.from(line.subarray(0, end));
};

/** The text with an empty line for each one that is no text. */
const lineByLine = (whole: Buffer, firstRowNo: number, refused: RefusedRow[]): string => {
  const lines = linesOf(whole.toString('latin1'));
  const read = lines.map((line, i) => {
    const text = textOf(Buffer.from(line, 'latin1'));
    if (text === undefined) refused.push(notText(firstRowNo + i, line));
    return text ?? '';
  });
  return read.join('\n');
};

/** Where the last whole line ends. A CR at the very end waits: an LF may follow. */
const endOfLines = (bytes: Buffer): number => {
  if (bytes.length < 2) return bytes[0] === LF ? 1 : 0;
  const lf = bytes.lastIndexOf(LF) + 1;
  const cr = bytes.lastIndexOf(CR, bytes.length - 2) + 1;
  return Math.max(lf, bytes[cr] === LF ? cr + 1 : cr);
};

const tooLong = (rowNo: number, length: number, line: string): RefusedRow => {
  const why = `the line has ${length} characters; check the line ends and the separator of the file.`;
  return refusedRow(rowNo, undefined, { code: 'line-too-long', why }, line);
};

const notText = (rowNo: number, line: string): RefusedRow => {
  const why = 'the line is not UTF-8 text; save the file as UTF-8, or correct the line, and send it again.';
  const shown = line.replaceAll(/[^\x20-\x7e]/g, '·');
  return refusedRow(rowNo, undefined, { code: 'line-not-text', why }, shown);
};
