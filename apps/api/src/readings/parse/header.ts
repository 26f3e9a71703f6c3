import { HeaderError } from './parsed-readings';
import type { Mapping } from './mapping';
import { quoted } from '../../common/quoted';

/** A wide file's columns: where the time stands and which sensor each other column is. */
export interface WideHeader {
  readonly cells: number;
  readonly time: number;
  readonly sensors: readonly { readonly index: number; readonly column: string; readonly sensorId: number }[];
  readonly ignored: string[];
}

/** A long file's three columns. */
export interface LongHeader {
  readonly cells: number;
  readonly time: number;
  readonly sensor: number;
  readonly value: number;
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

/** Finds the columns of a wide file. Columns that no sensor of the tower has are ignored, and said. */
export function wideHeader(
  cells: readonly string[],
  mapping: Mapping,
  sensorIds: ReadonlyMap<string, number>,
): WideHeader {
  const header = checked(cells);
  const time = place(header, mapping.timeColumn);
  const sensors = header.flatMap((column, index) => {
    const sensorId = sensorIds.get(mapping.columns[column] ?? column);
    if (index === time || sensorId === undefined) return [];
    place(header, column);
    return [{ index, column, sensorId }];
  });
  if (sensors.length === 0) {
    const known = [...sensorIds.keys()].slice(0, LISTED).map(quoted).join(', ');
    throw new HeaderError(
      `No column of the header is a sensor of this tower (${known || 'it has none yet'}); ` +
        `use the sensors' names as headers, or map the headers to them.`,
    );
  }
  const used = new Set([time, ...sensors.map((s) => s.index)]);
  return { cells: header.length, time, sensors, ignored: header.filter((_, i) => !used.has(i)) };
}

/** Finds the three columns of a long file. */
export function longHeader(cells: readonly string[], mapping: Mapping): LongHeader {
  const header = checked(cells);
  const [time, sensor, value] = [mapping.timeColumn, mapping.sensorColumn, mapping.valueColumn].map((name) =>
    place(header, name),
  ) as [number, number, number];
  const ignored = header.filter((_, i) => i !== time && i !== sensor && i !== value);
  return { cells: header.length, time, sensor, value, ignored };
}
