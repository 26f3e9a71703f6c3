import { pipeline, Readable } from 'node:stream';
import { createGunzip } from 'node:zlib';
import { SourceFault } from '../collector/source-fault';

const isGzip = (bytes: Buffer): boolean => bytes[0] === 0x1f && bytes[1] === 0x8b;
const WEB_PAGE = /^\s*<(!doctype html|html|head|body|\?xml)/i;

/**
 * A body as its text: a file that is packed itself (`mast.csv.gz`) unpacked, others as they are. A web page, such as a
 * portal's sign-in, is a `SourceFault`, for its lines would only be refused one by one.
 */
export async function* unpacked(host: string, body: AsyncIterable<Uint8Array>): AsyncGenerator<Buffer> {
  const pieces = body[Symbol.asyncIterator]();
  try {
    const first = await pieces.next();
    if (first.done) return;
    const start = bufferOf(first.value);
    if (WEB_PAGE.test(start.toString('latin1', 0, 200)))
      throw new SourceFault(
        `${host}: It answers with a web page, not a file of readings. Look at the address.`,
      );
    const all = allOf(start, pieces);
    yield* isGzip(start) ? gunzipped(all) : all;
  } finally {
    await pieces.return?.();
  }
}

const bufferOf = ({ buffer, byteOffset, byteLength }: Uint8Array): Buffer =>
  Buffer.from(buffer, byteOffset, byteLength);

async function* allOf(first: Buffer, pieces: AsyncIterator<Uint8Array>): AsyncGenerator<Buffer> {
  yield first;
  for (let next = await pieces.next(); !next.done; next = await pieces.next()) yield bufferOf(next.value);
}

function gunzipped(pieces: AsyncIterable<Buffer>): AsyncIterable<Buffer> {
  const gunzip = createGunzip();
  // An error goes on to whoever reads the unpacked bytes, so that it needs no other handling here.
  pipeline(Readable.from(pieces), gunzip, () => undefined);
  return gunzip as AsyncIterable<Buffer>;
}
