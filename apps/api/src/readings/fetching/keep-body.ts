import { createHash } from 'node:crypto';
import { open, type FileHandle } from 'node:fs/promises';
import { Readable } from 'node:stream';
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
}

/** Written at a time, bytes: with small writes a fast server would wait for the disk at every turn. */
const AT_ONCE_BYTES = 1_000_000;

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
  const into = await open(file, 'w', 0o600);
  try {
    return await copy(response, into, terms);
  } finally {
    await into.close();
  }
}

async function copy({ body }: Response, into: FileHandle, terms: BodyTerms): Promise<KeptBody> {
  const hash = createHash('sha256');
  let [bytes, held]: [number, Buffer[]] = [0, []];
  let heldBytes = 0;
  const write = async (): Promise<void> => {
    const whole = Buffer.concat(held, heldBytes);
    [held, heldBytes] = [[], 0];
    hash.update(whole);
    await into.appendFile(whole);
  };
  for await (const piece of unpacked(terms.host, body ? Readable.fromWeb(body) : Readable.from([]))) {
    if ((bytes += piece.length) > terms.mostBytes) throw tooLong(terms);
    held.push(piece);
    if ((heldBytes += piece.length) >= AT_ONCE_BYTES) await write();
  }
  await write();
  return { bytes, sha256: hash.digest('hex') };
}
