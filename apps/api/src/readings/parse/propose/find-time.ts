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
const DATE = /^(?:\d{4}[-/]\d{1,2}[-/]\d{1,2}|\d{1,2}[-/.]\d{1,2}[-/.]\d{4})$/;
const CLOCK = /^\d{1,2}:\d{2}(?::\d{2}(?:\.\d+)?)?(?:\s*[AP]M)?$/i;
const INTEGER = /^\d{1,4}$/;

/** Parts of a time in columns that follow each other, without separators of their own; common in loggers' tables. */
const SEQUENCES: readonly (readonly TimePart[])[] = [
  ['year', 'month', 'day', 'hour', 'minute'],
  ['year', 'month', 'day', 'hhmm'],
  ['year', 'month', 'day', 'hour'],
  ['year', 'day of year', 'hhmm'],
  ['year', 'day of year', 'hour', 'minute'],
  ['day', 'month', 'year', 'hhmm'],
  ['month', 'day', 'year', 'hhmm'],
  ['day', 'month', 'two-digit year', 'hhmm'],
  ['month', 'day', 'two-digit year', 'hhmm'],
  ['two-digit year', 'month', 'day', 'hhmm'],
];
const TIME_WORDS = /time|date|stamp|utc|gmt|zeit|datum|fecha|hora|heure/i;

const share = (cells: readonly string[], pattern: RegExp): number =>
  cells.filter((cell) => pattern.test(cell)).length / Math.max(cells.length, 1);

const textOf = ({ cells }: SampleRow, { used, timeColumns }: Candidate): string =>
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

const column = (names: readonly string[], place: number): string => names[place]!;

function* candidates({ names, data }: FoundHeader): Generator<Candidate> {
  const rows = data.slice(0, LOOKED_AT);
  const cellsAt = (place: number): string[] => rows.map(({ cells }) => cells[place]!);
  for (let place = 0; place < names.length; place += 1) {
    for (const form of stampForms) yield { form, used: [place] };
  }
  for (let place = 0; place + 1 < names.length; place += 1) {
    if (share(cellsAt(place), DATE) < READABLE) continue;
    for (const next of [place + 1, place - 1].filter((at) => at >= 0)) {
      const part: TimePart = share(cellsAt(next), CLOCK) >= READABLE ? 'time' : 'hhmm';
      if (part === 'hhmm' && share(cellsAt(next), INTEGER) < READABLE) continue;
      const timeColumns = [
        { column: column(names, place), part: 'date' } as const,
        { column: column(names, next), part },
      ];
      for (const form of stampForms) yield { form, used: [place, next], timeColumns };
    }
  }
  for (let begin = 0; begin < Math.min(names.length, 4); begin += 1) {
    for (const parts of SEQUENCES) {
      const used = parts.map((_, i) => begin + i);
      if (used.at(-1)! >= names.length) continue;
      if (!used.every((place) => share(cellsAt(place), INTEGER) >= READABLE)) continue;
      const timeColumns = parts.map((part, i) => ({ part, column: column(names, begin + i) }));
      yield { form: 'iso', used, timeColumns };
    }
  }
}

const isNamedSo = ({ used }: Candidate, names: readonly string[]): boolean =>
  used.some((place) => TIME_WORDS.test(names[place]!));

const shown = (found: Weighed, names: readonly string[], other?: Weighed): FoundTime => ({
  ...(found.timeColumns ? { timeColumns: found.timeColumns } : { timeColumn: column(names, found.used[0]!) }),
  ...{ timeForm: found.form, used: found.used, hasOffset: found.hasOffset },
  ...(found.stepS === undefined ? {} : { stepS: found.stepS }),
  ...(other ? { other: shown(other, names) } : {}),
});

/** Day and month exchanged, everything else alike, and no midnight that tells them apart. */
const isExchanged = (a: Weighed, b: Weighed): boolean =>
  a.used.join() === b.used.join() &&
  !(a.longestS < DAY_S && b.longestS >= MONTH_S) &&
  (a.form !== b.form || JSON.stringify(a.timeColumns) !== JSON.stringify(b.timeColumns));

/**
 * Finds the column, or the columns, in which a table says the time: those whose stamps can be read and step forward
 * most regularly. Undefined where there is none. Where day and month can be exchanged and the steps do not decide, the
 * other reading is given, too: a person has to say.
 */
export function findTime(header: FoundHeader): FoundTime | undefined {
  const rows = header.data.slice(0, LOOKED_AT);
  const weighed = [...candidates(header)]
    .map((candidate) => weigh(candidate, rows))
    .filter(({ readable }) => readable >= READABLE);
  const [best, ...rest] = weighed.sort(
    (a, b) =>
      Number(isNamedSo(b, header.names)) - Number(isNamedSo(a, header.names)) ||
      b.regular - a.regular ||
      b.used.length - a.used.length,
  );
  if (!best) return undefined;
  const other = rest.find((each) => isExchanged(best, each) && each.regular >= READABLE * best.regular);
  return shown(best, header.names, other);
}
