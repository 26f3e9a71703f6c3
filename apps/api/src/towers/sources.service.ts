import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { UnitOfWork } from '../database/unit-of-work';
import { showSource, type SourceDto, type SourceInput } from './dto/source.dto';
import { Source } from './models/source.model';
import { TowerLayouts } from './tower-layouts';

const USUAL_INTERVAL_S = 60;
/** Each failure in a row doubles the wait before the next try, up to 64 times the interval. */
const MOST_DOUBLINGS = 6;

/** Where a tower's readings come from, and how each source's data is laid out. */
@Injectable()
export class SourcesService {
  constructor(
    @InjectModel(Source) private readonly sources: typeof Source,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
  ) {}

  /** A tower's sources that are in use. */
  async list(towerId: number): Promise<SourceDto[]> {
    const found = await this.sources.findAll({ where: { towerId, retiredAt: null }, order: [['id', 'ASC']] });
    return found.map(showSource);
  }

  /** Adds a source; a tower has one layout for what is pushed, so a new one takes the former's place. */
  add(towerId: number, input: SourceInput, by: SignedIn): Promise<SourceDto> {
    return this.work.run(async () => {
      await this.layouts.of(towerId);
      if (input.kind === 'push') await this.sources.destroy({ where: { towerId, kind: 'push' } });
      const { kind, path = null, mapping = {}, intervalSeconds = USUAL_INTERVAL_S } = input;
      const values = { towerId, kind, path: kind === 'folder' ? path : null, intervalS: intervalSeconds };
      const { id } = await this.sources.create({ ...values, mapping: JSON.stringify(mapping) });
      const body = { id, ...input };
      await this.activity.record({ actor: by, act: 'source added', subject: `tower ${towerId}`, body });
      const made = await this.sources.findByPk(id);
      if (!made) throw new Problem('unexpected', `Source ${id} was not kept.`);
      return showSource(made);
    });
  }

  /** The layout of what a tower's site pushes, as JSON; undefined where the usual one holds. */
  async pushMapping(towerId: number): Promise<string | undefined> {
    const source = await this.sources.findOne({ where: { towerId, kind: 'push', retiredAt: null } });
    return source?.mapping;
  }

  /** The folder sources whose turn it is. */
  async dueFolders(): Promise<Source[]> {
    const now = this.clock.now();
    const all = await this.sources.findAll({
      where: { kind: 'folder', retiredAt: null },
      order: [['id', 'ASC']],
    });
    return all.filter(({ nextAt }) => nextAt === null || nextAt <= now);
  }

  /**
   * Keeps how a collection went; after a failure the next try waits the longer, the more there were in a row. The wait
   * counts from the collection's begin, or one as long as the collector's beat would miss every other turn.
   */
  async collected(source: Source, begunAt: number, result: string, failed: boolean): Promise<void> {
    const failures = failed ? source.failures + 1 : 0;
    const waitS = source.intervalS * 2 ** Math.min(failures, MOST_DOUBLINGS);
    const values = { lastAt: this.clock.now(), lastResult: result, failures, nextAt: begunAt + waitS };
    await this.sources.update(values, { where: { id: source.id } });
  }
}
