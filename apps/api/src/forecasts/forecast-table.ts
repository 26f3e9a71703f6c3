import { parse } from 'csv-parse/sync';
import { invalid } from '../common/validation';
import type { DistrictDto } from '../districts/dto/district.dto';
import type { ForecastSays } from './forecast-rows';

/** A row of a table that can be entered. */
export interface TableRow extends ForecastSays {
  readonly row: number;
  readonly districtId: number;
  readonly forDay: string;
  readonly note: string;
}

/** What reading a table gave. */
export interface ForecastTable {
  readonly rows: TableRow[];
  readonly refused: { readonly row: number; readonly text: string }[];
}

interface NumberColumn {
  readonly key: keyof ForecastSays;
  readonly column: string;
  readonly least: number;
  readonly most: number;
}

const NUMBERS: readonly NumberColumn[] = [
  { key: 'lowC', column: 'low_c', least: -80, most: 60 },
  { key: 'highC', column: 'high_c', least: -80, most: 60 },
  { key: 'cloudPercent', column: 'cloud_percent', least: 0, most: 100 },
  { key: 'windMPerS', column: 'wind_m_per_s', least: 0, most: 75 },
  { key: 'mixingHeightM', column: 'mixing_height_m', least: 0, most: 10_000 },
];
const KNOWN = ['district', 'day', 'note', ...NUMBERS.map(({ column }) => column)];

/** A day that the calendar has, as 2026-01-31. */
export const isDay = (text: string): boolean => {
  const time = Date.parse(`${text}T00:00:00Z`);
  return (
    /^\d{4}-\d{2}-\d{2}$/.test(text) && !Number.isNaN(time) && new Date(time).toISOString().startsWith(text)
  );
};

function recordsOf(text: string): string[][] {
  try {
    return parse(text, {
      bom: true,
      relax_column_count: true,
      skip_empty_lines: false,
      trim: true,
    }) as string[][];
  } catch {
    throw invalid([
      { field: 'text', text: 'The quotation marks of the table do not match. Save it as CSV again.' },
    ]);
  }
}

/**
 * Reads a table of forecasts: comma-separated, a header, one row a district and day. Rows are refused one by one, each
 * with the row, the column and the cure.
 *
 * @throws Problem `invalid` where the header cannot be used.
 */
export function readForecastTable(text: string, districts: readonly DistrictDto[]): ForecastTable {
  const [header = [], ...records] = recordsOf(text);
  const names = header.map((name) => name.toLowerCase());
  const strange = names.filter((name) => !KNOWN.includes(name));
  const missing = ['district', 'day'].filter((name) => !names.includes(name));
  if (missing.length > 0 || strange.length > 0) {
    const what = missing.length > 0 ? `lacks ${missing.join(' and ')}` : `has ${strange.join(', ')}`;
    throw invalid([{ field: 'text', text: `The header ${what}. Use ${KNOWN.join(', ')}.` }]);
  }
  const table: ForecastTable = { rows: [], refused: [] };
  records.forEach((cells, i) => {
    if (cells.every((cell) => cell === '')) return;
    const row = i + 2;
    const read = readRow(names, cells, districts);
    if ('why' in read) table.refused.push({ row, text: `Row ${row}, column "${read.column}": ${read.why}` });
    else table.rows.push({ row, ...read });
  });
  return table;
}

type Read = Omit<TableRow, 'row'> | { readonly column: string; readonly why: string };

function readRow(
  names: readonly string[],
  cells: readonly string[],
  districts: readonly DistrictDto[],
): Read {
  const cell = (name: string): string => cells[names.indexOf(name)] ?? '';
  const asked = cell('district');
  const district = districts.find(
    ({ name, slug }) => slug === asked || name.toLowerCase() === asked.toLowerCase(),
  );
  if (!district) {
    const known = districts.map(({ name }) => name).join(', ');
    return { column: 'district', why: `there is no district "${asked}"; write one of ${known}.` };
  }
  const forDay = cell('day');
  if (!isDay(forDay)) return { column: 'day', why: `"${forDay}" is no day; write it as 2026-01-31.` };
  const says: Record<keyof ForecastSays, number | null> = {
    ...{ lowC: null, highC: null, cloudPercent: null, windMPerS: null, mixingHeightM: null },
  };
  for (const { key, column, least, most } of NUMBERS) {
    const written = cell(column);
    if (written === '') continue;
    const value = /^[+-]?\d+(?:\.\d+)?$/.test(written) ? Number(written) : NaN;
    if (!(value >= least && value <= most)) {
      return {
        column,
        why: `"${written}" is no number from ${least} to ${most}; correct it, or leave it empty.`,
      };
    }
    says[key] = value;
  }
  if (Object.values(says).every((value) => value === null)) {
    return { column: 'low_c', why: 'the row says nothing; give at least one value.' };
  }
  return { districtId: district.id, forDay, note: cell('note').slice(0, 500), ...says };
}
