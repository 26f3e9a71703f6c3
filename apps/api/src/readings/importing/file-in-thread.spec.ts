import type { ComputePool } from '../../compute/compute-pool';
import type { ComputeTask } from '../../compute/compute-task';
import { FileInThread } from './file-in-thread';
import type { FileToRead } from './file-reading';
import type { NextPiece } from './read-piece.task';

const nothing = { rows: {}, refused: [], ignoredColumns: [], fresh: undefined };

/** A pool that takes of what waits the newest first. */
function newestFirst(taken: string[]) {
  const waiting: (() => void)[] = [];
  const run = (_: ComputeTask<unknown, unknown>, given: NextPiece | string): Promise<unknown> =>
    new Promise((resolve) => {
      waiting.push(() => {
        taken.push(typeof given === 'string' ? 'close' : given.piece ? String(given.piece) : 'end');
        resolve(nothing);
      });
      setImmediate(() => waiting.pop()?.());
    });
  return { run } as unknown as ComputePool;
}

async function* three(): AsyncGenerator<Buffer> {
  for (const piece of ['one', 'two', 'three']) yield Buffer.from(piece);
}

describe('a file that is read in the compute thread', () => {
  it('is read in its order, whatever the pool takes first', async () => {
    const taken: string[] = [];
    const file = new FileInThread(newestFirst(taken), {} as FileToRead);
    const bytes: number[] = [];
    for await (const read of file.pieces(three(), () => ({ direct: true, passedUntil: 0 })))
      bytes.push(read.bytes);
    await file.close();
    expect(taken).toEqual(['one', 'two', 'three', 'end', 'close']);
    expect(bytes).toEqual([3, 3, 5, 0]);
  });
});
