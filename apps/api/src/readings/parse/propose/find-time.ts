import { joinTime } from '../join-time';
import type { TimeColumn } from '../mapping';
import { readStamp, stampForms, type StampForm } from '../../../towers/time-keeping/stamp';
import type { TimePart } from '../../../towers/time-keeping/time-parts';
import type { FoundHeader } from './find-header';
import { mostFrequent, type SampleRow } from './sample';

/** Where and how a table says the time. */
export interface FoundTime {
  readonly timeColumn?: string;
  readonly timeColumns?: readonly TimeColumn[];
  readonly timeForm: StampForm;
  /** Places of the columns used. */
  readonly used: readonly number[];
  /** The usual step between rows, s; undefined where there is none. */
  readonly stepS?: number;
  /** Whether stamps carry their offset from UTC. */
  readonly hasOffset: boolean;
  /** What the column's name says that stamps mark. */
  readonly stamp?: 'start' | 'end';
  /** The other reading of day and month that is possible, too. */
  readonly other?: FoundTime;
}

interface Candidate {
  readonly timeColumns?: readonly TimeColumn[];
  readonly form: StampForm;
  readonly used: readonly number[];
}

interface Weighed extends Candidate {
  /** Share of rows whose time can be read. */
  readonly readable: number;
  /** Share of steps between rows that are the usual one. */
  readonly regular: number;
  readonly stepS?: number;
  /** The longest step either way, s. */
  readonly longestS: number;
  readonly hasOffset: boolean;
}

const DAY_S = 86_400;
/** A month at least: what a step over midnight becomes when day and month are exchanged. */
const MONTH_S = 27 * DAY_S;
const LOOKED_AT = 600;
const READABLE = 0.9;
const HALF = 0.5;
/** So few rows need not show that the time moves on. */
const FEW = 3;
/** Rows that a candidate is tried on before all are. */
const TRIED = 30;
const DATE =
  /^(?:\d{4}[-/.]\d{1,2}[-/.]\d{1,2}|\d{8}|(?:\d{1,2}|[a-z]{3})[-/.](?:\d{1,2}|[a-z]{3})[-/.](?:\d{4}|\d{2}))(?:[T ]0?0:00(?::00)?)?$/i;
const CLOCK = /^\d{1,2}:\d{2}(?::\d{2}(?:\.\d+)?)?(?:\s*[AP]M)?$/i;
/** Year last in two digits: it could also be the day, the year first. */
const SHORT_YEAR = /^(\d{2})([-/.])(\d{2})\2(\d{2})(?=\D)/;

const whole = (least: number, most: number) => (cell: string) =>
  /^\d{1,4}$/.test(cell) && Number(cell) >= least && Number(cell) <= most;
/** What cells of each part look like. An hour alone would also be a hhmm: 5 is 05:00, not 00:05. */
const LOOKS: Partial<Record<TimePart, (cell: string) => boolean>> = {
  year: whole(1950, 2100),
  'two-digit year': whole(0, 99),
  month: whole(1, 12),
  day: whole(1, 31),
  'day of year': whole(1, 366),
  hour: (cell) => whole(0, 24)(cell) && cell.length <= 2,
  minute: whole(0, 59),
  hhmm: (cell) => whole(0, 2400)(cell) && Number(cell) % 100 < 60,
  time: (cell) => CLOCK.test(cell),
  date: (cell) => DATE.test(cell),
};

/** Parts of a time in columns that follow each other, common in loggers' tables; undefined: a column passed over. */
const SEQUENCES: readonly (readonly (TimePart | undefined)[])[] = [
  ['year', 'month', 'day', 'hour', 'minute'],
  ['year', 'month', 'day', 'hour'],
  ['year', 'month', 'day', 'hhmm'],
  ['year', undefined, 'month', 'day', 'hour', 'minute'],
  ['year', 'day of year', 'hour', 'minute'],
  ['year', 'day of year', 'hour'],
  ['year', 'day of year', 'hhmm'],
  ['day', 'month', 'year', 'hour', 'minute'],
  ['day', 'month', 'year', 'hour'],
  ['day', 'month', 'year', 'hhmm'],
  ['month', 'day', 'year', 'hour', 'minute'],
  ['month', 'day', 'year', 'hour'],
  ['month', 'day', 'year', 'hhmm'],
  ['day', 'month', 'two-digit year', 'hhmm'],
  ['month', 'day', 'two-digit year', 'hhmm'],
  ['two-digit year', 'month', 'day', 'hhmm'],
  ...(['time', 'hour', 'hhmm'] as const).flatMap((clock) => [
    ['date', clock] as const,
    [clock, 'date'] as const,
  ]),
];
const TIME_WORDS = /time|date|stamp|utc|gmt|zeit|datum|fecha|hora|heure/i;

/** The text of a row's time. */
export const textOf = ({ cells }: SampleRow, { used, timeColumns }: Candidate): string =>
  timeColumns
    ? joinTime(
        used.map((place) => cells[place]!),
        timeColumns,
      )
    : cells[used[0]!]!;

const weigh = (candidate: Candidate, rows: readonly SampleRow[]): Weighed => {
  const stamps = rows.map((row) => readStamp(textOf(row, candidate), candidate.form));
  const read = stamps.flatMap((stamp) => ('code' in stamp ? [] : [stamp]));
  const steps = read.slice(1).map((stamp, i) => stamp.shownS - read[i]!.shownS);
  const forward = steps.filter((step) => step > 0);
  const usual = mostFrequent(forward);
  return {
    ...candidate,
    readable: read.length / Math.max(rows.length, 1),
    regular: usual
      ? (usual.share * forward.length) / Math.max(steps.filter((step) => step !== 0).length, 1)
      : 0,
    stepS: usual?.value,
    longestS: steps.reduce((longest, step) => Math.max(longest, Math.abs(step)), 0),
    hasOffset: read.some(({ offsetS }) => offsetS !== undefined && candidate.form === 'iso'),
  };
};

/** Whether cells look like a part of a time; an hour that stands still is none, nor a hhmm that is but an hour. */
function looksLike(part: TimePart, cells: readonly string[]): boolean {
  if (cells.filter(LOOKS[part]!).length < READABLE * cells.length) return false;
  if (part !== 'hhmm' && part !== 'hour') return true;
  const moves = cells.length < FEW || new Set(cells).size > 1;
  return moves && (part === 'hour' || cells.some((cell) => cell.length > 2 || Number(cell) > 24));
}

const formsOf = (parts: readonly (TimePart | undefined)[]): readonly StampForm[] =>
  parts.includes('date') ? stampForms.filter((form) => !form.startsWith('epoch')) : ['iso'];

function* candidates({ names, data }: FoundHeader): Generator<Candidate> {
  const rows = data.slice(0, LOOKED_AT);
  const cellsAt = names.map((_, place) => rows.map(({ cells }) => cells[place]!));
  for (let place = 0; place < names.length; place += 1) {
    for (const form of stampForms) yield { form, used: [place] };
  }
  for (let begin = 0; begin < names.length; begin += 1) {
    for (const parts of SEQUENCES) {
      if (begin + parts.length > names.length) continue;
      const found = parts.flatMap((part, i) => (part === undefined ? [] : [{ part, place: begin + i }]));
      if (!found.every(({ part, place }) => looksLike(part, cellsAt[place]!))) continue;
      const timeColumns = found.map(({ part, place }) => ({ part, column: names[place]! }));
      for (const form of formsOf(parts)) yield { form, used: found.map(({ place }) => place), timeColumns };
    }
  }
}

const isNamedSo = ({ used }: Candidate, names: readonly string[]): boolean =>
  used.some((place) => TIME_WORDS.test(names[place]!));

const START = /start|begin/i;
const END = /(?:^|[^a-z])end/i;
const isEnd = ({ used }: Candidate, names: readonly string[]): boolean =>
  used.some((place) => END.test(names[place]!));

/** Whether the year could stand first in its two digits, and the days then follow each other better. */
function isYearFirst(candidate: Weighed, rows: readonly SampleRow[]): boolean {
  if (candidate.form === 'iso' || candidate.form.startsWith('epoch')) return false;
  const turned = rows.map((row) => textOf(row, candidate).replace(SHORT_YEAR, '20$1-$3-$4'));
  const stamps = turned
    .map((text) => readStamp(text, 'iso'))
    .flatMap((stamp) => ('code' in stamp ? [] : [stamp]));
  if (stamps.length < READABLE * rows.length) return false;
  const longest = stamps.slice(1).map((stamp, i) => Math.abs(stamp.shownS - stamps[i]!.shownS));
  return Math.max(0, ...longest) < candidate.longestS;
}

const shown = (found: Weighed, names: readonly string[], other?: Weighed): FoundTime => ({
  ...(found.timeColumns ? { timeColumns: found.timeColumns } : { timeColumn: names[found.used[0]!]! }),
  ...{ timeForm: found.form, used: found.used, hasOffset: found.hasOffset },
  ...(found.stepS === undefined ? {} : { stepS: found.stepS }),
  ...(isEnd(found, names) ? { stamp: 'end' as const } : {}),
  ...(found.used.some((place) => START.test(names[place]!)) ? { stamp: 'start' as const } : {}),
  ...(other ? { other: shown(other, names) } : {}),
});

const partsOf = ({ timeColumns = [] }: Candidate): string => timeColumns.map(({ part }) => part).join();
const sorted = (parts: string): string => parts.split(',').sort().join();

/** The same columns with day and month (or a short year) exchanged, and no midnight that tells the two apart. */
const isExchanged = (a: Weighed, b: Weighed): boolean =>
  a.used.join() === b.used.join() &&
  !(a.longestS < DAY_S && b.longestS >= MONTH_S) &&
  (partsOf(a) === partsOf(b)
    ? a.form !== b.form && a.form !== 'iso' && b.form !== 'iso'
    : sorted(partsOf(a)) === sorted(partsOf(b)));

/**
 * Finds the column, or the columns, in which a table says the time: those whose stamps can be read and step forward
 * most regularly. Undefined where there is none. Where day and month can be exchanged and the steps do not decide, the
 * other reading is given, too: a person has to say.
 */
export function findTime(header: FoundHeader): FoundTime | undefined {
  const rows = header.data.slice(0, LOOKED_AT);
  const weighed = [...candidates(header)]
    .filter((candidate) => weigh(candidate, rows.slice(0, TRIED)).readable >= HALF)
    .map((candidate) => weigh(candidate, rows))
    .filter(({ readable, longestS }) => readable >= READABLE && (longestS > 0 || rows.length < FEW))
    .filter((candidate) => !isYearFirst(candidate, rows));
  const rank = (candidate: Weighed): number[] => [
    ...[isNamedSo(candidate, header.names), candidate.longestS < MONTH_S].map(Number),
    ...[Math.round(candidate.regular * 50), Number(isEnd(candidate, header.names)), candidate.used.length],
  ];
  const [best, ...rest] = weighed.sort((a, b) => compare(rank(b), rank(a)));
  if (!best) return undefined;
  const other = rest.find((each) => isExchanged(best, each) && each.regular >= READABLE * best.regular);
  return shown(best, header.names, other);
}

const compare = (a: readonly number[], b: readonly number[]): number =>
  a.map((value, i) => value - b[i]!).find((difference) => difference !== 0) ?? 0;
