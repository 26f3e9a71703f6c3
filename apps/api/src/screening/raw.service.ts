import { checkNames, qualityName } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { toIso } from '../common/instants';
import { Sql } from '../database/sql';
import { versionAt, type LayoutSensor } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import { askedSpan } from './asked-span';
import type { RawReadingDto, RawReadingsDto, RawSeriesDto } from './dto/raw.dto';
import type { RawQuery } from './dto/seen-query.dto';
import { seenSensor, sensorsOf } from './seen-sensors';
import type { Stretch } from './series';
import { TowerZones } from './tower-zones';

const MOST_DAYS = 62;
/** More points than this no chart is given, a sensor. */
export const MOST_POINTS = 2_000;
/** Parts of the time of which the extremes are kept: two of what is flagged, two of the rest. */
const PARTS = MOST_POINTS / 4;

interface Row {
  readonly t: number;
  readonly value: number;
  readonly quality: number;
  readonly checks: number;
}

interface Counted {
  readonly readings: number;
  readonly flagged: number;
  readonly suspect: number;
  readonly failed: number;
}

const OF_SENSOR = 'sensor_id = $sensor AND t_end > $t0 AND t_end <= $t1';
const COUNT = `SELECT count(*) readings, count(*) FILTER (WHERE checks <> 0) flagged,
    count(*) FILTER (WHERE quality = 1) suspect, count(*) FILTER (WHERE quality = 2) failed
  FROM reading WHERE ${OF_SENSOR}`;
const ALL = `SELECT t_end t, value, quality, checks FROM reading WHERE ${OF_SENSOR} ORDER BY t_end`;
/*
 * Of each part of the time the lowest and the highest, apart for what is flagged, and all of that where it is few. The
 * columns beside min() and max() are those of the row they come from.
 */
const EXTREMES = (which: 'min' | 'max'): string => `SELECT t_end t, ${which}(value) value, quality, checks
  FROM reading WHERE ${OF_SENSOR} GROUP BY (t_end - $t0 - 1) / $part, checks <> 0`;
const THINNED = `${EXTREMES('min')} UNION ${EXTREMES('max')}
  UNION SELECT t_end t, value, quality, checks FROM reading INDEXED BY reading_flagged
    WHERE $keep AND ${OF_SENSOR} AND checks <> 0 ORDER BY t`;

/** Readings as they came, for a chart. */
@Injectable()
export class RawService {
  constructor(
    private readonly sql: Sql,
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

  private async series(sensor: LayoutSensor, { t0, t1 }: Stretch): Promise<RawSeriesDto> {
    const bind = { sensor: sensor.id, t0, t1 };
    const { flagged, ...counted } = (await this.sql.get<Counted>(COUNT, bind))!;
    const thinned = counted.readings > MOST_POINTS;
    const keep = Number(flagged <= MOST_POINTS / 2);
    const part = Math.ceil((t1 - t0) / PARTS);
    const rows = await (thinned
      ? this.sql.all<Row>(THINNED, { ...bind, part, keep })
      : this.sql.all<Row>(ALL, bind));
    const points = rows.map((row) => pointOf(sensor, row));
    return { ...seenSensor(sensor), ...counted, thinned, points };
  }
}

function pointOf(sensor: LayoutSensor, { t, value, quality, checks }: Row): RawReadingDto {
  const { gain, offset } = versionAt(sensor, t) ?? { gain: 1, offset: 0 };
  return {
    ...{ t: toIso(t), value, quality: qualityName(quality) },
    ...((gain !== 1 || offset !== 0) && { corrected: gain * value + offset }),
    ...(checks !== 0 && { checks: checkNames(checks) }),
  };
}
