/** Bytes of one piece of a file: read, worked out and written in one go. */
const PIECE_BYTES = 128 * 1024;

/** Bytes as they come, put together to pieces worth the way to the compute thread. */
export async function* piecesOf(bytes: AsyncIterable<Buffer>, size = PIECE_BYTES): AsyncGenerator<Buffer> {
  let held: Buffer[] = [];
  let length = 0;
  for await (const some of bytes) {
    for (let at = 0; at < some.length; at += size) {
      const part = some.subarray(at, at + size);
      held.push(part);
      length += part.length;
      if (length < size) continue;
      yield Buffer.concat(held);
      [held, length] = [[], 0];
    }
  }
  if (length > 0) yield Buffer.concat(held);
}
