import type { TowerLayout } from '../../towers/tower-layout';
import { CsvReader, type ReadingContext } from '../parse/csv-reader';
import { NotTextError } from '../parse/decode-text';
import { HeaderError, type ParsedReading } from '../parse/parsed-readings';
import type { RefusedRow } from '../refusal';
import { FreshBlocks } from './fresh/fresh-blocks';
import type { Fresh } from './fresh/fresh';
import { LineCutter, type Lines } from './lines';

/** What a file is read with. */
export interface FileToRead {
  readonly context: ReadingContext;
  readonly tower: TowerLayout;
}

/** How the rows of a piece are treated. */
export interface HowToRead {
  /** Whether to work blocks out as well; false where the last rows were known already. */
  readonly direct: boolean;
  /** What was worked out until this epoch went the usual way. */
  readonly passedUntil: number;
}

/** Readings as columns, in the order of the file: cheap to hand from thread to thread. */
export interface ReadingColumns {
  readonly sensorId: Float64Array;
  readonly tEnd: Float64Array;
  readonly value: Float64Array;
  readonly rowNo: Float64Array;
}

/** What a piece of a file gave. */
export interface PieceRead {
  readonly rows: ReadingColumns;
  readonly refused: RefusedRow[];
  readonly ignoredColumns: string[];
  /** Where the rows may be written worked out; undefined where they must go the usual way. */
  readonly fresh: Fresh | undefined;
  /** Why nothing of the file can be used. An error's kind would be lost between threads. */
  readonly fault?: { readonly kind: 'header' | 'not text'; readonly message: string };
}

const NO_HEADER = 'The file has no header line; send the column names first.';

/** A file that is read piece by piece: its lines, its readings, and what they come to. */
export class FileReading {
  private readonly cutter = new LineCutter();
  private readonly reader: CsvReader;
  private readonly blocks: FreshBlocks;

  constructor({ context, tower }: FileToRead) {
    this.reader = new CsvReader(context);
    this.blocks = new FreshBlocks(tower, context.nowS);
  }

  /** Reads a further piece; undefined stands for the end of the file. */
  read(piece: Buffer | undefined, how: HowToRead): PieceRead {
    try {
      return this.readLines(piece ? this.cutter.push(piece) : this.cutter.end(), !piece, how);
    } catch (error) {
      const kind =
        error instanceof HeaderError ? 'header' : error instanceof NotTextError ? 'not text' : undefined;
      if (kind === undefined) throw error;
      return { ...NOTHING, fault: { kind, message: (error as Error).message } };
    }
  }

  private readLines({ lines, firstRowNo, refused }: Lines, isEnd: boolean, how: HowToRead): PieceRead {
    this.reader.readLines(lines, firstRowNo);
    if (isEnd && !this.reader.hasHeader) throw new HeaderError(NO_HEADER);
    const read = this.reader.take();
    return {
      rows: columnsOf(read.rows),
      refused: [...refused, ...read.refused],
      ignoredColumns: [...read.ignoredColumns],
      fresh: this.workOut(read.rows, how),
    };
  }

  private workOut(rows: readonly ParsedReading[], { direct, passedUntil }: HowToRead): Fresh | undefined {
    if (direct) return this.blocks.add(rows, passedUntil);
    this.blocks.pass(rows);
    return undefined;
  }
}

/** Readings as columns. */
export function columnsOf(rows: readonly ParsedReading[]): ReadingColumns {
  const column = (): Float64Array => new Float64Array(rows.length);
  const columns = { sensorId: column(), tEnd: column(), value: column(), rowNo: column() };
  rows.forEach((row, i) => {
    columns.sensorId[i] = row.sensorId;
    columns.tEnd[i] = row.tEnd;
    columns.value[i] = row.value;
    columns.rowNo[i] = row.rowNo;
  });
  return columns;
}

const NOTHING: PieceRead = { rows: columnsOf([]), refused: [], ignoredColumns: [], fresh: undefined };

/** Readings from their columns. */
export const rowsOf = ({ sensorId, tEnd, value, rowNo }: ReadingColumns): ParsedReading[] =>
  Array.from(sensorId, (id, i) => ({
    ...{ sensorId: id, tEnd: tEnd[i]!, value: value[i]!, rowNo: rowNo[i]! },
  }));
