import { mkdir, rm } from 'node:fs/promises';
import path from 'node:path';
import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { Clock } from '../../common/clock';
import { Settings } from '../../config/settings';
import { isAllowed, notAllowed } from '../../towers/allowed-hosts';
import type { Source } from '../../towers/models/source.model';
import type { Collected } from '../../towers/next-turn';
import { SourcePositions } from '../../towers/source-positions';
import { authorizationOf, openCredentials } from '../../towers/source-secrets';
import { SourceTurns } from '../../towers/source-turns';
import { failed } from '../collector/failed';
import { FileTaker } from '../collector/file-taker';
import { SourceFault } from '../collector/source-fault';
import { emptyTally, tallyWords } from '../collector/tally';
import { readMapping } from '../parse/mapping';
import { ReadingContexts } from '../reading-contexts';
import { ask } from './ask';
import { connectionFault, statusFault } from './fetch-faults';
import { FetchLimits } from './fetch-limits';
import { keepBody, type KeptBody } from './keep-body';

const UNCHANGED: Collected = { result: 'Not changed since the last time.', failed: false };

/** The service itself stops: what is under way is neither a success nor a failure. */
class Stopping extends Error {}

/** An answer with a body, which stands in a file. */
interface Answer extends KeptBody {
  readonly file: string;
  /** Whether it came packed: then a body that was cut off cannot be told from a whole one. */
  readonly packed: boolean;
  readonly etag: string | null;
  readonly lastModified: string | null;
}

/** Collects the sources that are files at an address. */
@Injectable()
export class HttpSources implements OnModuleDestroy {
  private readonly logger = new Logger(HttpSources.name);
  private readonly underWay = new Set<AbortController>();

  constructor(
    private readonly contexts: ReadingContexts,
    private readonly taker: FileTaker,
    private readonly positions: SourcePositions,
    private readonly turns: SourceTurns,
    private readonly settings: Settings,
    private readonly limits: FetchLimits,
    private readonly clock: Clock,
  ) {}

  onModuleDestroy(): void {
    for (const asked of this.underWay) asked.abort(new Stopping());
  }

  /** Asks for a source's file and takes in what is new in it; undefined where the service stops meanwhile. */
  async collect(source: Source): Promise<Collected | undefined> {
    const address = new URL(source.url ?? '');
    try {
      if (!isAllowed(address, this.settings.httpSourceHosts)) throw new SourceFault(notAllowed(address));
      const answer = await this.fetch(source, address);
      if (!answer) return UNCHANGED;
      return await this.take(source, address, answer).finally(() => rm(answer.file, { force: true }));
    } catch (error) {
      return error instanceof Stopping ? undefined : failed(error, nameOf(address), this.logger);
    }
  }

  /** The file, kept; undefined where it has not changed. */
  private async fetch(source: Source, address: URL): Promise<Answer | undefined> {
    const { answerMs, overallMs, mostRedirects, mostBytes } = this.limits;
    const { host } = address;
    const headers = this.headersFor(source, address);
    const asked = new AbortController();
    const { signal } = asked;
    const late = (what: string, ms: number): void =>
      asked.abort(
        new SourceFault(`${host}: ${what} within ${Math.round(ms / 1000)} s. Look at the connection.`),
      );
    const answerTimer = setTimeout(() => late('It did not begin to answer', answerMs), answerMs);
    const overallTimer = setTimeout(() => late('The file did not come', overallMs), overallMs);
    this.underWay.add(asked);
    const file = await this.fileFor(source);
    try {
      const response = await ask(address, { headers, mostRedirects, signal });
      clearTimeout(answerTimer);
      if (response.status !== 200) return await this.withoutBody(response, host);
      const kept = await keepBody(response, file, { host, mostBytes });
      const { headers: told } = response;
      const packed = told.has('content-encoding');
      return { ...kept, file, packed, etag: told.get('etag'), lastModified: told.get('last-modified') };
    } catch (error) {
      await rm(file, { force: true });
      if (signal.aborted) throw signal.reason;
      throw error instanceof SourceFault ? error : (connectionFault(host, error) ?? error);
    } finally {
      clearTimeout(answerTimer);
      clearTimeout(overallTimer);
      this.underWay.delete(asked);
    }
  }

  private async withoutBody(response: Response, host: string): Promise<undefined> {
    await response.body?.cancel();
    if (response.status === 304) return undefined;
    throw statusFault(host, response.status, response.headers.get('retry-after'), this.clock.nowMs());
  }

  private async take(source: Source, address: URL, answer: Answer): Promise<Collected> {
    const { file, packed, sha256, etag, lastModified, bytes } = answer;
    const knownAs = address.href;
    const isSame = source.bodySha256 === sha256;
    const tally = emptyTally();
    const readTo = (await this.positions.of(source.id, knownAs))?.position;
    if (!(isSame && readTo === bytes)) {
      const context = await this.contexts.of(source.towerId, readMapping(source.mapping));
      const name = nameOf(address);
      // A last line without its end may be half written; when it comes the same again, it is all there is of it.
      const given = { source, origin: 'http', file, knownAs, name, inode: 0, whole: true } as const;
      await this.taker.take({ ...given, takeUnfinished: isSame && !packed }, context, tally);
    }
    const asks = tally.unfinished > 0 ? { etag: null, lastModified: null } : { etag, lastModified };
    await this.turns.keepBody(source, { ...asks, bodySha256: sha256 });
    if (bytes === 0) return { result: 'The file is empty so far.', failed: false };
    return isSame && tally.new === 0 ? UNCHANGED : { result: tallyWords(tally), failed: false };
  }

  private headersFor(source: Source, address: URL): Record<string, string> {
    const headers: Record<string, string> = {
      accept: 'text/csv, text/plain;q=0.9, */*;q=0.5',
      'user-agent': 'Lidwatch',
      // Otherwise fetch asks with "no-cache", upon which many servers leave the conditions unheeded and send it all.
      'cache-control': 'max-age=0',
    };
    if (source.etag) headers['if-none-match'] = source.etag;
    if (source.lastModified) headers['if-modified-since'] = source.lastModified;
    if (source.secret === null) return headers;
    const credentials = openCredentials(this.settings.secret, address.origin, source.secret);
    if (!credentials)
      throw new SourceFault(
        `${address.host}: The kept credentials cannot be opened any more, for the service's secret is another one. Enter them again.`,
      );
    return { ...headers, authorization: authorizationOf(credentials) };
  }

  private async fileFor({ id }: Source): Promise<string> {
    const folder = path.join(this.settings.dataDir, 'fetched');
    await mkdir(folder, { recursive: true });
    return path.join(folder, `source-${id}`);
  }
}

/** What an address's file is called. */
const nameOf = ({ pathname, host }: URL): string => path.posix.basename(pathname).slice(0, 200) || host;
