import type { RefusedRow } from '../refusal';

/** A reading ready to be taken in: sensor known, value finite, instant the END of its interval. */
export interface ParsedReading {
  readonly sensorId: number;
  /** UTC epoch seconds, end of the interval. */
  readonly tEnd: number;
  readonly value: number;
  readonly rowNo: number;
}

/** What reading a text gave: the readings, the rows refused, and the columns that no sensor has. */
export interface ParsedReadings {
  readonly rows: ParsedReading[];
  readonly refused: RefusedRow[];
  readonly ignoredColumns: string[];
}

/** A file whose header cannot be used; the message names the cure. Nothing of it is taken in. */
export class HeaderError extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'HeaderError';
  }
}
