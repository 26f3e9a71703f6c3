import { readFile, rename, writeFile } from 'node:fs/promises';

/** How far one tower's files have been written. */
export interface Written {
  /** The last instant dealt with, UTC epoch s, whether its row was lost or not. */
  readonly until: number;
  /** The file it went to and how long that was then; what stands behind came from a run that was cut off. */
  readonly file: string;
  readonly bytes: number;
}

/** What the loggers remember between runs. */
export interface LoggerState {
  readonly seed: number;
  /** Instant of the demo's first start, UTC epoch s. */
  readonly firstStart: number;
  readonly towers: Readonly<Record<string, Written>>;
}

/** Reads what the loggers remember, or undefined when they have never run. */
export async function readState(file: string): Promise<LoggerState | undefined> {
  try {
    return JSON.parse(await readFile(file, 'utf8')) as LoggerState;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return undefined;
    throw new Error(`The loggers' memory ${file} cannot be read. Remove it to begin anew.`, { cause: error });
  }
}

/** Keeps what the loggers remember; the file is replaced in one step, so that a crash leaves the old or the new. */
export async function keepState(file: string, state: LoggerState): Promise<void> {
  await writeFile(`${file}.new`, JSON.stringify(state));
  await rename(`${file}.new`, file);
}
