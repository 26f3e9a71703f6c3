import type { Import, Mapping } from './types';

/** What cuts a line into cells, as people name it. */
export const SEPARATORS: readonly { value: string; label: string }[] = [
  { value: ',', label: 'Comma' },
  { value: ';', label: 'Semicolon' },
  { value: '\t', label: 'Tab' },
  { value: 'blank', label: 'Blanks' },
  { value: '|', label: 'Vertical bar' },
];

/** How a time may be written. */
export const TIME_FORMS: readonly { value: NonNullable<Mapping['timeForm']>; label: string }[] = [
  { value: 'iso', label: 'Year first: 2026-01-31 05:10' },
  { value: 'day/month/year', label: 'Day first: 31/01/2026 05:10' },
  { value: 'month/day/year', label: 'Month first: 01/31/2026 05:10' },
  { value: 'epoch-seconds', label: 'Seconds since 1970' },
  { value: 'epoch-milliseconds', label: 'Milliseconds since 1970' },
];

/** What a column may say of the time. */
export const TIME_PARTS: readonly string[] = [
  ...['date', 'time', 'year', 'two-digit year', 'month', 'day', 'day of year', 'hour', 'minute', 'hhmm'],
];

export const STAMPS: readonly { value: NonNullable<Mapping['stamp']>; label: string }[] = [
  { value: 'end', label: 'the end of the interval' },
  { value: 'start', label: 'its start' },
  { value: 'middle', label: 'its middle' },
  { value: 'instant', label: 'an instant' },
];

/** Units a column may come in besides its sensor's own, by quantity. */
export const UNITS: Readonly<Record<string, readonly string[]>> = {
  'air temperature': ['°F', 'K'],
  'dew point': ['°F', 'K'],
  'wet bulb': ['°F', 'K'],
  'relative humidity': ['0–1'],
  'wind speed': ['mph', 'km/h', 'kn'],
  'station pressure': ['Pa', 'kPa', 'mmHg', 'inHg'],
  'pm2.5': ['mg/m³'],
};

/** Where readings came from, in words. */
export const ORIGIN_WORDS: Record<Import['origin'], string> = {
  upload: 'file',
  folder: 'folder',
  http: 'address',
  push: 'pushed',
  demo: 'demo',
};

/** How an import stands, in words. */
export const STATE_WORDS: Record<Import['state'], string> = {
  running: 'being imported',
  done: 'imported',
  cancelled: 'cancelled: what came before is kept',
  failed: 'broke off: what came before is kept',
  withdrawing: 'being undone',
  withdrawn: 'undone',
};

/** How the time stands in a file: "column Date" or "columns 1 (day), 2 (month)". */
export const timeInWords = ({ timeColumn, timeColumns }: Mapping): string =>
  timeColumns && timeColumns.length > 0
    ? `columns ${timeColumns.map(({ column, part }) => `${column} (${part})`).join(', ')}`
    : `column ${timeColumn ?? 'time'}`;

/** How a file is written, apart from its time column: "Cells are cut by semicolons, decimals by commas. …" */
export function layoutInWords(mapping: Mapping): string {
  const cut = SEPARATORS.find(({ value }) => value === (mapping.separator ?? ','));
  const form = TIME_FORMS.find(({ value }) => value === (mapping.timeForm ?? 'iso'));
  const marks = mapping.missing ?? [];
  return [
    `${mapping.sheet === undefined ? `Cells are cut by: ${cut?.label.toLowerCase() ?? mapping.separator}` : `Sheet ${mapping.sheet}`}; decimal mark: ${mapping.decimal === ',' ? 'comma' : 'point'}.`,
    mapping.timeColumns
      ? ''
      : `Times are written ${form?.label.replace(/^./, (letter) => letter.toLowerCase())}.`,
    mapping.clock === undefined ? '' : `The logger’s clock: ${mapping.clock}.`,
    marks.length === 0 ? '' : `No reading: ${marks.join(', ')}.`,
  ]
    .filter((sentence) => sentence !== '')
    .join(' ');
}
