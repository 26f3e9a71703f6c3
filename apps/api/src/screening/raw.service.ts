import { checkNames, qualityName } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { versionAt, type LayoutSensor } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import { askedSpan } from './asked-span';
import type { RawReadingDto, RawReadingsDto, RawSeriesDto } from './dto/raw.dto';
import type { RawQuery } from './dto/seen-query.dto';
import { ReadingWindows } from './reading-windows';
import { seenSensor, sensorsOf } from './seen-sensors';
import type { Series, Stretch } from './series';
import { thin } from './thin';
import { TowerZones } from './tower-zones';

const MOST_DAYS = 62;
/** More points than this no chart is given, a sensor. */
const MOST_POINTS = 2_000;

/** Readings as they came, for a chart. */
@Injectable()
export class RawService {
  constructor(
    private readonly windows: ReadingWindows,
    private readonly layouts: TowerLayouts,
    private readonly zones: TowerZones,
  ) {}

  /** The readings of a tower, or of one of its sensors, over a stretch. */
  async of(towerId: number, query: RawQuery): Promise<RawReadingsDto> {
    const stretch = askedSpan(query, MOST_DAYS);
    const tower = await this.layouts.of(towerId);
    const sensors = sensorsOf(tower, query.sensorId);
    return {
      ...{ towerId, timeZone: await this.zones.of(towerId) },
      ...{ from: toIso(stretch.t0), to: toIso(stretch.t1) },
      sensors: await Promise.all(sensors.map((sensor) => this.series(sensor, stretch))),
    };
  }

  /** Sensor by sensor, so that the read handles share the work. */
  private async series(sensor: LayoutSensor, stretch: Stretch): Promise<RawSeriesDto> {
    const series = (await this.windows.read([{ sensorId: sensor.id, ...stretch }]))[0]!;
    const readings = series.tEnd.length;
    const kept = thin(series, MOST_POINTS);
    return {
      ...{ ...seenSensor(sensor), readings, thinned: readings > MOST_POINTS },
      suspect: series.quality.filter((quality) => quality === 1).length,
      failed: series.quality.filter((quality) => quality === 2).length,
      points: kept.map((i) => pointOf(sensor, series, i)),
    };
  }
}

function pointOf(sensor: LayoutSensor, series: Series, i: number): RawReadingDto {
  const [t, value, checks] = [series.tEnd[i]!, series.value[i]!, series.checks[i]!];
  const { gain, offset } = versionAt(sensor, t) ?? { gain: 1, offset: 0 };
  return {
    ...{ t: toIso(t), value, quality: qualityName(series.quality[i]!) },
    ...((gain !== 1 || offset !== 0) && { corrected: gain * value + offset }),
    ...(checks !== 0 && { checks: checkNames(checks) }),
  };
}
