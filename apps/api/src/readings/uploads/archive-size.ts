import { Open, type CentralDirectory } from 'unzipper';
import { NotTextError } from '../parse/decode-text';

/** All entries together may unpack to this, bytes. */
const LARGEST_INFLATED = 400_000_000;
/** The texts of all cells, which are held in memory, may unpack to this, bytes. */
const LARGEST_TEXTS = 60_000_000;
const MOST_ENTRIES = 2_000;
const TEXTS = /sharedStrings\.xml$/i;

const bomb = (): NotTextError =>
  new NotTextError(
    `The spreadsheet unpacks to more than ${LARGEST_INFLATED / 1e6} MB, or holds more text than readings have. ` +
      'Save the readings as CSV, and send that.',
  );

/**
 * Opens an archive, unless it unpacks beyond all measure: by what it declares, then by what it truly unpacks to, counted
 * without being kept.
 *
 * @throws NotTextError where it does, or is no archive that can be read.
 */
export async function openArchive(archive: string): Promise<CentralDirectory> {
  const directory = await Open.file(archive).catch(() => {
    throw new NotTextError('The spreadsheet is cut off or damaged. Save it again, and send it again.');
  });
  const { files } = directory;
  if (files.length > MOST_ENTRIES || sum(files.map((file) => file.uncompressedSize)) > LARGEST_INFLATED)
    throw bomb();
  let inflated = 0;
  for (const file of files) {
    const most = TEXTS.test(file.path) ? inflated + LARGEST_TEXTS : LARGEST_INFLATED;
    const entry = file.stream();
    try {
      for await (const piece of entry as AsyncIterable<Buffer>) {
        inflated += piece.length;
        if (inflated > Math.min(most, LARGEST_INFLATED)) throw bomb();
      }
    } catch (error) {
      if (error instanceof NotTextError) throw error;
      throw new NotTextError(
        'The spreadsheet is damaged: a part of it cannot be unpacked. Save it again, and send it again.',
      );
    } finally {
      entry.destroy();
    }
  }
  return directory;
}

const sum = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0);
