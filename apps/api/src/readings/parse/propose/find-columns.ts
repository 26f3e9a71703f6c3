import type { SensorQuantity } from '../../../towers/quantities';
import { suits, type ForeignUnit } from '../../../towers/units';
import { quoted } from '../../../common/quoted';
import { readNumber } from '../number-cell';
import type { FoundHeader } from './find-header';
import { guessSensor, quantityIn, unitIn, type KnownSensor } from './guess-sensor';

/** One column of a table: what it is called, how it looks, and what it seems to be. */
export interface FoundColumn {
  readonly index: number;
  readonly name: string;
  readonly samples: readonly string[];
  readonly sensor: string | null;
  /** What the file or the size of the values says; of a column nobody could name, too, for who names it. */
  readonly unit: ForeignUnit | null;
  /** Something to look at, as a sentence. */
  readonly note: string | null;
  /** Whether the values do not tell °C from °F. */
  readonly unitOpen: boolean;
}

const SAMPLES = 5;
/** Above this the warm end of a month of air temperature in °C is doubtful, below it of one in °F. */
const DOUBTFUL_C = 42;
const SURELY_K = 180;
const NEVER_C = 60;

const quantile = (sorted: readonly number[], q: number): number =>
  sorted[Math.min(sorted.length - 1, Math.floor(q * sorted.length))] ?? NaN;

interface Spread {
  readonly low: number;
  readonly middle: number;
  readonly high: number;
}

const spreadOf = (cells: readonly string[], decimal: '.' | ',', marks: ReadonlySet<string>): Spread => {
  const values = cells
    .filter((cell) => cell !== '' && !marks.has(cell))
    .map((cell) => readNumber(cell, decimal))
    .filter((value): value is number => typeof value === 'number')
    .sort((a, b) => a - b);
  return { low: quantile(values, 0.02), middle: quantile(values, 0.5), high: quantile(values, 0.98) };
};

const temperatures: readonly SensorQuantity[] = ['air temperature', 'dew point', 'wet bulb'];

/** The unit that the size of the values tells, where it can be no other. */
const unitBySize = (quantity: SensorQuantity, { middle, high, low }: Spread): ForeignUnit | null => {
  if (temperatures.includes(quantity)) return low > SURELY_K ? 'K' : null;
  if (quantity === 'relative humidity') return high <= 1.1 && high > 0 ? '0–1' : null;
  if (quantity !== 'station pressure') return null;
  if (middle > 20_000) return 'Pa';
  if (middle > 15 && middle < 35) return 'inHg';
  return middle >= 40 && middle < 115 ? 'kPa' : null;
};

/** Looks at each column but those of the time. */
export function findColumns(
  header: FoundHeader,
  used: readonly number[],
  sensors: readonly KnownSensor[],
  decimal: '.' | ',',
  marks: ReadonlySet<string>,
): FoundColumn[] {
  const taken = new Set<string>();
  return header.names.flatMap((name, index): FoundColumn[] => {
    if (used.includes(index) || name === '') return [];
    const cells = header.data.map((row) => row.cells[index] ?? '');
    const samples = [...new Set(cells.filter((cell) => cell !== ''))].slice(0, SAMPLES);
    const title = header.titles[index]!;
    const guess = guessSensor(title, sensors);
    const isTaken = guess !== undefined && taken.has(guess.name);
    if (guess) taken.add(guess.name);
    const sensor = guess && !isTaken ? guess.name : null;
    const quantity = guess?.quantity ?? quantityIn(title);
    const said = [title, ...header.between.map((row) => row.cells[index] ?? '')].map(unitIn).find(Boolean);
    const spread = spreadOf(cells, decimal, marks);
    const bySize = quantity ? unitBySize(quantity, spread) : null;
    const unit = said !== undefined && (quantity === undefined || suits(said, quantity)) ? said : bySize;
    const isTemperature = quantity !== undefined && temperatures.includes(quantity);
    const isOdd = isTemperature && unit === null && spread.high > DOUBTFUL_C;
    const base = { index, name, samples, sensor, unit };
    if (isTaken) {
      return [{ ...base, note: `Another column is proposed for "${guess.name}" already.`, unitOpen: false }];
    }
    if (isOdd && spread.high > NEVER_C) {
      const note = `Values up to ${Math.round(spread.high)}: no air is that warm in °C. °F is likely; please say.`;
      return [{ ...base, note, unitOpen: true }];
    }
    const called = title === name ? null : `Called ${quoted(title)} in the file.`;
    const note = isOdd ? `Values up to ${Math.round(spread.high)}: look whether this is °F.` : called;
    return [{ ...base, note, unitOpen: isOdd }];
  });
}
