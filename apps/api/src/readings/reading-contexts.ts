import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { readClock } from '../towers/time-keeping/logger-clock';
import { TowerLayouts } from '../towers/tower-layouts';
import type { Mapping } from './parse/mapping';
import type { ReadingContext } from './parse/read-csv';

/** What a tower's texts are read against, from its settings and the layout of the source. */
@Injectable()
export class ReadingContexts {
  constructor(
    private readonly layouts: TowerLayouts,
    private readonly clock: Clock,
  ) {}

  /** The context for one source of a tower; the source's clock and stamp win over the tower's. */
  async of(towerId: number, mapping: Mapping): Promise<ReadingContext> {
    const tower = await this.layouts.of(towerId);
    const declared = mapping.clock ?? tower.clock;
    const clock = readClock(declared);
    if (!clock)
      throw new Problem(
        'not-possible-now',
        `The clock "${declared}" of "${tower.name}" is not known. Set it.`,
      );
    const inUse = tower.sensors.filter((sensor) => sensor.retiredAt === null);
    return {
      mapping,
      sensorIds: new Map(inUse.map((sensor) => [sensor.name, sensor.id])),
      time: {
        clock,
        stamp: mapping.stamp ?? tower.stamp,
        form: mapping.timeForm,
        intervalS: tower.intervalS,
        repeatedHour: mapping.repeatedHour,
        missingHour: mapping.missingHour,
      },
      nowS: this.clock.now(),
    };
  }
}
