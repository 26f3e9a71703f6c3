/** A file that cannot be read as text at all; the message says what it seems to be and the cure. */
export class NotTextError extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'NotTextError';
  }
}

const startsWith = (bytes: Buffer, ...first: number[]): boolean =>
  first.every((byte, i) => bytes[i] === byte);

/** What tells from its first bytes that a file is no text (UTF-16, gzip, a spreadsheet, other binary), with the cure. */
export function headFault(bytes: Buffer): NotTextError | undefined {
  if (startsWith(bytes, 0xff, 0xfe) || startsWith(bytes, 0xfe, 0xff)) {
    return new NotTextError('The file is UTF-16; save it as UTF-8 and send it again.');
  }
  if (startsWith(bytes, 0x1f, 0x8b)) {
    return new NotTextError(
      'The file is compressed (gzip); unpack it, or send it with "Content-Encoding: gzip".',
    );
  }
  if (startsWith(bytes, 0x50, 0x4b, 0x03, 0x04)) {
    return new NotTextError('The file is a spreadsheet or an archive; save it as CSV and send it again.');
  }
  if (bytes.includes(0)) {
    return new NotTextError(
      'The file holds NUL bytes, so it is no text; export the readings as CSV (UTF-8).',
    );
  }
  return undefined;
}

const utf8 = new TextDecoder('utf-8', { fatal: true, ignoreBOM: true });

/** Bytes as text; undefined where they are not UTF-8, or hold NUL bytes. */
export function textOf(bytes: Buffer): string | undefined {
  if (bytes.includes(0)) return undefined;
  try {
    return utf8.decode(bytes);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ERR_ENCODING_INVALID_ENCODED_DATA') throw error;
    return undefined;
  }
}

/**
 * The text of a file of readings: UTF-8, with or without a byte order mark. Anything else is refused by name with the
 * cure.
 */
export function decodeText(bytes: Buffer): string {
  const fault = headFault(bytes);
  if (fault) throw fault;
  const text = textOf(startsWith(bytes, 0xef, 0xbb, 0xbf) ? bytes.subarray(3) : bytes);
  if (text === undefined)
    throw new NotTextError('The file is not UTF-8 text; save it as UTF-8 and send it again.');
  return text;
}
