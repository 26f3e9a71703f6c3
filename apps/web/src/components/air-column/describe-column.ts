import { decimal } from '../../lib/format/number';
import { knownLevels, type ColumnLevel, type ColumnLid } from './column-data';

const LID: Record<ColumnLid['open'], (topM: number) => string> = {
  no: (topM) => `Colder air lies below ${topM} m, the lid.`,
  'at the top': (topM) =>
    `It grows warmer up to the highest sensor at ${topM} m: open at the top, the lid is above.`,
  'cut by a missing level': (topM) => `It grows warmer up to ${topM} m; above that a level is missing.`,
};

/** A column in words, for those who do not see it: each level, and the lid. */
export function describeColumn(levels: readonly ColumnLevel[], lid: ColumnLid | null): string {
  const known = knownLevels(levels);
  if (known.length === 0) return 'Air column: not known.';
  const temperatures = known.map(
    ({ heightM, temperatureC }) => `${decimal(temperatureC)} °C at ${heightM} m`,
  );
  const missing = levels
    .filter(({ temperatureC }) => temperatureC === null)
    .map(({ heightM }) => `${heightM} m`);
  return [
    `Air column: ${temperatures.join(', ')}.`,
    missing.length > 0 ? `Not known at ${missing.join(', ')}.` : '',
    lid ? LID[lid.open](lid.topM) : 'No surface inversion.',
  ]
    .filter((sentence) => sentence !== '')
    .join(' ');
}
