import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { invalid } from '../common/validation';
import { DirtyStages } from '../database/dirty';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import { showSensor, type SensorDto } from './dto/tower.dto';
import { SensorVersion } from './models/sensor-version.model';
import { Sensor } from './models/sensor.model';
import { TowerLayouts } from './tower-layouts';

const EVER = Number.MAX_SAFE_INTEGER;

/** The word that stands for the beginning in an address, where a version has no date. */
export const FROM_THE_BEGINNING = 'beginning';

const inWords = (fromT: number): string => (fromT === 0 ? 'the beginning' : toIso(fromT));

/** Versions of a sensor that were entered by mistake, or with a wrong date. */
@Injectable()
export class SensorVersionsService {
  constructor(
    @InjectModel(Sensor) private readonly sensors: typeof Sensor,
    @InjectModel(SensorVersion) private readonly versions: typeof SensorVersion,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly work: UnitOfWork,
    private readonly activity: ActivityService,
    private readonly reworks: ReworkService,
  ) {}

  /** Takes a version back: what held before it holds on. The only one stays, for a sensor is somewhere. */
  remove(id: number, from: string, by: SignedIn): Promise<SensorDto> {
    return this.work.run(async () => {
      const { sensor, version, next } = await this.find(id, from);
      if (sensor.versions.length === 1) {
        throw new Problem(
          'not-possible-now',
          `This is all that is known of ${sensor.name}. Change it, or retire the sensor.`,
        );
      }
      await this.versions.destroy({ where: { sensorId: id, fromT: version.fromT } });
      const cause = `${sensor.name}: what held from ${inWords(version.fromT)} taken back`;
      return this.follow(sensor, by, 'sensor version taken back', cause, version.fromT, next);
    });
  }

  /** Corrects from when a version holds. */
  move(id: number, from: string, to: string, by: SignedIn): Promise<SensorDto> {
    return this.work.run(async () => {
      const { sensor, version, next } = await this.find(id, from);
      const fromT = Math.floor(Date.parse(to) / 1000);
      if (sensor.versions.some((each) => each.fromT === fromT && each !== version)) {
        throw invalid([
          { field: 'from', text: `Another version of ${sensor.name} holds from then. Change that one.` },
        ]);
      }
      const first = Math.min(...sensor.versions.map((each) => each.fromT));
      if (version.fromT === first && sensor.versions.length === 1) {
        throw new Problem(
          'not-possible-now',
          `Before that date nothing would be known of ${sensor.name}. Add a version instead.`,
        );
      }
      await this.versions.update({ fromT }, { where: { sensorId: id, fromT: version.fromT } });
      const cause = `${sensor.name}: what held from ${inWords(version.fromT)} holds from ${inWords(fromT)}`;
      const [t0, t1] = [Math.min(version.fromT, fromT), Math.max(next, fromT)];
      return this.follow(sensor, by, 'sensor version moved', cause, t0, t1);
    });
  }

  private async follow(
    { id, towerId, name }: Sensor,
    by: SignedIn,
    act: string,
    cause: string,
    t0: number,
    t1: number,
  ): Promise<SensorDto> {
    this.layouts.forget(towerId);
    const { blockS } = await this.layouts.of(towerId);
    const until = t1 === EVER ? EVER : t1 + blockS;
    await this.dirty.markTower(towerId, t0, until);
    await this.reworks.begin({ towerId, cause, byUser: by.id, t0, t1: until });
    await this.activity.record({
      actor: by,
      act,
      subject: `tower ${towerId}`,
      body: { sensor: name, what: cause },
    });
    return showSensor((await this.sensors.findByPk(id, { include: [SensorVersion] }))!);
  }

  private async find(
    id: number,
    from: string,
  ): Promise<{ sensor: Sensor; version: SensorVersion; next: number }> {
    const sensor = await this.sensors.findByPk(id, { include: [SensorVersion] });
    if (!sensor) throw new Problem('not-found', `There is no sensor ${id}.`);
    const fromT = from === FROM_THE_BEGINNING ? 0 : Math.floor(Date.parse(from) / 1000);
    const version = sensor.versions.find((each) => each.fromT === fromT);
    if (!version)
      throw new Problem(
        'not-found',
        `${sensor.name} has nothing that holds from ${from}. Load the page again.`,
      );
    const later = sensor.versions.map((each) => each.fromT).filter((each) => each > fromT);
    return { sensor, version, next: later.length === 0 ? EVER : Math.min(...later) };
  }
}
