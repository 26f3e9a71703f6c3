import type { ParsedReading } from '../parse/parsed-readings';
import type { InForce } from '../readings-store';
import type { Counts } from './origin';

/** Rows by what they do to the values in force. */
export interface SortedRows {
  readonly write: ParsedReading[];
  /** Those without an import are of this one. */
  readonly past: (ParsedReading | InForce)[];
  readonly counts: Counts;
}

const keyOf = (row: { sensorId: number; tEnd: number }): string => `${row.sensorId} ${row.tEnd}`;

/**
 * The store reads decimal text, which can be off by the last bit of a double: values that close are the same, or a
 * file sent twice would correct itself.
 */
const isSame = (a: number, b: number): boolean => Math.abs(a - b) <= 4 * Number.EPSILON * Math.abs(a);

/** Sorts rows into new, repeated and corrected; of several rows for one instant the last is in force. */
export function sortRows(rows: readonly ParsedReading[], known: readonly InForce[]): SortedRows {
  const inForce = new Map<string, ParsedReading | InForce>(known.map((row) => [keyOf(row), row]));
  const write = new Map<string, ParsedReading>();
  const past: (ParsedReading | InForce)[] = [];
  let [fresh, repeated] = [0, 0];
  for (const row of rows) {
    const key = keyOf(row);
    const was = inForce.get(key);
    if (was && isSame(was.value, row.value)) {
      repeated += 1;
      continue;
    }
    if (was) past.push(was);
    else fresh += 1;
    inForce.set(key, row);
    write.set(key, row);
  }
  const counts = { new: fresh, repeated, corrected: past.length, refused: 0 };
  return { write: [...write.values()], past, counts };
}
