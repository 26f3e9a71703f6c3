import { Injectable, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { ComputePool } from '../../compute/compute-pool';
import type { Lane } from '../../database/gate';
import { UnitOfWork } from '../../database/unit-of-work';
import type { TowerLayout } from '../../towers/tower-layout';
import { TowerLayouts } from '../../towers/tower-layouts';
import type { ReadingContext } from '../parse/csv-reader';
import { refuseRetired } from '../refuse-strangers';
import { FileInThread } from './file-in-thread';
import { rowsOf, type HowToRead, type PieceRead } from './file-reading';
import type { Fresh } from './fresh/fresh';
import { FreshWriter } from './fresh/fresh-writer';
import { ImportStore } from './import-store';
import { NOTHING_COUNTED, sumOf, type Counts, type Ingested, type Origin } from './origin';
import { piecesOf } from './pieces';
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
  /** Bytes that are read, worked out and written in one go; 128 KB unless set. */
  readonly pieceBytes?: number;
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
  /** How further rows are treated. */
  how: HowToRead;
}

/** Only such a tower's readings can be judged by themselves, as they come. */
const standsAlone = ({ neighbourIds }: TowerLayout): boolean => neighbourIds.length === 0;

/** Imports whole files of any size with little memory: one import for the file, many short transactions. */
@Injectable()
export class ImportRunner implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly running = new Set<Promise<Imported>>();
  private closing = false;

  constructor(
    private readonly taker: ReadingTaker,
    private readonly fresh: FreshWriter,
    private readonly imports: ImportStore,
    private readonly pool: ComputePool,
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
    const running: Running = {
      job,
      layout,
      importId: undefined,
      counts: NOTHING_COUNTED,
      how: { direct: standsAlone(layout), passedUntil: 0 },
    };
    try {
      return await this.readAll(running);
    } catch (error) {
      const { importId } = running;
      if (importId !== undefined) await this.imports.end(importId, 'failed');
      throw error;
    }
  }

  private async readAll(running: Running): Promise<Imported> {
    const { job, layout } = running;
    const file = new FileInThread(this.pool, { context: job.context, tower: layout });
    const ignoredColumns: string[] = [];
    let bytesDone = 0;
    try {
      for await (const { read, bytes } of file.pieces(
        piecesOf(job.bytes, job.pieceBytes),
        () => running.how,
      )) {
        this.refuseWhenClosing();
        if (job.isCancelled?.()) return await this.end(running, 'cancelled', ignoredColumns);
        ignoredColumns.push(...read.ignoredColumns);
        await this.take(running, read);
        job.onProgress?.((bytesDone += bytes));
      }
      return await this.end(running, 'done', ignoredColumns);
    } finally {
      this.fresh.letGo(running);
      await file.close();
    }
  }

  private async end(
    running: Running,
    state: 'done' | 'cancelled',
    ignoredColumns: string[],
  ): Promise<Imported> {
    running.importId ??= await this.begin(running);
    await this.imports.end(running.importId, state);
    return {
      importId: running.importId,
      ...running.counts,
      cancelled: state === 'cancelled',
      ignoredColumns,
    };
  }

  /** Writes a piece worked out where nothing else lies near it, else row by row. */
  private async take(running: Running, read: PieceRead): Promise<void> {
    const { fresh, refused } = read;
    const { passedUntil } = running.how;
    if (fresh && fresh.epoch > passedUntil && (await this.takeFresh(running, read, fresh))) return;
    const rows = rowsOf(read.rows);
    if (rows.length === 0) return this.takeRows(running, { rows, refused });
    this.fresh.letGo(running);
    const before = running.counts.new;
    await this.takeRows(running, { rows, refused });
    running.how = {
      direct: standsAlone(running.layout) && running.counts.new - before === rows.length,
      passedUntil: Math.max(passedUntil, fresh?.epoch ?? 0),
    };
  }

  private async takeFresh(running: Running, read: PieceRead, fresh: Fresh): Promise<boolean> {
    const { job, layout } = running;
    return this.work.run(async () => {
      if ((await this.layouts.of(job.towerId)) !== layout) return false;
      const importId = (running.importId ??= await this.begin(running));
      if (!(await this.fresh.isAlone(layout, importId, fresh))) return false;
      await this.fresh.write(layout, importId, fresh, running);
      const [all, repeated] = [read.rows.tEnd.length, fresh.repeated];
      const taken = { ...NOTHING_COUNTED, new: all - repeated, repeated, refused: read.refused.length };
      await this.taker.keep(importId, read.rows, read.refused, taken, running.counts.refused);
      running.counts = sumOf(running.counts, taken);
      return true;
    }, job.lane ?? 'bulk');
  }

  private async takeRows(running: Running, { rows, refused }: TakenRows): Promise<void> {
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
