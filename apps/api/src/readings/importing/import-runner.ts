import { Injectable, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import type { Lane } from '../../database/gate';
import { UnitOfWork } from '../../database/unit-of-work';
import type { TowerLayout } from '../../towers/tower-layout';
import { TowerLayouts } from '../../towers/tower-layouts';
import { CsvReader, type ReadingContext } from '../parse/csv-reader';
import { HeaderError } from '../parse/parsed-readings';
import { refuseRetired } from '../refuse-strangers';
import { ImportStore } from './import-store';
import { LineCutter, type Lines } from './lines';
import { NOTHING_COUNTED, sumOf, type Counts, type Ingested, type Origin } from './origin';
import { CHUNK_ROWS, ReadingTaker, type TakenRows } from './reading-taker';

/** A whole file to be imported. */
export interface ImportJob {
  readonly towerId: number;
  readonly origin: Origin;
  readonly context: ReadingContext;
  readonly bytes: AsyncIterable<Buffer>;
  /** Told after each transaction how many bytes of the file are done. */
  readonly onProgress?: (bytesDone: number) => void;
  /** Asked between transactions; what was taken until then is kept. */
  readonly isCancelled?: () => boolean;
  readonly lane?: Lane;
}

/** What importing a file gave. */
export interface Imported extends Ingested {
  readonly cancelled: boolean;
  readonly ignoredColumns: string[];
}

/** An import under way. */
interface Running {
  readonly job: ImportJob;
  readonly layout: TowerLayout;
  /** Begun with the first rows, so that a file without a usable header leaves nothing. */
  importId: number | undefined;
  counts: Counts;
}

/** Imports whole files of any size with little memory: one import for the file, many short transactions. */
@Injectable()
export class ImportRunner implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly running = new Set<Promise<Imported>>();
  private closing = false;

  constructor(
    private readonly taker: ReadingTaker,
    private readonly imports: ImportStore,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** What a former process left in the middle is shown as failed; its marks are worked out all the same. */
  async onApplicationBootstrap(): Promise<void> {
    await this.imports.endInterrupted();
  }

  async onModuleDestroy(): Promise<void> {
    this.closing = true;
    await Promise.allSettled(this.running);
  }

  /**
   * Imports a file. A cancelled import keeps what was taken so far; so does one that fails in the middle, whose error
   * is thrown on.
   *
   * @throws HeaderError, NotTextError where nothing of the file can be used; Problem where the tower takes no readings.
   */
  async run(job: ImportJob): Promise<Imported> {
    const running = this.runNow(job);
    this.running.add(running);
    try {
      return await running;
    } finally {
      this.running.delete(running);
    }
  }

  private async runNow(job: ImportJob): Promise<Imported> {
    const layout = await this.layouts.of(job.towerId);
    refuseRetired(layout);
    const running: Running = { job, layout, importId: undefined, counts: NOTHING_COUNTED };
    try {
      return await this.readAll(running);
    } catch (error) {
      const { importId } = running;
      if (importId !== undefined) await this.imports.end(importId, 'failed');
      throw error;
    }
  }

  private async readAll(running: Running): Promise<Imported> {
    const { job } = running;
    const [cutter, reader] = [new LineCutter(), new CsvReader(job.context)];
    const ignoredColumns: string[] = [];
    let [bytesDone, cancelled] = [0, false];
    const take = async (lines: Lines): Promise<void> => {
      reader.readLines(lines.lines, lines.firstRowNo);
      const { rows, refused, ignoredColumns: ignored } = reader.take();
      ignoredColumns.push(...ignored);
      await this.take(running, { rows, refused: [...lines.refused, ...refused] });
    };
    for await (const piece of job.bytes) {
      this.refuseWhenClosing();
      if ((cancelled = job.isCancelled?.() ?? false)) break;
      await take(cutter.push(piece));
      job.onProgress?.((bytesDone += piece.length));
    }
    if (!cancelled) await take(cutter.end());
    if (!cancelled && !reader.hasHeader)
      throw new HeaderError('The file has no header line; send the column names first.');
    running.importId ??= await this.begin(running);
    await this.imports.end(running.importId, cancelled ? 'cancelled' : 'done');
    return { importId: running.importId, ...running.counts, cancelled, ignoredColumns };
  }

  private async take(running: Running, { rows, refused }: TakenRows): Promise<void> {
    const { layout, job } = running;
    for (let at = 0; at < Math.max(rows.length, refused.length); at += CHUNK_ROWS) {
      const chunk = { rows: rows.slice(at, at + CHUNK_ROWS), refused: refused.slice(at, at + CHUNK_ROWS) };
      await this.work.run(async () => {
        running.importId ??= await this.begin(running);
        const taken = await this.taker.take(layout, running.importId, chunk, running.counts.refused);
        running.counts = sumOf(running.counts, taken);
      }, job.lane ?? 'bulk');
    }
  }

  private begin({ job }: Running): Promise<number> {
    return this.imports.begin(job.towerId, job.origin, this.clock.now());
  }

  private refuseWhenClosing(): void {
    if (this.closing)
      throw new Problem('not-possible-now', 'The service is stopping. Import the file again when it runs.');
  }
}
