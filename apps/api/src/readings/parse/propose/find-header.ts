import type { Cut } from './find-separator';
import type { SampleRow } from './sample';

/** Where a table's header and its first reading stand. */
export interface FoundHeader {
  /** 0: it has none. */
  readonly headerRow: number;
  readonly firstDataRow: number;
  /** The columns' names; by number where there is no header. */
  readonly names: readonly string[];
  /** What the header calls the columns, where its names could not be used, too. */
  readonly titles: readonly string[];
  /** Lines between header and readings, such as one of units. */
  readonly between: readonly SampleRow[];
  readonly data: readonly SampleRow[];
}

const NUMBER = /^[+-]?(?:\d+[.,]?\d*|[.,]\d+)(?:e[+-]?\d+)?$/i;
const STAMP_LIKE = /^\d{1,4}[-/.:]\d{1,2}(?:[-/.:T ]|$)/;
const STAMP =
  /^(?:\d{1,4}[-/.](?:\d{1,2}|[a-z]{3})[-/.]\d{1,4}\b|[a-z]{3} \d|\d{1,2}:\d{2}|\d{8}(?:[T ]?\d{2,6})?$)/i;
const TIME_WORDS = /time|date|stamp|year|utc|gmt|zeit|datum|fecha|hora|heure/i;
const NO_READING = /^(?:|nan|na|n\/a|null|none|nil|missing|-+|\/+|#n\/a)$/i;

/** Whether a cell could be a number, a time or a mark for "no reading". */
export const looksMeasured = (cell: string): boolean =>
  NUMBER.test(cell) || STAMP_LIKE.test(cell) || NO_READING.test(cell);

const HALF = 0.5;

const isReading = ({ cells }: SampleRow): boolean => {
  const said = cells.filter((cell) => !NO_READING.test(cell));
  return said.length > 0 && said.filter(looksMeasured).length > HALF * said.length;
};

const MOSTLY = 0.9;
const LOOKED_AT = 600;
const LONGEST_NAME = 200;

/** Columns whose cells are nearly always dates or times: in a header they are not. */
const stampPlaces = (rows: readonly SampleRow[], cells: number): number[] =>
  Array.from({ length: cells }, (_, place) => place).filter(
    (place) => rows.filter((row) => STAMP.test(row.cells[place]!)).length >= MOSTLY * rows.length,
  );

/** How much a line above the readings looks like a header: many words, all different. */
const headerness = ({ cells }: SampleRow): number =>
  new Set(cells.filter((cell) => cell !== '')).size + (cells.some((cell) => TIME_WORDS.test(cell)) ? 1 : 0);

const best = (rows: readonly SampleRow[]): SampleRow | undefined =>
  rows.reduce<SampleRow | undefined>(
    (found, row) => (found && headerness(found) >= headerness(row) ? found : row),
    undefined,
  );

/** Whether columns can be told apart by these names. */
const areNames = ([first, ...rest]: readonly string[]): boolean => {
  const said = rest.filter((name) => name !== '');
  return (
    first !== '' &&
    new Set([first, ...said]).size === said.length + 1 &&
    said.every((name) => name.length <= LONGEST_NAME)
  );
};

/**
 * Finds the first reading, and the header above it; titles above the header and a line of units below are passed over.
 * A header that gives two columns the same name is passed over, too: columns then go by number.
 */
export function findHeader({ rows, cells }: Cut): FoundHeader {
  const full = rows.filter((row) => row.cells.length === cells);
  const places = stampPlaces(full.slice(0, LOOKED_AT), cells);
  const hasStamp = (row: SampleRow): boolean =>
    places.length === 0 || places.some((place) => STAMP.test(row.cells[place]!));
  const first = full.find((row) => isReading(row) && hasStamp(row));
  const firstDataRow = first?.rowNo ?? (full[0]?.rowNo ?? 0) + 1;
  const above = full.filter(({ rowNo }) => rowNo > 0 && rowNo < firstDataRow);
  const data = full.filter(({ rowNo }) => rowNo === 0 || rowNo >= firstDataRow);
  const header = best(above);
  const numbered = Array.from({ length: cells }, (_, i) => String(i + 1));
  const usable = header !== undefined && areNames(header.cells);
  return {
    headerRow: usable ? header.rowNo : 0,
    firstDataRow,
    names: usable ? header.cells : numbered,
    titles: header?.cells ?? numbered,
    between: above.filter(({ rowNo }) => header !== undefined && rowNo > header.rowNo),
    data,
  };
}
