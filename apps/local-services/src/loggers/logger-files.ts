import { appendFile, mkdir, rm, stat, truncate, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { headerLine, loggerRow } from './logger-row';
import { keepState, readState, type LoggerState, type Written } from './logger-state';
import { Story } from './story';
import { demoTowers, type DemoTower } from './tower-list';

/** The seed of the demo's basin. */
const SEED = 20_251;

/** Where the loggers write and what they remember. */
export interface LoggerFolders {
  /** One folder a tower, one file a month. */
  readonly loggerDir: string;
  readonly stateFile: string;
}

/** The file of a tower and month, within the loggers' folder. */
const fileOf = (tower: DemoTower, month: string): string =>
  path.join(tower.slug, `${tower.slug}_${month}.csv`);

/** Writes the demo towers' files, each instant once, in pieces of any size. */
export class LoggerFiles {
  private readonly towers = demoTowers();
  private story: Story;

  private constructor(
    private readonly folders: LoggerFolders,
    private state: LoggerState,
  ) {
    this.story = new Story(state.seed, state.firstStart);
  }

  /**
   * Opens the loggers' files where the last run left them; lines a run was cut off in are taken back.
   * Undefined when the loggers have never begun.
   */
  static async open(folders: LoggerFolders): Promise<LoggerFiles | undefined> {
    const state = await readState(folders.stateFile);
    if (!state) return undefined;
    for (const { file, bytes } of Object.values(state.towers)) {
      const full = path.join(folders.loggerDir, file);
      if (file !== '' && (await stat(full)).size > bytes) await truncate(full, bytes);
    }
    return new LoggerFiles(folders, state);
  }

  /** Begins anew: removes the demo towers' files and tells the story around this first start (UTC epoch s). */
  static async begin(folders: LoggerFolders, firstStart: number): Promise<LoggerFiles> {
    const files = new LoggerFiles(folders, { seed: SEED, firstStart, towers: {} });
    for (const { slug } of files.towers) {
      await rm(path.join(folders.loggerDir, slug), { recursive: true, force: true });
      await mkdir(path.join(folders.loggerDir, slug), { recursive: true });
    }
    await keepState(folders.stateFile, files.state);
    return files;
  }

  get firstStart(): number {
    return this.state.firstStart;
  }

  /** Passes over the time up to an instant without writing anything: the loggers were not there yet. */
  async skip(until: number): Promise<void> {
    const passed = (slug: string): Written => ({ file: '', bytes: 0, ...this.state.towers[slug], until });
    await this.keep(Object.fromEntries(this.towers.map(({ slug }) => [slug, passed(slug)])));
  }

  /**
   * Appends every row that is due up to an instant, and returns how many.
   *
   * Units: UTC epoch s, ms. Valid: instants already dealt with are passed over; nothing is written twice. With
   * `pauseInLineMs` the last line first stands there by half, as a slow logger leaves it.
   */
  async write(until: number, pauseInLineMs = 0): Promise<number> {
    let rows = 0;
    const towers: Record<string, Written> = {};
    for (const tower of this.towers) {
      const [written, count] = await this.writeTower(tower, until, pauseInLineMs);
      towers[tower.slug] = written;
      rows += count;
    }
    await this.keep(towers);
    return rows;
  }

  private async writeTower(
    tower: DemoTower,
    until: number,
    pauseInLineMs: number,
  ): Promise<[Written, number]> {
    const stepS = tower.intervalMinutes * 60;
    const before = this.state.towers[tower.slug] ?? { until: until - stepS, file: '', bytes: 0 };
    const linesByFile = new Map<string, string[]>();
    let rows = 0;
    for (let t = (Math.floor(before.until / stepS) + 1) * stepS; t <= until; t += stepS) {
      const row = loggerRow(this.story, tower, t);
      if (!row) continue;
      const file = fileOf(tower, row.month);
      if (!linesByFile.has(file)) linesByFile.set(file, []);
      linesByFile.get(file)?.push(row.line);
      rows += 1;
    }
    let { file, bytes } = before;
    for (const [name, lines] of linesByFile) {
      const begun = name === file;
      const text = (begun ? '' : headerLine(tower)) + lines.join('');
      await this.append(name, text, begun, pauseInLineMs);
      bytes = (begun ? bytes : 0) + Buffer.byteLength(text);
      file = name;
    }
    return [{ until: Math.max(until, before.until), file, bytes }, rows];
  }

  /** A file not known to be begun is written from its beginning: it may be what a run that was cut off left. */
  private async append(name: string, text: string, begun: boolean, pauseInLineMs: number): Promise<void> {
    const full = path.join(this.folders.loggerDir, name);
    const write = begun ? appendFile : writeFile;
    if (pauseInLineMs === 0) return write(full, text);
    await write(full, text.slice(0, -12));
    await pause(pauseInLineMs);
    await appendFile(full, text.slice(-12));
  }

  private async keep(towers: LoggerState['towers']): Promise<void> {
    this.state = { ...this.state, towers };
    await keepState(this.folders.stateFile, this.state);
  }
}
