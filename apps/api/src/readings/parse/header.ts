import { HeaderError } from './parsed-readings';
import { sensorNameOf, type Mapping } from './mapping';
import type { ForeignUnit } from '../../towers/units';
import { quoted } from '../../common/quoted';

/** A wide file's columns: where the time stands and which sensor each other column is. */
export interface WideHeader {
  readonly cells: number;
  /** Where the time stands; several places where it stands in several columns. */
  readonly time: readonly number[];
  readonly sensors: readonly WideColumn[];
  readonly leaveOut: readonly LeftOutRows[];
  readonly ignored: string[];
}

/** Rows that are passed over: those with one of these texts in a place. */
export interface LeftOutRows {
  readonly place: number;
  readonly values: ReadonlySet<string>;
}

/** A column of a wide file that is a sensor's. */
export interface WideColumn {
  readonly index: number;
  readonly column: string;
  readonly sensorId: number;
  readonly unit?: ForeignUnit;
}

/** A long file's columns. */
export interface LongHeader {
  readonly cells: number;
  readonly time: readonly number[];
  readonly sensor: number;
  readonly value: number;
  readonly leaveOut: readonly LeftOutRows[];
  readonly ignored: string[];
}

const MOST_COLUMNS = 2_000;
const LISTED = 20;

const place = (header: readonly string[], column: string): number => {
  const index = header.indexOf(column);
  if (index < 0) {
    const has = header.slice(0, LISTED).map(quoted).join(', ');
    throw new HeaderError(
      `The header has no column ${quoted(column)}; it has ${has || 'no columns'}. ` +
        `Name the column in the source's mapping, or correct the header or the separator.`,
    );
  }
  if (header.indexOf(column, index + 1) >= 0) {
    throw new HeaderError(
      `The header has the column ${quoted(column)} twice; give each column its own name.`,
    );
  }
  return index;
};

const checked = (cells: readonly string[]): string[] => {
  if (cells.length > MOST_COLUMNS) {
    throw new HeaderError(
      `The header has ${cells.length} columns; send at most ${MOST_COLUMNS} in one file.`,
    );
  }
  return cells.map((cell) => cell.trim());
};

const times = (header: readonly string[], { timeColumn, timeColumns }: Mapping): number[] =>
  (timeColumns?.map(({ column }) => column) ?? [timeColumn]).map((column) => place(header, column));

const leftOut = (header: readonly string[], { leaveOut = [] }: Mapping): LeftOutRows[] =>
  leaveOut.map(({ column, values }) => ({ place: place(header, column), values: new Set(values) }));

/** Finds the columns of a wide file. Columns that no sensor of the tower has are ignored, and said. */
export function wideHeader(
  cells: readonly string[],
  mapping: Mapping,
  sensorIds: ReadonlyMap<string, number>,
): WideHeader {
  const header = checked(cells);
  const time = times(header, mapping);
  const sensors = header.flatMap((column, index): WideColumn[] => {
    const sensorId = sensorIds.get(sensorNameOf(mapping, column) ?? '');
    if (time.includes(index) || sensorId === undefined) return [];
    place(header, column);
    return [{ index, column, sensorId, unit: mapping.units?.[column] }];
  });
  refuseSameSensor(sensors);
  if (sensors.length === 0) {
    const known = [...sensorIds.keys()].slice(0, LISTED).map(quoted).join(', ');
    throw new HeaderError(
      `No column of the header is a sensor of this tower (${known || 'it has none yet'}); ` +
        `use the sensors' names as headers, or map the headers to them.`,
    );
  }
  const used = new Set([...time, ...sensors.map((s) => s.index)]);
  return {
    ...{ cells: header.length, time, sensors, leaveOut: leftOut(header, mapping) },
    ignored: header.filter((_, i) => !used.has(i)),
  };
}

/** Finds the columns of a long file. */
export function longHeader(cells: readonly string[], mapping: Mapping): LongHeader {
  const header = checked(cells);
  const time = times(header, mapping);
  const [sensor, value] = [place(header, mapping.sensorColumn), place(header, mapping.valueColumn)];
  const ignored = header.filter((_, i) => !time.includes(i) && i !== sensor && i !== value);
  return { cells: header.length, time, sensor, value, leaveOut: leftOut(header, mapping), ignored };
}

function refuseSameSensor(sensors: readonly WideColumn[]): void {
  const seen = new Map<number, string>();
  for (const { column, sensorId } of sensors) {
    const other = seen.get(sensorId);
    if (other !== undefined) {
      throw new HeaderError(
        `The columns ${quoted(other)} and ${quoted(column)} are set to the same sensor; ` +
          `give each column its own sensor, or leave one of them out.`,
      );
    }
    seen.set(sensorId, column);
  }
}
