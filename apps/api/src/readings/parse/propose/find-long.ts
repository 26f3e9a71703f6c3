import type { SensorQuantity } from '../../../towers/quantities';
import type { ForeignUnit } from '../../../towers/units';
import { readNumber } from '../number-cell';
import type { FoundHeader } from './find-header';
import { guessSensor, heightIn, quantityIn, unitIn, type KnownSensor } from './guess-sensor';

/** A sensor as a long table writes it, and what it seems to be. */
export interface WrittenSensor {
  readonly name: string;
  readonly sensor: string | undefined;
  readonly unit: ForeignUnit | undefined;
}

/** The columns of a long table: which names the sensor, which holds the value. */
export interface LongColumns {
  readonly sensorColumn: string;
  readonly valueColumn: string;
  /** The sensors as the file writes them. */
  readonly written: readonly WrittenSensor[];
}

const FEW = 60;
const MOSTLY = 0.9;
const NAMED_SO = /sensor|channel|name|param|variable|quantity/i;
const HEIGHT = /height|level|agl|h(?:oe|ö)he|altura|\bz\b/i;
const VALUE = /value|wert|valor|reading|measure/i;

/**
 * Whether a table is long: few names (or few heights) in one column, numbers in another, the time coming again and
 * again; then what its sensors seem to be, in the unit that a column beside them says.
 */
export function findLong(
  header: FoundHeader,
  used: readonly number[],
  sensors: readonly KnownSensor[],
  decimal: '.' | ',',
): LongColumns | undefined {
  const { titles, data } = header;
  const places = titles.map((_, place) => place).filter((place) => !used.includes(place));
  const cellsAt = (place: number): string[] => data.map((row) => row.cells[place] ?? '').filter(Boolean);
  const isNumeric = (place: number): boolean => {
    const cells = cellsAt(place);
    const numbers = cells.filter((cell) => typeof readNumber(cell, decimal) === 'number');
    return cells.length > 0 && numbers.length >= MOSTLY * cells.length;
  };
  const isFew = (place: number): boolean => {
    const { size } = new Set(cellsAt(place));
    return size >= 2 && size <= FEW;
  };
  const times = data.map((row) => used.map((place) => row.cells[place]).join(' '));
  if (new Set(times).size > times.length / 2 + 1) return undefined;
  const numeric = places.filter(isNumeric);
  const heights = numeric.find((place) => HEIGHT.test(titles[place]!) && isFew(place));
  const words = places.filter((place) => !numeric.includes(place));
  const named = words.filter(isFew);
  const values = numeric.filter((place) => place !== heights);
  const value =
    values.length === 1
      ? values[0]
      : (values.find((place) => VALUE.test(titles[place]!)) ??
        values.find((place) => heights !== undefined && quantityIn(titles[place]!) === 'air temperature'));
  const sensor = named.find((place) => NAMED_SO.test(titles[place]!)) ?? heights ?? named[0];
  if (value === undefined || sensor === undefined) return undefined;
  const about: About = { title: titles[value]!, isHeight: sensor === heights, sensors };
  const unitPlace = words.find((place) => place !== sensor && cellsAt(place).some((cell) => unitIn(cell)));
  const unitOf = (name: string): ForeignUnit | undefined =>
    unitPlace === undefined
      ? undefined
      : unitIn(data.find((row) => row.cells[sensor] === name)?.cells[unitPlace] ?? '');
  return {
    sensorColumn: header.names[sensor]!,
    valueColumn: header.names[value]!,
    written: [...new Set(cellsAt(sensor))].map((name) => ({
      name,
      sensor: sensorOf(name, about)?.name,
      unit: unitIn(name) ?? unitOf(name) ?? unitIn(about.title),
    })),
  };
}

interface About {
  readonly title: string;
  readonly isHeight: boolean;
  readonly sensors: readonly KnownSensor[];
}

const CLOSE_M = 0.5;

/** By its name; where the table names heights, by height and what the values' column speaks of. */
function sensorOf(name: string, { title, isHeight, sensors }: About): KnownSensor | undefined {
  const guess = guessSensor(name, sensors);
  if (guess || !isHeight) return guess;
  const quantity: SensorQuantity = quantityIn(title) ?? 'air temperature';
  const heightM = heightIn(name) ?? Number(name.replace(',', '.'));
  const fitting = sensors.filter(
    (sensor) => sensor.quantity === quantity && Math.abs(sensor.heightM - heightM) <= CLOSE_M,
  );
  return fitting.length === 1 ? fitting[0] : undefined;
}
