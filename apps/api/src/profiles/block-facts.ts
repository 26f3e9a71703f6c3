import { qualityCodes } from '@lidwatch/contracts';
import { versionAt, type LayoutSensor, type LayoutVersion, type TowerLayout } from '../towers/tower-layout';
import type { SensorQuantity } from '../towers/quantities';
import { derivedHumidity, pressureOr } from './derived-humidity';

/** A block mean as it is kept. */
export interface KeptMean {
  readonly sensorId: number;
  readonly mean: number | null;
  readonly n: number;
  readonly quality: number;
}

/** A temperature level as a profile keeps it: height m, mean °C (null: missing), σ °C, readings, quality code. */
export type StoredLevel = readonly [number, number | null, number, number, number];

/** What a profile keeps of the tower's other quantities. Left out where the tower gave none. */
export interface OtherQuantities {
  /** Height m, RH over water %, σ %; for whether a layer is saturated. */
  readonly humidity?: readonly (readonly [number, number, number])[];
  /** Nearest 2 m; from a dew point or wet bulb where no humidity was measured. */
  readonly relativeHumidityPct?: number;
  /** Of the sensor nearest 10 m. */
  readonly windSpeedMPerS?: number;
  readonly windDirectionDeg?: number;
  /** Block mean, µg/m³. */
  readonly pm25?: number;
  /** Mean of the hour that ends with the block, where 75 % of its blocks are valid, µg/m³. */
  readonly pm25Hour?: number;
  /** Quantities whose value holds a suspect reading. */
  readonly suspect?: readonly SensorQuantity[];
}

/** One tower's block as a profile keeps it. */
export interface BlockFacts {
  readonly towerId: number;
  readonly tEnd: number;
  readonly levels: readonly StoredLevel[];
  /** Measured station pressure; null where none is. */
  readonly pressureHpa: number | null;
  readonly other: OtherQuantities;
}

interface Present {
  readonly sensor: LayoutSensor;
  readonly version: LayoutVersion;
  readonly kept: KeptMean | undefined;
}

type Measured = Present & { readonly kept: KeptMean & { readonly mean: number } };

const isMeasured = (present: Present): present is Measured => typeof present.kept?.mean === 'number';

const levelOf = ({ version, kept }: Present): StoredLevel => [
  version.heightM,
  kept?.mean ?? null,
  version.sigma,
  kept?.n ?? 0,
  kept?.quality ?? qualityCodes.missing,
];

const nearest = (
  present: readonly Measured[],
  quantity: SensorQuantity,
  heightM: number,
): Measured | undefined => {
  let best: Measured | undefined;
  let least = Infinity;
  for (const each of present) {
    if (each.sensor.quantity !== quantity) continue;
    const away = Math.abs(each.version.heightM - heightM);
    if (away < least) [best, least] = [each, away];
  }
  return best;
};

const NOTHING_ELSE: OtherQuantities = {};
const isTemperature = ({ sensor }: Present): boolean => sensor.quantity === 'air temperature';

const defined = <T extends object>(values: T): T =>
  Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as T;

/** How far above or below a dew point or wet bulb the air temperature beside it may be, m. */
const BESIDE_M = 1;

type HumidityHere = readonly [number, number, number];

/** Relative humidity as it was measured, and from dew points and wet bulbs where it was not. */
const humidityOf = (present: readonly Measured[], pressureHPa: number): HumidityHere[] => {
  const direct = present
    .filter(({ sensor }) => sensor.quantity === 'relative humidity')
    .map(({ version, kept }): HumidityHere => [version.heightM, kept.mean, version.sigma]);
  const derived = present.flatMap(({ sensor, version, kept }): HumidityHere[] => {
    const { quantity: kind } = sensor;
    const { heightM } = version;
    if (kind !== 'dew point' && kind !== 'wet bulb') return [];
    const air = nearest(present, 'air temperature', heightM);
    if (!air || Math.abs(air.version.heightM - heightM) > BESIDE_M) return [];
    if (direct.some(([other]) => Math.abs(other - heightM) <= BESIDE_M)) return [];
    const by = { kind, heightM, valueC: kept.mean, valueSigmaC: version.sigma } as const;
    const found = derivedHumidity({ ...by, airC: air.kept.mean, airSigmaC: air.version.sigma }, pressureHPa);
    return found ? [found] : [];
  });
  return [...direct, ...derived];
};

const nearestTo = (humidity: readonly HumidityHere[], heightM: number): number | undefined =>
  [...humidity].sort((a, b) => Math.abs(a[0] - heightM) - Math.abs(b[0] - heightM))[0]?.[1];

const otherOf = (
  present: readonly Measured[],
  pm25Hour: number | undefined,
  pressureHPa: number,
): OtherQuantities => {
  if (pm25Hour === undefined && present.every(isTemperature)) return NOTHING_ELSE;
  const humidity = humidityOf(present, pressureHPa);
  const shown = {
    'relative humidity': nearest(present, 'relative humidity', 2),
    'wind speed': nearest(present, 'wind speed', 10),
    'wind direction': nearest(present, 'wind direction', 10),
    'pm2.5': nearest(present, 'pm2.5', 2),
  };
  const suspect = Object.values(shown).flatMap((each) =>
    each?.kept.quality === qualityCodes.suspect ? [each.sensor.quantity] : [],
  );
  return defined({
    humidity: humidity.length > 0 ? humidity : undefined,
    relativeHumidityPct: nearestTo(humidity, 2),
    windSpeedMPerS: shown['wind speed']?.kept.mean,
    windDirectionDeg: shown['wind direction']?.kept.mean,
    pm25: shown['pm2.5']?.kept.mean,
    pm25Hour,
    suspect: suspect.length > 0 ? suspect : undefined,
  });
};

/**
 * What one block of a tower says: every temperature level the tower had then, missing ones too, ascending; the
 * measured pressure; and its other quantities. Undefined when no sensor gave a reading.
 */
export function blockFacts(
  tower: TowerLayout,
  tEnd: number,
  means: readonly KeptMean[],
  pm25Hour?: number,
): BlockFacts | undefined {
  if (means.length === 0) return undefined;
  const present = tower.sensors.flatMap((sensor): Present[] => {
    const version = versionAt(sensor, tEnd);
    if (!version || (sensor.retiredAt !== null && sensor.retiredAt < tEnd)) return [];
    return [{ sensor, version, kept: means.find((each) => each.sensorId === sensor.id) }];
  });
  const levels = present
    .filter(isTemperature)
    .map(levelOf)
    .sort((a, b) => a[0] - b[0]);
  const measured = present.filter(isMeasured);
  const pressure = nearest(measured, 'station pressure', 0)?.kept.mean ?? null;
  const other = otherOf(measured, pm25Hour, pressureOr(pressure, tower.elevationM));
  return { towerId: tower.id, tEnd, levels, pressureHpa: pressure, other };
}
