/** A file that cannot be read as text at all; the message says what it seems to be and the cure. */
export class NotTextError extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'NotTextError';
  }
}

const startsWith = (bytes: Buffer, ...first: number[]): boolean =>
  first.every((byte, i) => bytes[i] === byte);

/**
 * The text of a file of readings: UTF-8, with or without a byte order mark. Anything else is refused by name
 * (UTF-16, gzip, a spreadsheet, other binary) with the cure.
 */
export function decodeText(bytes: Buffer): string {
  if (startsWith(bytes, 0xff, 0xfe) || startsWith(bytes, 0xfe, 0xff)) {
    throw new NotTextError('The file is UTF-16; save it as UTF-8 and send it again.');
  }
  if (startsWith(bytes, 0x1f, 0x8b)) {
    throw new NotTextError(
      'The file is compressed (gzip); unpack it, or send it with "Content-Encoding: gzip".',
    );
  }
  if (startsWith(bytes, 0x50, 0x4b, 0x03, 0x04)) {
    throw new NotTextError('The file is a spreadsheet or an archive; save it as CSV and send it again.');
  }
  if (bytes.includes(0)) {
    throw new NotTextError('The file holds NUL bytes, so it is no text; export the readings as CSV (UTF-8).');
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ERR_ENCODING_INVALID_ENCODED_DATA') throw error;
    throw new NotTextError('The file is not UTF-8 text; save it as UTF-8 and send it again.');
  }
}
