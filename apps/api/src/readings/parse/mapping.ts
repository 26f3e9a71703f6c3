import type { StampForm } from '../../towers/time-keeping/stamp';
import type { StampMeaning } from '../../towers/time-keeping/interval-end';

/**
 * How a source's files are laid out. *wide*: a time column and a column per sensor. *long*: a time column, a sensor
 * column and a value column, one reading a row.
 */
export interface Mapping {
  readonly format: 'wide' | 'long';
  readonly separator: string;
  readonly decimal: '.' | ',';
  readonly timeColumn: string;
  readonly timeForm: StampForm;
  /** Texts that stand for "no reading". The empty cell always does. */
  readonly missing: readonly string[];
  /** Header → sensor name, where they differ. */
  readonly columns: Readonly<Record<string, string>>;
  /** long only */
  readonly sensorColumn: string;
  /** long only */
  readonly valueColumn: string;
  /** Where the source's clock differs from the tower's. */
  readonly clock?: string;
  /** Where the source's stamps mean something else than the tower's. */
  readonly stamp?: StampMeaning;
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

/** A stored mapping with what it leaves out filled in. */
export function readMapping(stored: string | undefined): Mapping {
  return { ...DEFAULT_MAPPING, ...(stored ? (JSON.parse(stored) as Partial<Mapping>) : {}) };
}
