import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { Source } from './models/source.model';
import { waitUntilNextTurnS, type Collected } from './next-turn';

/** What an answer over HTTP said its body was, to ask only for a newer one next time. */
export interface BodyState {
  readonly etag: string | null;
  readonly lastModified: string | null;
  readonly bodySha256: string | null;
}

const COLLECTED = `UPDATE source SET last_at = $now, last_result = $result, failures = $failures, next_at = $nextAt,
  last_ok_at = CASE WHEN $failures = 0 THEN $now ELSE last_ok_at END,
  failing_since = CASE WHEN $failures = 0 THEN NULL ELSE coalesce(failing_since, $now) END
  WHERE id = $id AND version = $version AND retired_at IS NULL`;
const KEEP_BODY = `UPDATE source SET etag = $etag, last_modified = $lastModified, body_sha256 = $bodySha256
  WHERE id = $id AND version = $version AND retired_at IS NULL`;

/** Whose turn it is to be collected, which are being collected, and how it went. */
@Injectable()
export class SourceTurns {
  private readonly underWay = new Set<number>();

  constructor(
    @InjectModel(Source) private readonly sources: typeof Source,
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** The sources of a kind whose turn it is. */
  async due(kind: 'folder' | 'http'): Promise<Source[]> {
    const now = this.clock.now();
    const all = await this.sources.findAll({ where: { kind, retiredAt: null }, order: [['id', 'ASC']] });
    return all.filter(({ nextAt }) => nextAt === null || nextAt <= now);
  }

  /** Marks a source as being collected; call the answer when that has ended. */
  begin({ id }: Source): () => void {
    this.underWay.add(id);
    return () => this.underWay.delete(id);
  }

  /** Whether a source is being collected. */
  isUnderWay(id: number): boolean {
    return this.underWay.has(id);
  }

  /**
   * Keeps how a collection went. The wait for the next turn counts from its begin, or a wait as long as the collector's
   * beat would miss every other turn. Nothing is kept of a source that somebody changed meanwhile: it begins anew.
   */
  async collected(source: Source, begunAt: number, how: Collected): Promise<void> {
    const failures = how.failed ? source.failures + 1 : 0;
    const nextAt = begunAt + waitUntilNextTurnS(source.intervalS, failures, how);
    const { id, version } = source;
    await this.sql.run(COLLECTED, {
      id,
      version,
      now: this.clock.now(),
      result: how.result,
      failures,
      nextAt,
    });
  }

  /** Keeps what the last answer's body was. */
  async keepBody({ id, version }: Source, { etag, lastModified, bodySha256 }: BodyState): Promise<void> {
    await this.sql.run(KEEP_BODY, { id, version, etag, lastModified, bodySha256 });
  }
}
