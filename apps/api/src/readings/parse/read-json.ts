import { HeaderError, type ParsedReadings } from './parsed-readings';
import type { ReadingContext } from './read-csv';
import { isMeasurable, readNumber } from './number-cell';
import { quoted } from '../../common/quoted';
import { refusedRow, type Refusal } from '../refusal';
import { intervalEnd } from '../../towers/time-keeping/interval-end';

/** One entry of `{"readings": […]}` as it came. */
interface Entry {
  readonly time?: unknown;
  readonly sensor?: unknown;
  readonly value?: unknown;
}

const notAReading: Refusal = {
  code: 'not-a-reading',
  why: 'it is no reading; send {"time": "2026-01-31T05:10:00Z", "sensor": "t2", "value": -9.5}.',
};

const valueOf = (value: unknown, given: ReadingContext): number | Refusal | undefined => {
  if (value === null || value === undefined) return undefined;
  if (typeof value === 'number' && isMeasurable(value)) return value;
  if (typeof value !== 'string') {
    return {
      code: 'value-not-a-number',
      why: 'the value is neither null nor a number that can be held; send a number.',
    };
  }
  const none = value.trim() === '' || given.mapping.missing.includes(value.trim());
  return none ? undefined : readNumber(value, given.mapping.decimal);
};

const readEntry = (entry: Entry, at: number, given: ReadingContext, into: ParsedReadings): void => {
  const refuse = (column: string | undefined, refusal: Refusal): void => {
    into.refused.push(refusedRow(at, column, refusal, JSON.stringify(entry) ?? ''));
  };
  const { sensor } = entry;
  const time = typeof entry.time === 'number' ? String(entry.time) : entry.time;
  if (typeof sensor !== 'string' || typeof time !== 'string') return refuse(undefined, notAReading);
  const sensorId = given.sensorIds.get(given.mapping.columns[sensor] ?? sensor);
  if (sensorId === undefined) {
    const why = `this tower has no sensor ${quoted(sensor)}; correct the name, or add the sensor first.`;
    return refuse('sensor', { code: 'sensor-not-known', why });
  }
  const tEnd = intervalEnd(time, given.time, given.nowS);
  if (typeof tEnd !== 'number') return refuse('time', tEnd);
  const value = valueOf(entry.value, given);
  if (value === undefined) return;
  if (typeof value !== 'number') return refuse('value', value);
  into.rows.push({ sensorId, tEnd, value, rowNo: at });
};

const parsed = (text: string): unknown => {
  try {
    return JSON.parse(text);
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    return error;
  }
};

/** Entries read at a time, so that a long list does not hold up other requests. */
const ENTRIES_AT_A_TIME = 2_000;

const pause = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

/** Reads entries one by one; `entryOf` gives each, undefined for an empty line, a `SyntaxError` for one that is no JSON. */
async function readList<T>(
  list: readonly T[],
  entryOf: (given: T) => unknown,
  given: ReadingContext,
): Promise<ParsedReadings> {
  const result: ParsedReadings = { rows: [], refused: [], ignoredColumns: [] };
  for (const [i, each] of list.entries()) {
    if (i > 0 && i % ENTRIES_AT_A_TIME === 0) await pause();
    const entry = entryOf(each);
    if (entry !== null && typeof entry === 'object' && !(entry instanceof SyntaxError)) {
      readEntry(entry as Entry, i + 1, given, result);
    } else if (entry !== undefined) {
      const raw = entry instanceof SyntaxError ? entry.message : JSON.stringify(entry);
      result.refused.push(refusedRow(i + 1, undefined, notAReading, raw));
    }
  }
  return result;
}

/**
 * Reads `{"readings": [{time, sensor, value}, …]}`. Entries are refused one by one, the rest is taken; text that is no
 * such object throws a `HeaderError`.
 */
export async function readJson(text: string, given: ReadingContext): Promise<ParsedReadings> {
  const body = parsed(text);
  if (body instanceof SyntaxError) {
    throw new HeaderError(`The text is no JSON (${body.message.slice(0, 120)}); send {"readings": […]}.`);
  }
  const list = (body as { readings?: unknown } | null)?.readings;
  if (!Array.isArray(list)) throw new HeaderError('The JSON has no list "readings"; send {"readings": […]}.');
  return readList(list, (entry: unknown) => entry, given);
}

/** Reads a reading per line, each a JSON object {time, sensor, value}. Lines are refused one by one. */
export async function readNdjson(text: string, given: ReadingContext): Promise<ParsedReadings> {
  return readList(text.split(/\r\n|\n/), (line) => (line.trim() === '' ? undefined : parsed(line)), given);
}
