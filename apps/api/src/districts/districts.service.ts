import { Injectable } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { slugOf } from '../common/slug';
import { DirtyStages } from '../database/dirty';
import { UnitOfWork } from '../database/unit-of-work';
import { TowersService } from '../towers/towers.service';
import { showDistrict, type DistrictDto } from './dto/district.dto';
import type { DistrictInput, DistrictPatch, DistrictTowerInput } from './dto/district-input.dto';
import { DistrictTower } from './models/district-tower.model';
import { District } from './models/district.model';

/** Districts and the towers that speak for them. */
@Injectable()
export class DistrictsService {
  constructor(
    @InjectModel(District) private readonly districts: typeof District,
    @InjectModel(DistrictTower) private readonly links: typeof DistrictTower,
    private readonly towers: TowersService,
    private readonly dirty: DirtyStages,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
    private readonly events: EventEmitter2,
  ) {}

  /** Every district, by name. */
  async list(): Promise<DistrictDto[]> {
    const all = await this.districts.findAll({ include: [DistrictTower], order: [['name', 'ASC']] });
    return all.map(showDistrict);
  }

  /** One district; 404 without it. */
  async get(id: number): Promise<DistrictDto> {
    return showDistrict(await this.find(id));
  }

  /** One district by its public address part; undefined without it. */
  async bySlug(slug: string): Promise<DistrictDto | undefined> {
    const found = await this.districts.findOne({ where: { slug }, include: [DistrictTower] });
    return found ? showDistrict(found) : undefined;
  }

  /** Makes a district. */
  create(input: DistrictInput, by: SignedIn): Promise<DistrictDto> {
    const { towers = [], ...fields } = input;
    const slug = input.slug ?? slugOf(input.name);
    return this.work.run(async () => {
      await this.refuseTaken(slug);
      await this.refuseUnknownTowers(input);
      const district = await this.districts.create({ ...fields, slug, createdAt: this.clock.now() });
      await this.setTowers(district.id, towers);
      await this.markAll(district.id);
      await this.record('district made', district.id, by, input);
      return this.get(district.id);
    });
  }

  /** Changes a district, unless somebody else has since `version` was read. */
  change(id: number, patch: DistrictPatch, by: SignedIn): Promise<DistrictDto> {
    const { towers, version, ...fields } = patch;
    return this.work.run(async () => {
      const district = await this.find(id);
      if (patch.slug && patch.slug !== district.slug) await this.refuseTaken(patch.slug);
      await this.refuseUnknownTowers(patch);
      const [changed] = await this.districts.update(
        { ...fields, version: version + 1 },
        { where: { id, version } },
      );
      if (changed === 0) {
        throw new Problem(
          'changed-meanwhile',
          'Somebody changed this district. Load it again, then change it.',
        );
      }
      if (towers) await this.setTowers(id, towers);
      if (changesFindings(patch)) await this.markAll(id);
      await this.record('district changed', id, by, patch);
      return this.get(id);
    });
  }

  private async find(id: number): Promise<District> {
    const district = await this.districts.findByPk(id, { include: [DistrictTower] });
    if (!district) throw new Problem('not-found', `There is no district ${id}.`);
    return district;
  }

  private async refuseUnknownTowers(given: Partial<DistrictInput>): Promise<void> {
    await this.towers.refuseUnknown(
      (given.towers ?? []).map(({ towerId }) => towerId),
      'towers',
    );
    for (const field of ['floorTowerId', 'benchTowerId', 'pm25TowerId'] as const) {
      await this.towers.refuseUnknown([given[field] ?? []].flat(), field);
    }
  }

  /** Its towers changed, so all that was found for it is worked out anew. */
  private async markAll(id: number): Promise<void> {
    const { towers, floorTowerId, benchTowerId, pm25TowerId } = await this.get(id);
    const parts = [floorTowerId, benchTowerId, pm25TowerId].filter((each) => each !== null);
    await this.dirty.markDistrict(id, [...towers.map(({ towerId }) => towerId), ...parts]);
  }

  private async refuseTaken(slug: string): Promise<void> {
    if (!(await this.districts.findOne({ where: { slug } }))) return;
    throw new Problem('name-taken', `Another district has the address part "${slug}". Choose another.`, {
      errors: [{ field: 'slug', text: 'Choose another; this one is in use.' }],
    });
  }

  private async setTowers(districtId: number, towers: DistrictTowerInput[]): Promise<void> {
    await this.links.destroy({ where: { districtId } });
    await this.links.bulkCreate(
      towers.map(({ towerId, mayBegin, mayEnd }, position) => ({
        ...{ districtId, towerId, position },
        ...{ mayBegin: Number(mayBegin), mayEnd: Number(mayEnd) },
      })),
    );
  }

  private record(act: string, districtId: number, by: SignedIn, body: object): Promise<void> {
    this.work.afterCommit(() => this.events.emit('district.changed', { districtId }));
    return this.activity.record({ actor: by, act, subject: `district ${districtId}`, districtId, body });
  }
}

const changesFindings = (patch: DistrictPatch): boolean =>
  [patch.towers, patch.combine, patch.floorTowerId, patch.benchTowerId, patch.pm25TowerId].some(
    (each) => each !== undefined,
  );
