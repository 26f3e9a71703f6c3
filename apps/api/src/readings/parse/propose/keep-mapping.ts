import type { Mapping } from '../mapping';
import { fits } from './fits';
import type { FoundLayout } from './propose-mapping';
import type { FileSample } from './sample';

const timeOf = ({ timeForm, timeColumn, timeColumns }: Mapping): string =>
  JSON.stringify(timeColumns ? [timeForm, timeColumns] : [timeForm, timeColumn]);

/** The ways in which this file's time can be read: as found, and as a person could answer where the file leaves it open. */
const waysOf = ({ mapping, questions }: FoundLayout): Mapping[] => [
  mapping,
  ...questions
    .filter(({ id }) => id === 'day-or-month-first')
    .flatMap(({ choices }) =>
      choices.map(({ value }): Mapping => ({ ...mapping, ...(JSON.parse(value) as Partial<Mapping>) })),
    ),
];

/**
 * The mapping of the tower's last file for this one, where its header fits and nothing in the file speaks against it.
 * Marks found here count as well; where the readings begin is looked at anew; what was said of the hours around a change
 * of the clocks is asked again.
 */
export function keepMapping(
  kept: Mapping,
  found: FoundLayout,
  sample: FileSample,
  sensors: readonly string[],
): Mapping | undefined {
  const { mapping } = found;
  const { repeatedHour: _, missingHour: __, sheet: ___, ...rest } = kept;
  if (!fits(kept, sample, found.columnNames)) return undefined;
  if (!waysOf(found).some((way) => timeOf(way) === timeOf(kept))) return undefined;
  if (mapping.decimal === ',' && kept.decimal !== ',') return undefined;
  return {
    ...rest,
    ...(mapping.headerRow === kept.headerRow ? { firstDataRow: mapping.firstDataRow } : {}),
    columns: Object.fromEntries(
      Object.entries(kept.columns).filter(([, sensor]) => sensors.includes(sensor)),
    ),
    missing: [...new Set([...kept.missing, ...mapping.missing])].slice(0, 20),
  };
}
