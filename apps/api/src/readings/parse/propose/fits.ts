import type { Mapping } from '../mapping';
import { rowsBy, type FileSample } from './sample';

/**
 * Whether a mapping of a former file fits another: cut as it says, the header stands where it says and has every column
 * it names.
 */
export function fits(mapping: Mapping, sample: FileSample, found: readonly string[]): boolean {
  const rows = rowsBy(sample, mapping.separator);
  const headerRow = mapping.headerRow ?? 1;
  const header = headerRow === 0 ? found : rows.find(({ rowNo }) => rowNo >= headerRow)?.cells;
  if (!header || (headerRow === 0 && rows[0]?.cells.length !== found.length)) return false;
  const time = mapping.timeColumns?.map(({ column }) => column) ?? [mapping.timeColumn];
  const named =
    mapping.format === 'long' ? [mapping.sensorColumn, mapping.valueColumn] : Object.keys(mapping.columns);
  return [...time, ...named].every((column) => header.includes(column));
}
