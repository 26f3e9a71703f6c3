import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { slugOf } from '../common/slug';
import { invalid } from '../common/validation';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import { towerChangeWords } from './change-words';
import { changedFields, TOWER_FIELDS } from './describe-change';
import { showTower, type TowerDto } from './dto/tower.dto';
import type { TowerInput, TowerPatch } from './dto/tower-input.dto';
import { SensorVersion } from './models/sensor-version.model';
import { Sensor } from './models/sensor.model';
import { Tower } from './models/tower.model';
import { TowerLayouts } from './tower-layouts';

const withSensors = { include: [{ model: Sensor, include: [SensorVersion] }] };
const usualBlockMinutes = (intervalMinutes: number): number =>
  15 % intervalMinutes === 0 ? 15 : intervalMinutes;

/** Towers, and what depends on how they keep time. */
@Injectable()
export class TowersService {
  constructor(
    @InjectModel(Tower) private readonly towers: typeof Tower,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
    private readonly reworks: ReworkService,
  ) {}

  /** Every tower with its sensors, by name. */
  async list(): Promise<TowerDto[]> {
    return (await this.towers.findAll({ ...withSensors, order: [['name', 'ASC']] })).map(showTower);
  }

  /** One tower; 404 without it. */
  async get(id: number): Promise<TowerDto> {
    const tower = await this.towers.findByPk(id, withSensors);
    if (!tower) throw new Problem('not-found', `There is no tower ${id}.`);
    return showTower(tower);
  }

  /** Makes a tower. */
  create(input: TowerInput, by: SignedIn): Promise<TowerDto> {
    return this.work.run(async () => {
      const slug = input.slug ?? slugOf(input.name);
      await this.refuseTaken(slug);
      const tower = await this.towers.create({ ...fieldsOf(input), slug, createdAt: this.clock.now() });
      await this.record('tower made', tower.id, by, input);
      return this.get(tower.id);
    });
  }

  /** Changes a tower, unless somebody else has since `version` was read; its findings are worked out anew. */
  change(id: number, patch: TowerPatch, by: SignedIn): Promise<TowerDto> {
    return this.work.run(async () => {
      const before = await this.get(id);
      if (patch.slug && patch.slug !== before.slug) await this.refuseTaken(patch.slug);
      if (changesBlocks(before, patch)) await this.refuseWithReadings(id);
      const { version, retired } = patch;
      const retiredAt = retired === undefined ? {} : { retiredAt: retired ? this.clock.now() : null };
      const values = { ...fieldsOf({ ...before, ...patch }), slug: patch.slug ?? before.slug, ...retiredAt };
      const [changed] = await this.towers.update(
        { ...values, version: version + 1 },
        { where: { id, version } },
      );
      if (changed === 0) {
        throw new Problem('changed-meanwhile', 'Somebody changed this tower. Load it again, then change it.');
      }
      this.layouts.forget(id);
      if (changesFindings(before, patch)) {
        await this.dirty.markTower(id);
        await this.reworks.begin({ towerId: id, cause: towerChangeWords(patch), byUser: by.id });
      }
      await this.record('tower changed', id, by, { changes: changedFields(before, patch, TOWER_FIELDS) });
      return this.get(id);
    });
  }

  /** Refuses ids that are no towers, naming the field they came in. */
  async refuseUnknown(ids: number[], field: string): Promise<void> {
    const known = await this.sql.all<{ id: number }>(
      'SELECT id FROM tower WHERE id IN (SELECT value FROM json_each($1))',
      [JSON.stringify(ids)],
    );
    const unknown = ids.filter((id) => !known.some((each) => each.id === id));
    if (unknown.length === 0) return;
    throw invalid([{ field, text: `There is no tower ${unknown.join(', ')}. Make the tower first.` }]);
  }

  private async refuseTaken(slug: string): Promise<void> {
    if (!(await this.towers.findOne({ where: { slug } }))) return;
    throw new Problem('name-taken', `Another tower has the address part "${slug}". Choose another.`, {
      errors: [{ field: 'slug', text: 'Choose another; this one is in use.' }],
    });
  }

  private async refuseWithReadings(id: number): Promise<void> {
    const found = await this.sql.get(
      'SELECT 1 FROM sensor s JOIN reading r ON r.sensor_id = s.id WHERE s.tower_id = $1 LIMIT 1',
      [id],
    );
    if (!found) return;
    const text = 'This tower has readings of the former length. Retire it and make a new tower.';
    throw new Problem('not-possible-now', text, { errors: [{ field: 'intervalMinutes', text }] });
  }

  private record(act: string, towerId: number, by: SignedIn, body: object): Promise<void> {
    return this.activity.record({ actor: by, act, subject: `tower ${towerId}`, body });
  }
}

type Given = Omit<TowerInput, 'slug'>;

const fieldsOf = (input: Given): Partial<Tower> => {
  const { name, elevationM, latitude, longitude, intervalMinutes } = input;
  const blockMinutes = input.blockMinutes ?? usualBlockMinutes(intervalMinutes);
  if (blockMinutes % intervalMinutes !== 0) {
    throw invalid([
      {
        field: 'blockMinutes',
        text: `A block is a whole multiple of the interval: choose ${intervalMinutes}, ${2 * intervalMinutes}, ….`,
      },
    ]);
  }
  return {
    ...{ name, elevationM, latitude, longitude, intervalS: intervalMinutes * 60, blockS: blockMinutes * 60 },
    staleLimitS: input.staleLimitMinutes ? input.staleLimitMinutes * 60 : null,
    clock: input.clock ?? 'UTC',
    stamp: input.stamp ?? 'end',
    screening: input.screening ?? 'full',
    inversionForm: input.inversionForm ?? 'sensor-aware',
    embedDepthM: input.embedDepthM ?? 0,
  };
};

const differs = (before: TowerDto, patch: TowerPatch, keys: readonly (keyof Given)[]): boolean =>
  keys.some((key) => patch[key] !== undefined && patch[key] !== before[key]);

const changesBlocks = (before: TowerDto, patch: TowerPatch): boolean =>
  differs(before, patch, ['intervalMinutes', 'blockMinutes']);

const changesFindings = (before: TowerDto, patch: TowerPatch): boolean =>
  differs(before, patch, [
    'elevationM',
    'latitude',
    'longitude',
    'screening',
    'inversionForm',
    'embedDepthM',
  ]);
