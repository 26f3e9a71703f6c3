import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { Readable, Transform } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { SourceFault } from '../collector/source-fault';
import { unpacked } from './unpacked';

/** A body that was kept in a file. */
export interface KeptBody {
  readonly bytes: number;
  readonly sha256: string;
}

/** Where a body comes from and how much of it is taken. */
export interface BodyTerms {
  readonly host: string;
  readonly mostBytes: number;
  readonly signal: AbortSignal;
}

const tooLong = ({ host, mostBytes }: BodyTerms): SourceFault =>
  new SourceFault(
    `${host}: The file has more than ${Math.round(mostBytes / 1e6)} MB, unpacked. Have it split by month or day, or upload it.`,
  );

/**
 * Keeps the body of an answer in a file, a packed one unpacked, never more of it than the limit and little of it in
 * memory.
 *
 * @throws SourceFault where it is longer or a web page; the connection's error where it breaks off
 */
export async function keepBody(response: Response, file: string, terms: BodyTerms): Promise<KeptBody> {
  if (Number(response.headers.get('content-length') ?? 0) > terms.mostBytes) {
    await response.body?.cancel();
    throw tooLong(terms);
  }
  const hash = createHash('sha256');
  let bytes = 0;
  const measure = new Transform({
    transform(piece: Buffer, _, done) {
      bytes += piece.length;
      hash.update(piece);
      if (bytes > terms.mostBytes) done(tooLong(terms));
      else done(null, piece);
    },
  });
  const body = response.body ? Readable.fromWeb(response.body) : Readable.from([]);
  const into = createWriteStream(file, { mode: 0o600 });
  await pipeline(body, unpacked(terms.host), measure, into, { signal: terms.signal });
  return { bytes, sha256: hash.digest('hex') };
}
