import { ApiProblem } from '../../../lib/api/problem';
import type { Source } from '../types';

type Mapping = Source['mapping'];

/** What the form of a source holds: every entry as it is typed. */
export interface SourceEntries {
  kind: Source['kind'];
  path: string;
  url: string;
  auth: Source['auth'];
  username: string;
  password: string;
  token: string;
  intervalSeconds: number;
  format: Mapping['format'];
  separator: string;
  decimal: Mapping['decimal'];
  headerRow: number | undefined;
  firstDataRow: number | undefined;
  timeColumn: string;
  timeForm: Mapping['timeForm'];
  sensorColumn: string;
  valueColumn: string;
  missing: string;
  columns: string;
  units: string;
  clock: string;
  stamp: Mapping['stamp'] | '';
  repeatedHour: Mapping['repeatedHour'];
  missingHour: Mapping['missingHour'];
}

type PlaceEntries = 'kind' | 'path' | 'url' | 'auth' | 'username' | 'password' | 'token' | 'intervalSeconds';

const linesOf = (pairs: Record<string, string> | undefined): string =>
  Object.entries(pairs ?? {})
    .map(([from, to]) => `${from} = ${to}`)
    .join('\n');

/**
 * "header = sensor" lines as pairs; the last "=" divides, for headers may hold one.
 *
 * @throws ApiProblem naming the field, for a line that is no pair
 */
export function pairsOf(field: string, lines: string): Record<string, string> {
  const pairs: Record<string, string> = {};
  for (const line of lines.split('\n').filter((each) => each.trim() !== '')) {
    const at = line.lastIndexOf('=');
    const [from, to] = [line.slice(0, Math.max(0, at)).trim(), line.slice(at + 1).trim()];
    if (from === '' || to === '')
      throw new ApiProblem(422, {
        errors: [{ field, text: `“${line.trim()}” is no pair: write column = name.` }],
      });
    pairs[from] = to;
  }
  return pairs;
}

/** Separators with a name of their own. */
const NAMED: Record<string, string> = { '\t': 'tab' };
const separatorOf = (typed: string): string =>
  Object.entries(NAMED).find(([, name]) => name === typed.trim().toLowerCase())?.[0] ?? typed;

/** What the form shows of a layout; the usual values where it says nothing. */
export function layoutEntriesOf(mapping: Partial<Mapping>): Omit<SourceEntries, PlaceEntries> {
  return {
    format: mapping.format ?? 'wide',
    separator: NAMED[mapping.separator ?? ''] ?? mapping.separator ?? ',',
    decimal: mapping.decimal ?? '.',
    headerRow: mapping.headerRow,
    firstDataRow: mapping.firstDataRow,
    timeColumn: mapping.timeColumn ?? 'time',
    timeForm: mapping.timeForm ?? 'iso',
    sensorColumn: mapping.sensorColumn ?? 'sensor',
    valueColumn: mapping.valueColumn ?? 'value',
    missing: (mapping.missing ?? ['NaN']).join(' '),
    columns: linesOf(mapping.columns),
    units: linesOf(mapping.units),
    clock: mapping.clock ?? '',
    stamp: mapping.stamp ?? '',
    repeatedHour: mapping.repeatedHour ?? 'refuse',
    missingHour: mapping.missingHour ?? 'refuse',
  };
}

/** The entries to begin with: a known source's, or the usual ones. */
export function entriesOf(source?: Source): SourceEntries {
  return {
    kind: source?.kind ?? 'folder',
    path: source?.path ?? '',
    url: source?.url ?? '',
    auth: source?.auth ?? 'none',
    ...{ username: '', password: '', token: '' },
    intervalSeconds: source?.intervalSeconds ?? 60,
    ...layoutEntriesOf(source?.mapping ?? {}),
  };
}

/**
 * What is sent of the entries.
 *
 * @param layout the layout the entries came from: what the form does not show of it stays as it is
 */
export function toSource(typed: SourceEntries, before?: Source, layout = before?.mapping): object {
  const { kind, path, url, auth, username, password, token, intervalSeconds } = typed;
  const place = kind === 'folder' ? { path } : kind === 'http' ? { url, auth } : {};
  const secret = {
    ...(auth === 'basic' && username !== '' && { username }),
    ...(auth === 'basic' && password !== '' && { password }),
    ...(auth === 'bearer' && token !== '' && { token }),
  };
  return {
    ...place,
    ...(kind === 'http' && secret),
    ...(kind !== 'push' && { intervalSeconds: Number(intervalSeconds) }),
    mapping: { ...layout, ...layoutOf(typed) },
    ...(before ? { version: before.version } : { kind }),
  };
}

function layoutOf(typed: SourceEntries): object {
  const { format, decimal, timeColumn, timeForm, headerRow, firstDataRow } = typed;
  const { sensorColumn, valueColumn, repeatedHour, missingHour } = typed;
  const isLong = format === 'long';
  return {
    ...{ format, decimal, timeColumn, timeForm, headerRow, firstDataRow, repeatedHour, missingHour },
    ...(isLong && { sensorColumn, valueColumn }),
    separator: separatorOf(typed.separator),
    missing: typed.missing.split(/\s+/).filter(Boolean),
    columns: pairsOf('columns', typed.columns),
    units: pairsOf('units', typed.units),
    clock: typed.clock.trim() || undefined,
    stamp: typed.stamp || undefined,
  };
}
