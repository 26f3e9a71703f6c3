import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { Settings } from '../config/settings';
import { UnitOfWork } from '../database/unit-of-work';
import { showSource, type SourceDto } from './dto/source.dto';
import type { SourceInput, SourceKind, SourcePatch } from './dto/source-input.dto';
import { Source } from './models/source.model';
import { SourcePositions } from './source-positions';
import { SourceTurns } from './source-turns';
import { sourceValues, type Surroundings } from './source-values';
import { TowerLayouts } from './tower-layouts';

/** A changed source begins anew: it is asked for its whole body, at the next beat. */
const ANEW = {
  etag: null,
  lastModified: null,
  bodySha256: null,
  failures: 0,
  failingSince: null,
  nextAt: null,
};

/** Where a tower's readings come from, and how each source's data is laid out. */
@Injectable()
export class SourcesService {
  private readonly around: Surroundings;

  constructor(
    @InjectModel(Source) private readonly sources: typeof Source,
    private readonly layouts: TowerLayouts,
    private readonly positions: SourcePositions,
    private readonly turns: SourceTurns,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
    { httpSourceHosts, secret }: Settings,
  ) {
    this.around = { hosts: httpSourceHosts, secret };
  }

  /** A tower's sources that are in use. */
  async list(towerId: number): Promise<SourceDto[]> {
    const found = await this.sources.findAll({ where: { towerId, retiredAt: null }, order: [['id', 'ASC']] });
    return found.map((source) => this.show(source));
  }

  /** Adds a source; a tower has one layout for what is pushed, so a new one takes the former's place. */
  add(towerId: number, input: SourceInput, by: SignedIn): Promise<SourceDto> {
    return this.work.run(async () => {
      await this.layouts.of(towerId);
      refuseOthers(input.kind, by);
      const values = sourceValues(input.kind, input, undefined, this.around);
      if (input.kind === 'push') {
        const former = await this.sources.findAll({ where: { towerId, kind: 'push', retiredAt: null } });
        for (const { id } of former) await this.retire(id, by);
      }
      const { id } = await this.sources.create({ ...values, towerId });
      await this.record('source added', towerId, by, { id, ...withoutSecrets(input) });
      return this.show(await this.inUse(id));
    });
  }

  /**
   * Changes a source, unless somebody else has since `version` was read. Its files are read anew by the new settings;
   * readings that are known already stay as they are.
   */
  change(id: number, { version, ...patch }: SourcePatch, by: SignedIn): Promise<SourceDto> {
    return this.work.run(async () => {
      const before = await this.inUse(id);
      refuseOthers(before.kind, by);
      const values = sourceValues(before.kind, patch, before, this.around);
      const [changed] = await this.sources.update(
        { ...values, ...ANEW, version: version + 1 },
        { where: { id, version } },
      );
      if (changed === 0)
        throw new Problem(
          'changed-meanwhile',
          'Somebody changed this source. Load it again, then change it.',
        );
      await this.positions.forget(id);
      await this.record('source changed', before.towerId, by, { id, ...withoutSecrets(patch) });
      return this.show(await this.inUse(id));
    });
  }

  /** Retires a source: it is not collected any more, and its credentials are forgotten. Its readings stay. */
  retire(id: number, by: SignedIn): Promise<SourceDto> {
    return this.work.run(async () => {
      const source = await this.inUse(id);
      refuseOthers(source.kind, by);
      await this.sources.update(
        { retiredAt: this.clock.now(), nextAt: null, secret: null, etag: null, version: source.version + 1 },
        { where: { id } },
      );
      await this.record('source retired', source.towerId, by, { id, kind: source.kind });
      return { ...this.show(source), hasSecret: false, nextAt: null };
    });
  }

  /** A source in the API's shape. */
  async get(id: number): Promise<SourceDto> {
    return this.show(await this.inUse(id));
  }

  /** A source that is in use; 404 without it, 409 where it was retired. */
  async inUse(id: number): Promise<Source> {
    const source = await this.sources.findByPk(id);
    if (!source) throw new Problem('not-found', `There is no source ${id}.`);
    if (source.retiredAt !== null)
      throw new Problem('not-possible-now', 'This source is retired. Add it anew if it is needed again.');
    return source;
  }

  /** The layout of what a tower's site pushes, as JSON; undefined where the usual one holds. */
  async pushMapping(towerId: number): Promise<string | undefined> {
    const source = await this.sources.findOne({ where: { towerId, kind: 'push', retiredAt: null } });
    return source?.mapping;
  }

  private show(source: Source): SourceDto {
    return showSource(source, this.turns.isUnderWay(source.id));
  }

  private record(act: string, towerId: number, by: SignedIn, body: object): Promise<void> {
    return this.activity.record({ actor: by, act, subject: `tower ${towerId}`, body });
  }
}

/** Sources over HTTP make the service ask others, with credentials: only the administrator sets them. */
function refuseOthers(kind: SourceKind, by: SignedIn): void {
  if (kind === 'http' && by.role !== 'administrator')
    throw new Problem('not-allowed', "Sources over HTTP are the administrator's to keep. Ask them.");
}

/** What the record keeps of an entry: that credentials were given, never the credentials. */
function withoutSecrets({ username, password, token, ...rest }: Partial<SourceInput>): object {
  const given = [username, password, token].some((secret) => secret !== undefined);
  return given ? { ...rest, credentials: 'given' } : rest;
}
