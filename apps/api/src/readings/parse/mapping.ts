import type { StampMeaning } from '../../towers/time-keeping/interval-end';
import type { MissingHour, RepeatedHour } from '../../towers/time-keeping/logger-clock';
import type { StampForm } from '../../towers/time-keeping/stamp';
import type { TimePart } from '../../towers/time-keeping/time-parts';
import type { ForeignUnit } from '../../towers/units';

/** A column that holds a part of the time. */
export interface TimeColumn {
  readonly column: string;
  readonly part: TimePart;
}

/** Rows that are no readings, such as a day's summary: those with one of these texts in a column. */
export interface RowsLeftOut {
  readonly column: string;
  readonly values: readonly string[];
}

/**
 * How a source's files are laid out. *wide*: a time column and a column per sensor. *long*: a time column, a sensor
 * column and a value column, one reading a row.
 */
export interface Mapping {
  readonly format: 'wide' | 'long';
  readonly separator: string;
  readonly decimal: '.' | ',';
  /** Row of the header, the first line being 1; 0: none, the columns are "1", "2", …. Left out: the first line that is not empty. */
  readonly headerRow?: number;
  /** Row of the first reading, where lines stand between the header and it. */
  readonly firstDataRow?: number;
  readonly timeColumn: string;
  /** Where the time stands in several columns; wins over `timeColumn`. */
  readonly timeColumns?: readonly TimeColumn[];
  readonly timeForm: StampForm;
  /** Texts that stand for "no reading". The empty cell always does. */
  readonly missing: readonly string[];
  /** Header → sensor name, where they differ. */
  readonly columns: Readonly<Record<string, string>>;
  /** Takes only what `columns` names; otherwise what is called as a sensor is taken, too. */
  readonly onlyNamed?: boolean;
  /** Rows that are passed over. */
  readonly leaveOut?: readonly RowsLeftOut[];
  /** Header (wide) or sensor as written (long) → its unit, where it is not the sensor's own. */
  readonly units?: Readonly<Record<string, ForeignUnit>>;
  /** long only */
  readonly sensorColumn: string;
  /** long only */
  readonly valueColumn: string;
  /** Where the source's clock differs from the tower's. */
  readonly clock?: string;
  /** Where the source's stamps mean something else than the tower's. */
  readonly stamp?: StampMeaning;
  /** What is meant by a civil time that happens twice; left out: it is refused. */
  readonly repeatedHour?: RepeatedHour;
  /** What is meant by a civil time that does not exist; left out: it is refused. */
  readonly missingHour?: MissingHour;
  /** Workbooks: the sheet with the readings; left out: the first that is not hidden. */
  readonly sheet?: string;
}

/** The layout of a source that declares nothing: wide, commas, a `time` column, empty or NaN for no reading. */
export const DEFAULT_MAPPING: Mapping = {
  format: 'wide',
  separator: ',',
  decimal: '.',
  timeColumn: 'time',
  timeForm: 'iso',
  missing: ['NaN'],
  columns: {},
  sensorColumn: 'sensor',
  valueColumn: 'value',
};

/** The sensor that a column (wide) or a written name (long) is set to; undefined: none. */
export const sensorNameOf = ({ columns, onlyNamed }: Mapping, written: string): string | undefined =>
  Object.hasOwn(columns, written) ? columns[written] : onlyNamed ? undefined : written;

/** A stored mapping with what it leaves out filled in. */
export function readMapping(stored: string | undefined): Mapping {
  return { ...DEFAULT_MAPPING, ...(stored ? (JSON.parse(stored) as Partial<Mapping>) : {}) };
}
