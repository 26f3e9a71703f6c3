import { clockErrorS, isLost, shownInstant, spike } from './mishaps';
import { chance, numberOf } from './noise';
import { hourlySmoke, MONITORS } from './smoke';
import type { Story } from './story';
import { floorHumidityPct, floorPressureHpa, SITES, towerTemperatureC, towerWindMPerS } from './tower-air';
import type { DemoSensor, DemoTower } from './tower-list';

/** Decimals a logger writes for each quantity. */
const DECIMALS = {
  'air temperature': 2,
  'relative humidity': 1,
  'wind speed': 1,
  'station pressure': 1,
  'pm2.5': 1,
};

/** A sensor's own fixed error, well within its maker's limits. */
function fixedError(story: Story, tower: DemoTower, sensor: DemoSensor): number {
  return 0.4 * (sensor.limits ?? 0) * (2 * chance(story.seed, 210, numberOf(tower.slug + sensor.name)) - 1);
}

function trueValue(story: Story, tower: DemoTower, sensor: DemoSensor, t: number): number {
  const site = SITES[tower.slug];
  if (sensor.quantity === 'pm2.5') return hourlySmoke(story, MONITORS[tower.slug] ?? 1, t);
  if (sensor.quantity === 'relative humidity') return floorHumidityPct(story, t);
  if (sensor.quantity === 'station pressure') return floorPressureHpa(story, t);
  if (!site)
    throw new Error(`The demo knows no air for ${tower.slug}. Give the tower a site in tower-air.ts.`);
  if (sensor.quantity === 'wind speed') return towerWindMPerS(story, site, t);
  return towerTemperatureC(story, site, t, sensor.heightM);
}

/** What a sensor shows for the interval that ends at an instant, as the logger writes it. */
function shownValue(story: Story, tower: DemoTower, sensor: DemoSensor, t: number): string {
  const seen = shownInstant(story, tower, sensor, t);
  const value =
    trueValue(story, tower, sensor, seen) + fixedError(story, tower, sensor) + spike(story, tower, sensor, t);
  return value.toFixed(DECIMALS[sensor.quantity]);
}

/** Seconds a logger's clock is ahead of UTC by its declaration, "UTC" or "±HH:MM". */
export function offsetS(clock: string): number {
  if (clock === 'UTC') return 0;
  const [, sign, hours, minutes] = /^([+-])(\d\d):(\d\d)$/.exec(clock) ?? [];
  if (!sign) throw new Error(`The demo's loggers keep UTC or a fixed offset such as -07:00, not ${clock}.`);
  return (sign === '-' ? -1 : 1) * (Number(hours) * 3600 + Number(minutes) * 60);
}

/** Date and time as a logger writes them: "2026-01-14 02:00:00" by its own clock. */
export function loggerTime(t: number, clock: string): string {
  return new Date((t + offsetS(clock)) * 1000).toISOString().slice(0, 19).replace('T', ' ');
}

/** The first line of each of a tower's files. */
export function headerLine(tower: DemoTower): string {
  return `time,${tower.sensors.map(({ name }) => name).join(',')}\n`;
}

/** A row of a tower's file: the month it is filed under and the line itself. */
export interface LoggerRow {
  readonly month: string;
  readonly line: string;
}

/**
 * The row for the interval that ends at an instant, or undefined when it is lost.
 *
 * Units: UTC epoch s; a whole multiple of the tower's interval. Valid: any such instant. Source: the demo's own model.
 */
export function loggerRow(story: Story, tower: DemoTower, tEnd: number): LoggerRow | undefined {
  if (isLost(story, tower, tEnd)) return undefined;
  const stampedAt =
    (tower.stamp === 'start' ? tEnd - tower.intervalMinutes * 60 : tEnd) + clockErrorS(story, tower, tEnd);
  const time = loggerTime(stampedAt, tower.clock);
  const values = tower.sensors.map((sensor) => shownValue(story, tower, sensor, tEnd));
  return { month: loggerTime(tEnd, tower.clock).slice(0, 7), line: `${time},${values.join(',')}\n` };
}
