import { Problem } from '../common/problem';
import type { TowerLayout } from '../towers/tower-layout';
import type { ParsedReading } from './parse/parsed-readings';

/** @throws Problem where the tower is retired and takes no readings. */
export function refuseRetired(layout: TowerLayout): void {
  if (layout.retiredAt === null) return;
  throw new Problem('not-possible-now', `The tower "${layout.name}" is retired and takes no readings.`);
}

/** @throws Problem where a row's sensor is another tower's or retired. */
export function refuseStrangers(layout: TowerLayout, rows: readonly ParsedReading[]): void {
  const usable = new Set(layout.sensors.filter((sensor) => sensor.retiredAt === null).map(({ id }) => id));
  const stranger = rows.find((row) => !usable.has(row.sensorId));
  if (stranger === undefined) return;
  throw new Problem('invalid', `Sensor ${stranger.sensorId} is none of "${layout.name}", or is retired.`);
}
