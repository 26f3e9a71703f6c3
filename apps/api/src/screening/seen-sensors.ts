import { Problem } from '../common/problem';
import { unitsByQuantity } from '../towers/quantities';
import type { LayoutSensor, TowerLayout } from '../towers/tower-layout';
import type { SeenSensorDto } from './dto/calendar.dto';

const heightOf = ({ versions }: LayoutSensor): number => versions.at(-1)?.heightM ?? 0;
const rankOf = ({ quantity }: LayoutSensor): number => Number(quantity !== 'air temperature');

/** A sensor as calendars and charts name it. */
export const seenSensor = (sensor: LayoutSensor): SeenSensorDto => ({
  sensorId: sensor.id,
  name: sensor.name,
  quantity: sensor.quantity,
  unit: unitsByQuantity[sensor.quantity],
  heightM: heightOf(sensor),
});

/** A tower's sensors, temperatures first, from the ground up; or the one asked for. 404 where it has no such sensor. */
export function sensorsOf(tower: TowerLayout, sensorId?: number): LayoutSensor[] {
  const wanted = tower.sensors.filter(({ id }) => sensorId === undefined || id === sensorId);
  if (sensorId !== undefined && wanted.length === 0)
    throw new Problem('not-found', `${tower.name} has no sensor ${sensorId}.`);
  return wanted.sort((a, b) => rankOf(a) - rankOf(b) || heightOf(a) - heightOf(b) || a.id - b.id);
}
