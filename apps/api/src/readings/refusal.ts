/** Why a row, or one cell of it, was not taken in. The code is stable; the text is for people. */
export const refusalCodes = [
  'time-not-readable',
  'time-not-plausible',
  'time-ahead',
  'time-happens-twice',
  'time-does-not-exist',
  'value-not-a-number',
  'cells-do-not-match-header',
  'quotes-do-not-match',
  'line-too-long',
  'line-not-text',
  'further-rows-not-kept',
  'sensor-not-known',
  'not-a-reading',
] as const;

/** One of the stable reasons for refusing a row. */
export type RefusalCode = (typeof refusalCodes)[number];

/** A row that was refused: which one, which column, why, what would cure it, and the line as it came. */
export interface RefusedRow {
  /** Row of the file, the header being row 1; in JSON the place in the list, from 1. */
  readonly rowNo: number;
  readonly column?: string;
  readonly code: RefusalCode;
  /** A sentence that names row, column and cure. */
  readonly text: string;
  readonly raw: string;
}

/** A reason found while reading one cell, before the row and column are known. */
export interface Refusal {
  readonly code: RefusalCode;
  /** What is wrong, then the cure; without row and column. */
  readonly why: string;
}

/** Raw lines are kept up to this length, so that one bad file cannot fill the store. */
const KEPT_RAW_CHARACTERS = 500;

/** The refusal of one cell as a refused row, its sentence beginning with the row and the column. */
export function refusedRow(
  rowNo: number,
  column: string | undefined,
  refusal: Refusal,
  raw: string,
): RefusedRow {
  const place = column === undefined ? `Row ${rowNo}` : `Row ${rowNo}, column "${column}"`;
  return {
    rowNo,
    column,
    code: refusal.code,
    text: `${place}: ${refusal.why}`,
    raw: raw.length > KEPT_RAW_CHARACTERS ? `${raw.slice(0, KEPT_RAW_CHARACTERS)}…` : raw,
  };
}
