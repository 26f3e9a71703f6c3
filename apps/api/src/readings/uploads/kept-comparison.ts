import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import { unitsByQuantity, type SensorQuantity } from '../../towers/quantities';
import type { LayoutSensor } from '../../towers/tower-layout';
import { inOwnUnit } from '../../towers/units';
import type { ParsedReading } from '../parse/parsed-readings';

const DAY_S = 86_400;
/** The season around a file in which a tower's own air is like that of the file, s. */
const SEASON_S = 45 * DAY_S;
/** Fewer readings than this are too few to compare. */
const LEAST_COMMON = 12;
const LEAST_OF_SEASON = 100;
const HALF = 0.5;
/** Values for one instant that differ by more say different things, in the sensor's unit. */
const APART: Readonly<Record<SensorQuantity, number>> = {
  ...{ 'air temperature': 1, 'dew point': 1, 'wet bulb': 1, 'relative humidity': 5 },
  ...{ 'wind speed': 1, 'wind direction': 30, 'station pressure': 2, 'pm2.5': 5 },
};
/** A mean so much warmer than the season's, °C, that would be within the other of it as °F. */
const TOO_WARM_C = 12;
const ALIKE_C = 8;

const COMMON = `SELECT j.key place, r.value FROM json_each($1) j CROSS JOIN reading r
  ON r.sensor_id = $2 AND r.t_end = j.value->>0`;
const SEASON = `SELECT avg(value) mean, count(*) n FROM reading WHERE sensor_id = $1 AND t_end > $2 AND t_end <= $3`;

const meanOf = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0) / values.length;
const shown = (value: number): string => String(Math.round(value)).replace('-', '−');

/**
 * Compares what a file would bring with what the tower has: swapped columns and °F taken for °C are whole numbers that
 * nothing within the file gives away.
 */
@Injectable()
export class KeptComparison {
  constructor(private readonly sql: Sql) {}

  /** A sentence for each sensor whose readings look wrong beside the tower's own; from some of the file's readings. */
  async warnings(sensor: LayoutSensor, some: readonly ParsedReading[]): Promise<string[]> {
    const common = await this.sql.all<{ place: number; value: number }>(COMMON, [
      JSON.stringify(some.map(({ tEnd }) => [tEnd])),
      sensor.id,
    ]);
    if (common.length >= LEAST_COMMON) return this.ofCommon(sensor, some, common);
    return sensor.quantity === 'air temperature' ? this.ofSeason(sensor, some) : [];
  }

  private ofCommon(
    { name, quantity }: LayoutSensor,
    some: readonly ParsedReading[],
    common: readonly { place: number; value: number }[],
  ): string[] {
    const apart = common
      .map(({ place, value }) => some[place]!.value - value)
      .filter((difference) => Math.abs(difference) > APART[quantity]);
    if (apart.length <= HALF * common.length) return [];
    const by = `${shown(meanOf(apart.map(Math.abs)))} ${unitsByQuantity[quantity]}`;
    return [
      `${name}: the tower has other readings for the same times; most differ, by ${by} on average. ` +
        `Look whether columns are exchanged, the unit is another, or the clock is off.`,
    ];
  }

  private async ofSeason({ id, name }: LayoutSensor, some: readonly ParsedReading[]): Promise<string[]> {
    const times = some.map(({ tEnd }) => tEnd);
    const span = [Math.min(...times) - SEASON_S, Math.max(...times) + SEASON_S] as const;
    const season = await this.sql.get<{ mean: number | null; n: number }>(SEASON, [id, ...span]);
    if (!season || season.mean === null || season.n < LEAST_OF_SEASON) return [];
    const mean = meanOf(some.map(({ value }) => value));
    const isLikeF = Math.abs(inOwnUnit(mean, '°F') - season.mean) <= ALIKE_C;
    if (mean - season.mean <= TOO_WARM_C || !isLikeF) return [];
    return [
      `${name}: the file's mean is ${shown(mean)}, the tower's own around these days ${shown(season.mean)} °C. ` +
        `As °F it would fit: look at the unit of the column.`,
    ];
  }
}
