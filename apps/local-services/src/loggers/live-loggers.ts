import { LoggerFiles, type LoggerFolders } from './logger-files';

/** How often the loggers look whether a row is due, ms. */
const LOOK_EVERY_MS = 5_000;

/** How long a slow logger takes over the second half of a line, ms. */
const HALF_LINE_MS = 2_500;

/** One interval in this many ends with a slow line. */
const SLOW_ONE_IN = 4;

/** The demo's loggers: told what to write, or writing by themselves as time goes on. One thing is done at a time. */
export class LiveLoggers {
  private files: LoggerFiles | undefined;
  private queue: Promise<unknown> = Promise.resolve();
  private timer: NodeJS.Timeout | undefined;
  private looks = 0;

  /** @param now the present instant, UTC epoch s */
  constructor(
    private readonly folders: LoggerFolders,
    private readonly now: () => number,
  ) {}

  /**
   * Tells the story around a first start, unless it is being told already.
   *
   * @param anew removes what was written before
   * @returns the first start the story is told around, UTC epoch s
   */
  begin(firstStart: number, anew: boolean): Promise<number> {
    return this.next(async () => {
      if (anew) this.files = undefined;
      const known = anew ? undefined : await this.opened();
      this.files = known ?? (await LoggerFiles.begin(this.folders, firstStart));
      return this.files.firstStart;
    });
  }

  /** Writes what is due up to an instant (UTC epoch s) and returns the number of rows. */
  write(until: number, pauseInLineMs = 0): Promise<number> {
    return this.next(async () => (await this.begun()).write(until, pauseInLineMs));
  }

  /** Passes over the time up to an instant, UTC epoch s. */
  skip(until: number): Promise<void> {
    return this.next(async () => (await this.begun()).skip(until));
  }

  /** Lets the loggers write by themselves, or stops that. What fell due meanwhile is written at once. */
  async live(on: boolean): Promise<void> {
    clearInterval(this.timer);
    this.timer = undefined;
    if (!on) return;
    await this.write(this.now());
    this.timer = setInterval(() => this.look(), LOOK_EVERY_MS);
  }

  /** Stops and waits for what is being written. */
  async close(): Promise<void> {
    await this.live(false);
    await this.queue;
  }

  private look(): void {
    this.looks += 1;
    const pauseMs = this.looks % SLOW_ONE_IN === 0 ? HALF_LINE_MS : 0;
    this.write(this.now(), pauseMs).catch((error: Error) =>
      console.error(`The loggers could not write: ${error.message}`),
    );
  }

  private async begun(): Promise<LoggerFiles> {
    const files = await this.opened();
    if (!files)
      throw new RangeError('The loggers have not begun. POST /control/loggers/begin {"now": instant} first.');
    return files;
  }

  private async opened(): Promise<LoggerFiles | undefined> {
    this.files ??= await LoggerFiles.open(this.folders);
    return this.files;
  }

  private next<T>(work: () => Promise<T>): Promise<T> {
    const done = this.queue.then(work);
    this.queue = done.catch(() => undefined);
    return done;
  }
}
