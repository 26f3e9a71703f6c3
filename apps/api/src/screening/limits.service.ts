import { DEFAULT_LIMITS } from '@lidwatch/atmosphere';
import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Problem } from '../common/problem';
import { DirtyStages } from '../database/dirty';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { ReworkService } from '../rework/rework.service';
import { unitsByQuantity } from '../towers/quantities';
import type { LayoutSensor } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import type { LimitsInput, SensorLimitsDto } from './dto/limits.dto';
import { keptLimits, limitsOf, shownLimits } from './kept-limits';
import { measuredQuantity } from './measured-quantity';
import { sensorsOf } from './seen-sensors';

const show = (sensor: LayoutSensor): SensorLimitsDto => {
  const usual = DEFAULT_LIMITS[measuredQuantity[sensor.quantity]];
  return {
    ...{ sensorId: sensor.id, sensorName: sensor.name, unit: unitsByQuantity[sensor.quantity] },
    physical: { ...usual.physical },
    limits: shownLimits(limitsOf(sensor)),
    usual: shownLimits(usual),
  };
};

/** The limits of the checks, sensor by sensor: published ones as long as nobody sets others. */
@Injectable()
export class LimitsService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
    private readonly dirty: DirtyStages,
    private readonly reworks: ReworkService,
    private readonly work: UnitOfWork,
    private readonly activity: ActivityService,
  ) {}

  /** The limits of a tower's sensors. */
  async of(towerId: number): Promise<SensorLimitsDto[]> {
    return sensorsOf(await this.layouts.of(towerId)).map(show);
  }

  /** Sets a sensor's limits; its tower's whole record is screened anew. */
  set(sensorId: number, { reason, ...wanted }: LimitsInput, by: SignedIn): Promise<SensorLimitsDto> {
    return this.work.run(async () => {
      const row = await this.sql.get<{ towerId: number }>(
        'SELECT tower_id towerId FROM sensor WHERE id = $1',
        [sensorId],
      );
      if (!row) throw new Problem('not-found', `There is no sensor ${sensorId}.`);
      const { towerId } = row;
      const [sensor] = sensorsOf(await this.layouts.of(towerId), sensorId);
      const kept = keptLimits(sensor!, wanted);
      const stored = Object.keys(kept).length === 0 ? null : JSON.stringify(kept);
      await this.sql.run('UPDATE sensor SET screening_limits = $2 WHERE id = $1', [sensorId, stored]);
      this.layouts.forget(towerId);
      await this.dirty.markTower(towerId);
      const cause = `${sensor!.name}: limits of its checks changed (${reason})`;
      await this.reworks.begin({ towerId, cause, byUser: by.id });
      const body = { sensorId, reason, ...kept };
      await this.activity.record({
        actor: by,
        act: 'limits of checks changed',
        subject: `tower ${towerId}`,
        body,
      });
      return show(sensorsOf(await this.layouts.of(towerId), sensorId)[0]!);
    });
  }
}
