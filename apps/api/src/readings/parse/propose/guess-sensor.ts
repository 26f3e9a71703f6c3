import type { SensorQuantity } from '../../../towers/quantities';
import type { ForeignUnit } from '../../../towers/units';

/** A sensor of the tower, as far as a column's name can point to it. */
export interface KnownSensor {
  readonly name: string;
  readonly quantity: SensorQuantity;
  readonly heightM: number;
}

const FOOT_M = 0.3048;
const CENTIMETRE_M = 0.01;
const CLOSE_M = 0.5;

/** The first that fits counts. */
const QUANTITY_WORDS: readonly (readonly [SensorQuantity, RegExp])[] = [
  ['pm2.5', /pm\s*2[._ ]?5/i],
  ['wind direction', /dir(?:ec|\b|[^a-z]|$)|\bwd|azimuth/i],
  ['wind speed', /wind|speed|\bws|anemo/i],
  ['relative humidity', /humid|(?:^|[^a-z])rh|hum\b/i],
  ['dew point', /dew|\btd\b/i],
  ['wet bulb', /wet/i],
  ['station pressure', /press|baro|\bbp\b/i],
  ['air temperature', /temp|tmp|air\s*t|(?:^|[^a-z])t(?:a|c|air|amb)?(?:[ ]|\d|$)/i],
];

/** What is made of readings rather than read (deviations, extremes, flags, differences), or is not of the air outside. */
const OTHER = new RegExp(
  [
    'std|stdev|\\bsd\\b|dev\\b|deviation|\\bmax|\\bmin\\b|minimum|flag|\\bqc\\b|quality|gradient|richardson|delta|count|gust|error',
    'soil|ground|surface|skin|snow|water|wetness|leaf|panel|ptemp|logger|batt|box|enclosure|case|body|internal|virtual|sonic|potential',
    'vapou?r|vpd|sea|\\bslp|\\bmsl|altim|qnh|qff|road|dome|sensor t|solar|radiation',
  ].join('|'),
  'i',
);

const plain = (text: string): string => text.toLowerCase().replace(/[^a-z0-9]/g, '');

/** The height in a column's name, m: "Temp 10 m", "T_33ft", "t2", "T60", "T200cm". */
export function heightIn(name: string): number | undefined {
  const said = /(\d+(?:[.,]\d+)?)\s*_?(cm|m|meters?|metres?|ft|feet)(?![a-z])/i.exec(name);
  if (said) {
    const value = Number(said[1]!.replace(',', '.'));
    const unit = said[2]!.toLowerCase();
    return unit === 'cm' ? value * CENTIMETRE_M : unit.startsWith('f') ? value * FOOT_M : value;
  }
  const bare = /(?:^|[a-z_ ])(\d+(?:\.\d+)?)$/i.exec(name.replace(/\s*[([].*?[)\]]/g, '').trim());
  return bare ? Number(bare[1]) : undefined;
}

/** The quantity that a column's name speaks of. */
export function quantityIn(name: string): SensorQuantity | undefined {
  const spaced = name.replace(/_/g, ' ');
  return OTHER.test(spaced) ? undefined : QUANTITY_WORDS.find(([, words]) => words.test(spaced))?.[0];
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
  ['°F', /°\s*f\b|deg(?:rees)?\.?\s*f\b|fahrenheit|[([]\s*f\s*[)\]]|(?:^| )f$|te?mpf\b/i],
  ['K', /kelvin|[([]\s*k\s*[)\]]|(?:^|\d m |temp )k$/i],
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
  UNIT_WORDS.find(([, words]) => words.test(text.replace(/_/g, ' ')))?.[0];
