import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { standardDeviationOf } from '@lidwatch/atmosphere';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { invalid } from '../common/validation';
import { DirtyStages } from '../database/dirty';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import { sensorChangeWords } from './change-words';
import type { SensorInput, SensorPatch } from './dto/sensor-input.dto';
import { changedFields } from './describe-change';
import { showSensor, type SensorDto } from './dto/tower.dto';
import { SensorVersion } from './models/sensor-version.model';
import { Sensor } from './models/sensor.model';
import { unitsByQuantity } from './quantities';
import { TowerLayouts } from './tower-layouts';

/** A tower's sensors, and what is true of each from which instant on. */
@Injectable()
export class SensorsService {
  constructor(
    @InjectModel(Sensor) private readonly sensors: typeof Sensor,
    @InjectModel(SensorVersion) private readonly versions: typeof SensorVersion,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
    private readonly reworks: ReworkService,
  ) {}

  /** Adds a sensor to a tower. */
  add(towerId: number, input: SensorInput, by: SignedIn): Promise<SensorDto> {
    const unit = unitsByQuantity[input.quantity];
    if (input.unit !== undefined && input.unit !== unit) {
      throw invalid([
        { field: 'unit', text: `Readings of ${input.quantity} come in ${unit}. Convert them first.` },
      ]);
    }
    const sigma = sigmaOf(input);
    if (sigma === undefined) {
      throw invalid([
        { field: 'sigma', text: "Give the sensor's uncertainty: sigma, or limits from its data sheet." },
      ]);
    }
    return this.work.run(async () => {
      await this.layouts.of(towerId);
      await this.refuseTaken(towerId, input.name);
      const { name, quantity } = input;
      const { id } = await this.sensors.create({ towerId, name, quantity, unit });
      await this.versions.create({
        ...usual,
        ...measured(input),
        sensorId: id,
        fromT: instant(input.from),
        sigma,
      });
      this.layouts.forget(towerId);
      const t0 = instant(input.from);
      await this.dirty.markTower(towerId, t0);
      await this.reworks.begin({ towerId, cause: `${name} added`, byUser: by.id, t0 });
      await this.record('sensor added', towerId, by, input);
      return showSensor(await this.find(id));
    });
  }

  /** Changes a sensor from an instant on (`from`), or its newest version where none is given. */
  change(id: number, patch: SensorPatch, by: SignedIn): Promise<SensorDto> {
    return this.work.run(async () => {
      const sensor = await this.find(id);
      const { towerId } = sensor;
      if (patch.name !== undefined && patch.name !== sensor.name) await this.refuseTaken(towerId, patch.name);
      const retiredAt =
        patch.retired === undefined ? {} : { retiredAt: patch.retired ? this.clock.now() : null };
      await this.sensors.update({ name: patch.name ?? sensor.name, ...retiredAt }, { where: { id } });
      const changed = await this.changeVersion(sensor, patch);
      this.layouts.forget(towerId);
      if (changed) {
        const { t0, t1 } = changed;
        await this.dirty.markTower(towerId, t0, t1);
        await this.reworks.begin({ towerId, cause: sensorChangeWords(sensor, patch), byUser: by.id, t0, t1 });
      }
      const before = { ...changed?.before, name: sensor.name, retired: sensor.retiredAt !== null };
      const after = { ...patch, ...(changed && { sigma: changed.sigma }) };
      const changes = changedFields(before, after, ['name', 'retired', ...VERSION_FIELDS]);
      const { from, note } = patch;
      await this.record('sensor changed', towerId, by, { sensor: sensor.name, from, note, changes });
      return showSensor(await this.find(id));
    });
  }

  /** Changes what holds from an instant on; gives the span of readings it concerns, or nothing where nothing changes. */
  private async changeVersion(sensor: Sensor, patch: SensorPatch): Promise<ChangedVersion | undefined> {
    const sigma = sigmaOf(patch);
    const changes = { ...measured(patch), ...(sigma === undefined ? {} : { sigma }) };
    if (Object.keys(changes).length === 0) return undefined;
    const sorted = [...sensor.versions].sort((a, b) => a.fromT - b.fromT);
    const fromT = patch.from === undefined ? sorted.at(-1)!.fromT : instant(patch.from);
    const before = sorted.findLast((version) => version.fromT <= fromT) ?? sorted[0]!;
    await this.versions.upsert({
      ...measured(before),
      sigma: before.sigma,
      ...changes,
      sensorId: sensor.id,
      fromT,
    });
    const { blockS } = await this.layouts.of(sensor.towerId);
    const next = sorted.find((version) => version.fromT > fromT);
    const t1 = next ? next.fromT + blockS : Number.MAX_SAFE_INTEGER;
    return { t0: fromT, t1, before: before.get({ plain: true }) as object, sigma };
  }

  private async find(id: number): Promise<Sensor> {
    const sensor = await this.sensors.findByPk(id, { include: [SensorVersion] });
    if (!sensor) throw new Problem('not-found', `There is no sensor ${id}.`);
    return sensor;
  }

  private async refuseTaken(towerId: number, name: string): Promise<void> {
    if (!(await this.sensors.findOne({ where: { towerId, name } }))) return;
    throw new Problem('name-taken', `This tower has a sensor "${name}". Choose another name.`, {
      errors: [{ field: 'name', text: 'Choose another; this tower has a sensor of that name.' }],
    });
  }

  private record(act: string, towerId: number, by: SignedIn, body: object): Promise<void> {
    return this.activity.record({ actor: by, act, subject: `tower ${towerId}`, body });
  }
}

/** What a change of a version concerns: readings in (t0, t1]. */
interface ChangedVersion {
  readonly t0: number;
  readonly t1: number;
  readonly before: object;
  readonly sigma: number | undefined;
}

const VERSION_FIELDS = ['heightM', 'offset', 'gain', 'sigma', 'pairSigma'];
const usual = { offset: 0, gain: 1, pairSigma: null, note: '' };

interface Measured {
  readonly heightM?: number;
  readonly offset?: number;
  readonly gain?: number;
  readonly pairSigma?: number | null;
  readonly note?: string;
}

/** Those of a version's fields that are given. */
const measured = ({ heightM, offset, gain, pairSigma, note }: Measured): Measured =>
  Object.fromEntries(
    Object.entries({ heightM, offset, gain, pairSigma, note }).filter(([, value]) => value !== undefined),
  );

const sigmaOf = ({ sigma, limits }: { sigma?: number; limits?: number }): number | undefined =>
  sigma ?? (limits === undefined ? undefined : standardDeviationOf({ kind: 'limits', value: limits }));

const instant = (iso: string | undefined): number =>
  iso === undefined ? 0 : Math.floor(Date.parse(iso) / 1000);
