import type { Cut } from './find-separator';
import type { SampleRow } from './sample';

/** Where a table's header and its first reading stand. */
export interface FoundHeader {
  /** 0: it has none. */
  readonly headerRow: number;
  readonly firstDataRow: number;
  /** The columns' names; by number where there is no header. */
  readonly names: readonly string[];
  /** Lines between header and readings, such as one of units. */
  readonly between: readonly SampleRow[];
  readonly data: readonly SampleRow[];
}

const NUMBER = /^[+-]?(?:\d+[.,]?\d*|[.,]\d+)(?:e[+-]?\d+)?$/i;
const STAMP_LIKE = /^\d{1,4}[-/.:]\d{1,2}(?:[-/.:T ]|$)/;
const NO_READING = /^(?:|nan|na|n\/a|null|none|nil|missing|-+|\/+|#n\/a)$/i;

/** Whether a cell could be a number, a time or a mark for "no reading". */
export const looksMeasured = (cell: string): boolean =>
  NUMBER.test(cell) || STAMP_LIKE.test(cell) || NO_READING.test(cell);

const HALF = 0.5;

const isReading = ({ cells }: SampleRow): boolean => {
  const said = cells.filter((cell) => !NO_READING.test(cell));
  return said.length > 0 && said.filter(looksMeasured).length > HALF * said.length;
};

/** Finds the first reading, and the header above it; titles above the header and a line of units below are passed over. */
export function findHeader({ rows, cells }: Cut): FoundHeader {
  const full = rows.filter((row) => row.cells.length === cells);
  const first = full.find(isReading);
  const firstDataRow = first?.rowNo ?? (full[0]?.rowNo ?? 0) + 1;
  const above = full.filter(({ rowNo }) => rowNo > 0 && rowNo < firstDataRow);
  const data = full.filter(({ rowNo }) => rowNo === 0 || rowNo >= firstDataRow);
  const [header, ...between] = above;
  const numbered = Array.from({ length: cells }, (_, i) => String(i + 1));
  return {
    headerRow: header?.rowNo ?? 0,
    firstDataRow,
    names: header?.cells ?? numbered,
    between,
    data,
  };
}
