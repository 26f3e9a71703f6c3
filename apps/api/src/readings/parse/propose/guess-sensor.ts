import type { SensorQuantity } from '../../../towers/quantities';
import type { ForeignUnit } from '../../../towers/units';

/** A sensor of the tower, as far as a column's name can point to it. */
export interface KnownSensor {
  readonly name: string;
  readonly quantity: SensorQuantity;
  readonly heightM: number;
}

const FOOT_M = 0.3048;
const CLOSE_M = 0.5;

/** The first that fits counts. */
const QUANTITY_WORDS: readonly (readonly [SensorQuantity, RegExp])[] = [
  ['pm2.5', /pm\s*_?2[._]?5/i],
  ['wind direction', /\bdir|direction|\bwd|azimuth/i],
  ['wind speed', /wind|speed|\bws|anemo/i],
  ['relative humidity', /humid|\brh|\bhum\b/i],
  ['dew point', /dew|\btd\b/i],
  ['wet bulb', /wet/i],
  ['station pressure', /press|baro|\bbp\b/i],
  ['air temperature', /temp|\bair\s*t\b|(?:^|[^a-z])ta?(?:[_ ]|\d|$)/i],
];

/** What is made of readings rather than read: deviations, extremes, flags, differences. */
const DERIVED =
  /std|stdev|\bsd\b|dev\b|deviation|\bmax|\bmin\b|minimum|flag|\bqc\b|quality|gradient|richardson|delta|battery|count/i;

const plain = (text: string): string => text.toLowerCase().replace(/[^a-z0-9]/g, '');

/** The height in a column's name, m: "Temp 10 m", "T_33ft", "t2", "T60". */
export function heightIn(name: string): number | undefined {
  const said = /(\d+(?:[.,]\d+)?)\s*_?(m|meters?|metres?|ft|feet)(?![a-z])/i.exec(name);
  if (said) {
    const value = Number(said[1]!.replace(',', '.'));
    return /^f/i.test(said[2]!) ? value * FOOT_M : value;
  }
  const bare = /(?:^|[a-z_ ])(\d+(?:\.\d+)?)$/i.exec(name.replace(/\s*[([].*?[)\]]/g, '').trim());
  return bare ? Number(bare[1]) : undefined;
}

/** The quantity that a column's name speaks of. */
export function quantityIn(name: string): SensorQuantity | undefined {
  const spaced = name.replace(/_/g, ' ');
  return DERIVED.test(spaced) ? undefined : QUANTITY_WORDS.find(([, words]) => words.test(spaced))?.[0];
}

/** The sensor a column seems to be: by its name, or by quantity and height; undefined where that is not clear. */
export function guessSensor(name: string, sensors: readonly KnownSensor[]): KnownSensor | undefined {
  const same = sensors.find((sensor) => sensor.name === name);
  if (same) return same;
  const alike = sensors.filter((sensor) => plain(sensor.name) === plain(name) && plain(name) !== '');
  if (alike.length === 1) return alike[0];
  const quantity = quantityIn(name);
  if (quantity === undefined) return undefined;
  const height = heightIn(name);
  const fitting = sensors.filter(
    (sensor) =>
      sensor.quantity === quantity && (height === undefined || Math.abs(sensor.heightM - height) <= CLOSE_M),
  );
  return fitting.length === 1 ? fitting[0] : undefined;
}

/** Words for units that are converted, as they stand in headers. */
const UNIT_WORDS: readonly (readonly [ForeignUnit, RegExp])[] = [
  ['°F', /°\s*f\b|deg\.?\s*f\b|fahrenheit|[([]\s*f\s*[)\]]/i],
  ['K', /kelvin|[([]\s*k\s*[)\]]/i],
  ['mph', /\bmph\b|mi\/h/i],
  ['km/h', /\bkm\/?h\b|\bkph\b/i],
  ['kn', /\bkn\b|\bkts?\b|knots?/i],
  ['kPa', /\bkpa\b/i],
  ['inHg', /in\.?\s*hg/i],
  ['mmHg', /mm\s*hg|\btorr\b/i],
  ['Pa', /(?:^|[([\s])pa(?:$|[)\]\s])/i],
  ['mg/m³', /\bmg\/m/i],
];

/** The foreign unit that a header, or the line of units below it, names. */
export const unitIn = (text: string): ForeignUnit | undefined =>
  UNIT_WORDS.find(([, words]) => words.test(text))?.[0];
