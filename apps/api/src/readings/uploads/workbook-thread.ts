import os from 'node:os';
import { parentPort, Worker, workerData } from 'node:worker_threads';
import { NotTextError } from '../parse/decode-text';
import { writeSheets, type WrittenSheet } from './workbook';

/** Memory that reading a workbook may take, MB; a row without end needs more, and fails alone. */
const MOST_MEMORY_MB = 512;
/** Longest that reading a workbook may take, ms. */
const LONGEST_MS = 240_000;
const NICE = 10;

interface Given {
  readonly workbook: string;
  readonly folder: string;
}

type Answer =
  | { readonly sheets: WrittenSheet[] }
  | { readonly fault: string }
  | { readonly disk: { readonly code: string | undefined; readonly message: string } };

const tooMuch = (): NotTextError =>
  new NotTextError(
    'The spreadsheet takes more memory or time to read than readings need. Save the readings as CSV, and send that.',
  );

/**
 * Writes a workbook's sheets as text, in a thread of its own with a limit of memory and time: what a workbook unpacks to
 * is not known before. Where the code is not built (unit tests), in this thread.
 *
 * @throws NotTextError as `writeSheets`, and where the limits are reached.
 */
export async function writeSheetsInThread(workbook: string, folder: string): Promise<WrittenSheet[]> {
  if (!__filename.endsWith('.js')) return writeSheets(workbook, folder);
  const given: Given = { workbook, folder };
  const worker = new Worker(__filename, {
    workerData: given,
    resourceLimits: { maxOldGenerationSizeMb: MOST_MEMORY_MB },
  });
  const timer = setTimeout(() => void worker.terminate(), LONGEST_MS);
  try {
    const answer = await new Promise<Answer>((resolve, reject) => {
      worker.once('message', resolve);
      worker.once('error', (error: NodeJS.ErrnoException) =>
        reject(error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? tooMuch() : error),
      );
      worker.once('exit', () => reject(tooMuch()));
    });
    if ('sheets' in answer) return answer.sheets;
    if ('fault' in answer) throw new NotTextError(answer.fault);
    throw Object.assign(new Error(answer.disk.message), { code: answer.disk.code });
  } finally {
    clearTimeout(timer);
    await worker.terminate();
  }
}

const answerTo = async ({ workbook, folder }: Given): Promise<Answer> => {
  try {
    return { sheets: await writeSheets(workbook, folder) };
  } catch (error) {
    if (error instanceof NotTextError) return { fault: error.message };
    const { code, message } = error as NodeJS.ErrnoException;
    return { disk: { code, message } };
  }
};

const isGiven = (data: unknown): data is Given =>
  typeof data === 'object' && data !== null && 'workbook' in data && 'folder' in data;

if (parentPort && isGiven(workerData)) {
  if (process.platform === 'linux') os.setPriority(0, NICE);
  void answerTo(workerData).then((answer) => parentPort?.postMessage(answer));
}
