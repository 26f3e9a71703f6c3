import path from 'node:path';
import { Injectable, Logger } from '@nestjs/common';
import { Settings } from '../../config/settings';
import type { Source } from '../../towers/models/source.model';
import type { Collected } from '../../towers/next-turn';
import { readMapping } from '../parse/mapping';
import { ReadingContexts } from '../reading-contexts';
import { failed } from './failed';
import { FileTaker } from './file-taker';
import { sourceFiles } from './source-files';
import { emptyTally, tallyWords } from './tally';

/** Collects the sources that are files beneath the loggers' folder. */
@Injectable()
export class FolderSources {
  private readonly logger = new Logger(FolderSources.name);

  constructor(
    private readonly contexts: ReadingContexts,
    private readonly taker: FileTaker,
    private readonly settings: Settings,
  ) {}

  /** Takes in the new lines of a source's files. A file that cannot be read does not hold up the others. */
  async collect(source: Source): Promise<Collected> {
    const tally = emptyTally();
    const faults: Collected[] = [];
    const wanted = source.path ?? '';
    try {
      const context = await this.contexts.of(source.towerId, readMapping(source.mapping));
      const files = await sourceFiles(this.settings.loggerDir, wanted);
      if (files.length === 0) return { result: 'No file of readings is there yet.', failed: false };
      for (const file of files) {
        const name = path.basename(file);
        await this.taker
          .take({ source, origin: 'folder', file, knownAs: file, name }, context, tally)
          .catch((error: unknown) => faults.push(failed(error, name, this.logger)));
      }
    } catch (error) {
      return failed(error, wanted, this.logger);
    }
    if (faults.length === 0) return { result: tallyWords(tally), failed: false };
    const words = faults.map(({ result }) => result);
    return { result: [...words, tallyWords(tally)].join(' '), failed: true };
  }
}
