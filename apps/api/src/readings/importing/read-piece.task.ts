import { computeTask } from '../../compute/compute-task';
import { FileReading, type FileToRead, type HowToRead, type PieceRead } from './file-reading';

/** A further piece of a file that is being read. */
export interface NextPiece {
  /** Tells the files apart that are read at the same time. */
  readonly id: string;
  /** With the first piece: what the file is read with. */
  readonly begin?: FileToRead;
  /** Undefined: the file ends. */
  readonly piece?: Uint8Array;
  readonly how: HowToRead;
}

const open = new Map<string, FileReading>();

/** Reads a further piece of a file. What was read of it so far is kept in the thread between the calls. */
export function readPiece({ id, begin, piece, how }: NextPiece): PieceRead {
  if (begin) open.set(id, new FileReading(begin));
  const file = open.get(id);
  if (!file) throw new Error('The compute thread ended in the middle of the file. Import the file again.');
  const read = file.read(piece && Buffer.from(piece.buffer, piece.byteOffset, piece.byteLength), how);
  if (!piece || read.fault) open.delete(id);
  return read;
}

/** Forgets a file that is not read to its end. */
export function closeFile(id: string): void {
  open.delete(id);
}

/** Reading a piece, for the compute thread. */
export const readPieceTask = computeTask(__filename, readPiece);
/** Forgetting a file, for the compute thread. */
export const closeFileTask = computeTask(__filename, closeFile);
