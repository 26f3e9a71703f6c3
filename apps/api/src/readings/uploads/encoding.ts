import { TextDecoder } from 'node:util';
import { headFault } from '../parse/decode-text';

/** How a file's text is written. */
export type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';

const isUtf8 = (bytes: Buffer): boolean => {
  // A sample may begin and end within a character.
  const from = [...bytes.subarray(0, 3)].findIndex((byte) => (byte & 0xc0) !== 0x80);
  const text = bytes.subarray(Math.max(from, 0));
  for (let cut = 0; cut <= 3; cut += 1) {
    if (
      Buffer.from(text.subarray(0, text.length - cut).toString('utf8')).equals(
        text.subarray(0, text.length - cut),
      )
    ) {
      return true;
    }
  }
  return false;
};

/**
 * How a file is written, from samples of it, its beginning first: by its byte order mark; else UTF-8 where all is UTF-8,
 * else windows-1252, in which older loggers write "°C".
 *
 * @throws NotTextError where it begins like no text at all.
 */
export function encodingOf([head, ...further]: readonly Buffer[]): Encoding {
  if (head![0] === 0xff && head![1] === 0xfe) return 'utf-16le';
  if (head![0] === 0xfe && head![1] === 0xff) return 'utf-16be';
  const fault = headFault(head!);
  if (fault) throw fault;
  return [head!, ...further].every(isUtf8) ? 'utf-8' : 'windows-1252';
}

/** What makes text of a file's bytes; undefined for UTF-8, which is read as it is. */
export const decoderOf = (encoding: Encoding): TextDecoder | undefined =>
  encoding === 'utf-8' ? undefined : new TextDecoder(encoding);

/** A sentence about an encoding that is not the usual one. */
export const noteOf = (encoding: Encoding): string[] =>
  encoding === 'utf-8' ? [] : [`The file is written in ${encoding.toUpperCase()}, not UTF-8; it is read so.`];
