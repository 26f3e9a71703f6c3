import { qualityCodes } from '@lidwatch/contracts';
import { versionAt, type LayoutSensor, type LayoutVersion, type TowerLayout } from '../towers/tower-layout';
import type { SensorQuantity } from '../towers/quantities';

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
  /** Of the sensor nearest 2 m. */
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

const otherOf = (present: readonly Measured[], pm25Hour: number | undefined): OtherQuantities => {
  if (pm25Hour === undefined && present.every(isTemperature)) return NOTHING_ELSE;
  const shown = {
    'relative humidity': nearest(present, 'relative humidity', 2),
    'wind speed': nearest(present, 'wind speed', 10),
    'wind direction': nearest(present, 'wind direction', 10),
    'pm2.5': nearest(present, 'pm2.5', 2),
  };
  const humidity = present
    .filter(({ sensor }) => sensor.quantity === 'relative humidity')
    .map(({ version, kept }) => [version.heightM, kept.mean, version.sigma] as const);
  const suspect = Object.values(shown).flatMap((each) =>
    each?.kept.quality === qualityCodes.suspect ? [each.sensor.quantity] : [],
  );
  return defined({
    humidity: humidity.length > 0 ? humidity : undefined,
    relativeHumidityPct: shown['relative humidity']?.kept.mean,
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
  return { towerId: tower.id, tEnd, levels, pressureHpa: pressure, other: otherOf(measured, pm25Hour) };
}
