import { Injectable, Logger, type BeforeApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { JobsService } from '../../scheduler/jobs.service';
import type { SourceDto } from '../../towers/dto/source.dto';
import type { Source } from '../../towers/models/source.model';
import { SourceTurns } from '../../towers/source-turns';
import { SourcesService } from '../../towers/sources.service';
import { HttpSources } from '../fetching/http-sources';
import { FolderSources } from './folder-sources';

type Kind = 'folder' | 'http';

/** Sources are looked at this often, s; each has its own interval besides. */
const LOOK_EVERY_S = 10;
/** Sources over HTTP that are waited for side by side. */
const SIDE_BY_SIDE = 4;
/** Who asks for a collection waits for its end so long, ms; then it goes on without them. */
const PATIENCE_MS = 15_000;
/** A turn waits for its sources so long, ms: a file of years must not keep the other towers waiting. */
const TURN_MS = 8_000;

/** Collects towers' sources when their turn comes, or when somebody asks. Each is collected once at a time. */
@Injectable()
export class ReadingsCollector implements OnModuleInit, BeforeApplicationShutdown {
  private readonly logger = new Logger(ReadingsCollector.name);
  private readonly underWay = new Map<number, Promise<string>>();

  constructor(
    private readonly sources: SourcesService,
    private readonly turns: SourceTurns,
    private readonly folders: FolderSources,
    private readonly http: HttpSources,
    private readonly jobs: JobsService,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.jobs.register("collect loggers' files", LOOK_EVERY_S, () => this.turn('folder'));
    this.jobs.register('collect files over HTTP', LOOK_EVERY_S, () => this.turn('http'));
  }

  async beforeApplicationShutdown(): Promise<void> {
    await Promise.allSettled(this.underWay.values());
  }

  /** Collects every source of a kind whose turn it is and that is not being collected; says how it went. */
  async collect(kind: Kind = 'folder'): Promise<string> {
    const due = (await this.turns.due(kind)).filter(({ id }) => !this.underWay.has(id));
    const results: string[] = [];
    const next = async (): Promise<void> => {
      for (let source = due.shift(); source; source = due.shift()) results.push(await this.once(source));
    };
    await Promise.all(Array.from({ length: kind === 'http' ? SIDE_BY_SIDE : 1 }, next));
    return results.join('; ') || 'no source was due';
  }

  /**
   * Collects a source now, or waits for the collection under way; gives the source as it is then. A collection that
   * takes long goes on by itself.
   */
  async collectNow(id: number): Promise<SourceDto> {
    const source = await this.sources.inUse(id);
    if (source.kind === 'push')
      throw new Problem('not-possible-now', 'Nothing is collected here: the site sends its readings itself.');
    await within(PATIENCE_MS, this.once(source));
    return this.sources.get(id);
  }

  /** A turn of the job: what takes long goes on by itself, and its source is passed over until it has ended. */
  private async turn(kind: Kind): Promise<string> {
    const collecting = this.collect(kind);
    const result = await within(TURN_MS, collecting);
    if (result !== undefined) return result;
    collecting.catch((error: unknown) => this.logger.error(error));
    return 'goes on';
  }

  private once(source: Source): Promise<string> {
    const already = this.underWay.get(source.id);
    if (already) return already;
    const run = this.collectOne(source).finally(() => this.underWay.delete(source.id));
    this.underWay.set(source.id, run);
    return run;
  }

  private async collectOne(source: Source): Promise<string> {
    const begunAt = this.clock.now();
    const end = this.turns.begin(source);
    try {
      const how = await (source.kind === 'http' ? this.http : this.folders).collect(source);
      if (!how) return `source ${source.id}: the service stops`;
      await this.turns.collected(source, begunAt, how);
      return `source ${source.id}: ${how.result}`;
    } finally {
      end();
    }
  }
}

/** What a promise gives, or undefined once some time has gone by. */
async function within<T>(ms: number, promise: Promise<T>): Promise<T | undefined> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<undefined>((resolve) => (timer = setTimeout(() => resolve(undefined), ms)));
  return Promise.race([promise, late]).finally(() => clearTimeout(timer));
}
