import path from 'node:path';
import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { Settings } from '../../config/settings';
import { UnitOfWork } from '../../database/unit-of-work';
import { JobsService } from '../../scheduler/jobs.service';
import type { Source } from '../../towers/models/source.model';
import { SourcesService } from '../../towers/sources.service';
import { decodeText, NotTextError } from '../parse/decode-text';
import { readMapping } from '../parse/mapping';
import { HeaderError } from '../parse/parsed-readings';
import { readCsv, type ReadingContext } from '../parse/read-csv';
import { ReadingContexts } from '../reading-contexts';
import { ReadingsService } from '../readings.service';
import { FilePositions } from './file-positions';
import { newLines, type NewLines } from './new-lines';
import { SourceError, sourceFiles } from './source-files';

/** Sources are looked at this often, s; each has its own interval besides. */
const LOOK_EVERY_S = 10;
/** So many rows are kept in one transaction with how far the file is read. */
const AT_ONCE_ROWS = 5_000;

interface Tally {
  read: number;
  refused: number;
  unfinished: number;
}

/** Takes new lines of the loggers' files in. */
@Injectable()
export class ReadingsCollector implements OnModuleInit {
  constructor(
    private readonly sources: SourcesService,
    private readonly contexts: ReadingContexts,
    private readonly positions: FilePositions,
    private readonly readings: ReadingsService,
    private readonly settings: Settings,
    private readonly work: UnitOfWork,
    private readonly jobs: JobsService,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.jobs.register("collect loggers' files", LOOK_EVERY_S, () => this.collect());
  }

  /** Collects every source whose turn it is; says how it went. A source that fails does not hold up the others. */
  async collect(): Promise<string> {
    const begunAt = this.clock.now();
    const due = await this.sources.dueFolders();
    const results: string[] = [];
    for (const source of due) {
      const { result, failed } = await this.collectSource(source);
      await this.sources.collected(source, begunAt, result, failed);
      results.push(`source ${source.id}: ${result}`);
    }
    return results.join('; ') || 'no source was due';
  }

  private async collectSource(source: Source): Promise<{ result: string; failed: boolean }> {
    const tally: Tally = { read: 0, refused: 0, unfinished: 0 };
    const faults: string[] = [];
    try {
      const context = await this.contexts.of(source.towerId, readMapping(source.mapping));
      for (const file of await sourceFiles(this.settings.loggerDir, source.path ?? '')) {
        const fault = await this.collectFile(source, file, context, tally).catch((error: unknown) =>
          faultOf(error, path.basename(file)),
        );
        if (fault) faults.push(fault);
      }
    } catch (error) {
      faults.push(faultOf(error, source.path ?? ''));
    }
    return { result: [...faults, wordsOf(tally)].join(' '), failed: faults.length > 0 };
  }

  private async collectFile(
    source: Source,
    file: string,
    context: ReadingContext,
    tally: Tally,
  ): Promise<void> {
    for (;;) {
      const lines = await newLines(file, await this.positions.of(source.id, file));
      if (!lines) return;
      await this.take(source, file, lines, context, tally);
      if (lines.unfinished) tally.unfinished += 1;
      if (!lines.more) return;
    }
  }

  private async take(
    source: Source,
    file: string,
    lines: NewLines,
    context: ReadingContext,
    tally: Tally,
  ): Promise<void> {
    const { rows, refused } = await readCsv(decodeText(lines.bytes), context, lines.headerRowNo);
    const name = path.basename(file);
    const keep = async (): Promise<void> => {
      if (rows.length + refused.length > 0) {
        await this.readings.ingest(source.towerId, rows, { origin: 'folder', name, refused });
      }
      await this.positions.keep(source.id, file, lines.after);
    };
    await (rows.length <= AT_ONCE_ROWS ? this.work.run(keep, 'bulk') : keep());
    tally.read += rows.length;
    tally.refused += refused.length;
  }
}

const wordsOf = ({ read, refused, unfinished }: Tally): string =>
  `${read} readings read, ${refused} rows refused` +
  (unfinished > 0 ? `, ${unfinished} unfinished line waits.` : '.');

/** Faults of the file or the source as a sentence; anything else is a fault of the service and is thrown on. */
function faultOf(error: unknown, name: string): string {
  if (error instanceof SourceError) return error.message;
  if (error instanceof HeaderError || error instanceof NotTextError) return `${name}: ${error.message}`;
  if (error instanceof Problem) return `${name}: ${error.detail}`;
  const { code, syscall } = error as NodeJS.ErrnoException;
  if (code === undefined || syscall === undefined) throw error;
  return `${name} cannot be read (${code}). Look at the file's rights and the connection.`;
}
