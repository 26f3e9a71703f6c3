import {
  screeningContext,
  screenTower,
  type Check as MadeCheck,
  type MeasuredQuantity,
  type ScreenedReading,
  type ScreeningContext,
  type SensorSeries,
} from '@lidwatch/atmosphere';
import { checkBits, qualityCodes } from '@lidwatch/contracts';
import type { SensorQuantity } from '../towers/quantities';
import { versionAt, type LayoutSensor, type TowerLayout } from '../towers/tower-layout';
import type { Flags, Series, SetSpan, Stretch } from './series';
import { sunElevationDeg } from './sun-elevation';

const quantities: Readonly<Record<SensorQuantity, MeasuredQuantity>> = {
  ...{
    'air temperature': 'air temperature',
    'relative humidity': 'relative humidity',
    'dew point': 'dew point',
  },
  ...{ 'wet bulb': 'wet bulb', 'wind speed': 'wind speed', 'wind direction': 'wind direction' },
  ...{ 'station pressure': 'pressure', 'pm2.5': 'pm25' },
} as const;

const bits: Readonly<Record<MadeCheck, number>> = {
  clock: checkBits.clock,
  range: checkBits.range,
  spike: checkBits.spike,
  step: checkBits.step,
  stuck: checkBits.stuck,
  persistence: checkBits.persistence,
  internal: checkBits['internal consistency'],
  vertical: checkBits['vertical consistency'],
  neighbours: checkBits.neighbours,
};

const described = (tower: TowerLayout, sensor: LayoutSensor, t: number): Omit<SensorSeries, 'readings'> => {
  const { heightM, sigma } = versionAt(sensor, t) ?? sensor.versions[0]!;
  return {
    sensorId: String(sensor.id),
    quantity: quantities[sensor.quantity],
    intervalS: tower.intervalS,
    limits: sensor.limits,
    ...{ heightM, sigma },
  };
};

/** Those of a neighbour's sensors that measure what the tower measures. */
export function kinOf(tower: TowerLayout, neighbour: TowerLayout): LayoutSensor[] {
  return neighbour.sensors.filter(({ quantity }) => tower.sensors.some((own) => own.quantity === quantity));
}

/** How far around a reading its screening looks, and how far a changed one, of a neighbour too, can reach. */
export function contextOf(tower: TowerLayout, neighbours: readonly TowerLayout[] = []): ScreeningContext {
  const sensors = (of: TowerLayout) => (sensor: LayoutSensor) => described(of, sensor, Infinity);
  return screeningContext([
    ...tower.sensors.map(sensors(tower)),
    ...neighbours.flatMap((neighbour) => kinOf(tower, neighbour).map(sensors(neighbour))),
  ]);
}

const corrected = (sensor: LayoutSensor, { tEnd, value }: Series): { tEnd: number; value: number }[] =>
  tEnd.map((t, i) => {
    const { gain, offset } = versionAt(sensor, t) ?? sensor.versions[0]!;
    return { tEnd: t, value: gain * value[i]! + offset };
  });

const flagsOf = (readings: readonly ScreenedReading[]): Flags => ({
  tEnd: readings.map(({ tEnd }) => tEnd),
  quality: readings.map(({ quality }) => qualityCodes[quality]),
  checks: readings.map(({ flags, override }) =>
    flags.reduce(
      (sum, flag) => (flag.withdrawn === undefined ? sum | bits[flag.check] : sum),
      override === null ? 0 : checkBits.override,
    ),
  ),
});

/** A neighbouring tower with the series of its `kinOf` sensors. */
export interface Nearby {
  readonly tower: TowerLayout;
  readonly series: readonly Series[];
}

/**
 * Screens a stretch of one tower, whose series come in the order of its sensors with their context, as do those of its
 * neighbours. Gives the flags of the readings within the stretch, series by series. What only reports is told apart
 * when means are made.
 */
export function screenStretch(
  tower: TowerLayout,
  series: readonly Series[],
  { t0, t1 }: Stretch,
  spans: readonly SetSpan[],
  nearby: readonly Nearby[] = [],
): Flags[] {
  const given = (of: TowerLayout, list: readonly LayoutSensor[], its: readonly Series[]): SensorSeries[] =>
    list.map((sensor, i) => ({ ...described(of, sensor, t1), readings: corrected(sensor, its[i]!) }));
  const sensors = given(tower, tower.sensors, series);
  const neighbours = nearby.map((near) => given(near.tower, kinOf(tower, near.tower), near.series));
  const overrides = spans.map(({ sensorId, ...span }) => ({
    ...{ sensorId: String(sensorId), from: span.t0, to: span.t1 },
    ...{ quality: span.quality, reason: '', at: span.at },
  }));
  const screened = screenTower({
    ...{ sensors, neighbours, overrides, from: t0, to: t1 },
    sunElevationDeg: (t) => sunElevationDeg(t, tower.latitude, tower.longitude),
  });
  return tower.sensors.map(({ id }) => flagsOf(screened.get(String(id)) ?? []));
}
