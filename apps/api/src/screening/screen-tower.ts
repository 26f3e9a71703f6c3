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

/** How far around a reading its screening looks, and how far a changed one can reach. */
export function contextOf(tower: TowerLayout): ScreeningContext {
  return screeningContext(tower.sensors.map((sensor) => described(tower, sensor, Infinity)));
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

/**
 * Screens a stretch of one tower, whose series come in the order of its sensors with their context. Gives the flags
 * of the readings within the stretch, series by series. What only reports is told apart when means are made.
 */
export function screenStretch(
  tower: TowerLayout,
  series: readonly Series[],
  { t0, t1 }: Stretch,
  spans: readonly SetSpan[],
): Flags[] {
  const sensors = tower.sensors.map((sensor, i) => ({
    ...described(tower, sensor, t1),
    readings: corrected(sensor, series[i]!),
  }));
  const overrides = spans.map(({ sensorId, ...span }) => ({
    ...{ sensorId: String(sensorId), from: span.t0, to: span.t1 },
    ...{ quality: span.quality, reason: '', at: span.at },
  }));
  const screened = screenTower({ sensors, from: t0, to: t1, overrides });
  return tower.sensors.map(({ id }) => flagsOf(screened.get(String(id)) ?? []));
}
