/** What an entry of the record keeps of a change: fields with what they were and became, and some words. */
export interface ChangeBody {
  readonly changes?: Readonly<Record<string, readonly [unknown, unknown]>>;
  readonly [key: string]: unknown;
}

/** Fields as people name them, with their units. */
const NAMES: Readonly<Record<string, readonly [name: string, unit?: string]>> = {
  ...{
    name: ['name'],
    elevationM: ['elevation', 'm'],
    latitude: ['latitude', '°'],
    longitude: ['longitude', '°'],
  },
  ...{
    intervalMinutes: ['interval', 'min'],
    blockMinutes: ['blocks', 'min'],
    staleLimitMinutes: ['silent after', 'min'],
  },
  ...{
    clock: ['clock'],
    stamp: ['a stamp means'],
    screening: ['screening'],
    inversionForm: ['inversions are found'],
  },
  ...{
    embedDepthM: ['embed depth', 'm'],
    retired: ['retired'],
    slug: ['address part'],
    heightM: ['height', 'm'],
  },
  ...{
    offset: ['offset'],
    gain: ['gain'],
    sigma: ['standard deviation'],
    pairSigma: ['deviation of the pair'],
  },
};
/** Of bodies without fields, what is worth telling, in this order. */
const TOLD = ['sensor', 'name', 'quantity', 'kind', 'path', 'url', 'quality', 'reason', 'what', 'note'];

const shown = (value: unknown, unit = ''): string => {
  if (value === null || value === undefined || value === '') return 'none';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  const text =
    typeof value === 'number' ? String(Number(value.toPrecision(6))).replace('-', '−') : String(value);
  return unit === '°' ? `${text}°` : unit ? `${text} ${unit}` : text;
};

/** An instant of the record, to the minute. */
const instant = (iso: string): string => `${new Date(iso).toISOString().slice(0, 16).replace('T', ' ')} UTC`;

const field = ([key, [from, to]]: readonly [string, readonly [unknown, unknown]]): string => {
  const [name, unit] = NAMES[key] ?? [key];
  return `${name} ${shown(from, unit)} → ${shown(to, unit)}`;
};

/** A change in words: "T 30 m from 2026-11-24 17:00 UTC: height 30 m → 31 m (moved)". */
export function describeChange(body: ChangeBody): string {
  if (body.changes) {
    const of = [body['sensor'], body['from'] === undefined ? '' : `from ${instant(String(body['from']))}`]
      .filter(Boolean)
      .join(' ');
    const note = body['note'] ? ` (${String(body['note'])})` : '';
    return `${of ? `${of}: ` : ''}${Object.entries(body.changes).map(field).join(', ')}${note}`;
  }
  return TOLD.map((key) => body[key])
    .filter((value): value is string | number => typeof value === 'string' || typeof value === 'number')
    .map((value) => shown(value))
    .join(', ');
}

/** The fields of a patch that differ from what was, with what they were and become. */
export function changedFields(
  before: object,
  patch: object,
  fields: readonly string[],
): ChangeBody['changes'] {
  const was = before as Record<string, unknown>;
  const becomes = patch as Record<string, unknown>;
  return Object.fromEntries(
    fields
      .filter((key) => becomes[key] !== undefined && becomes[key] !== was[key])
      .map((key) => [key, [was[key] ?? null, becomes[key]] as const]),
  );
}

/** The fields of a tower that are told. */
export const TOWER_FIELDS = Object.keys(NAMES);
