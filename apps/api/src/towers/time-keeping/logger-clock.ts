import { tzOffset } from '@date-fns/tz';
import { offsetSeconds, type Stamp } from './stamp';
import type { TimeRefusal } from './time-refusal';

/** What a logger's clock shows: a fixed offset from UTC (0 is UTC itself), or civil time of a zone with its seasons. */
export type LoggerClock = { readonly offsetS: number } | { readonly zone: string };

/** What is meant by a civil time that happens twice: its first passing, its second, or as the order of the rows tells. */
export const repeatedHours = ['refuse', 'first', 'second', 'in-order'] as const;
/** One of the meanings of a civil time that happens twice. */
export type RepeatedHour = (typeof repeatedHours)[number];
/** What is meant by a civil time that does not exist: refused, or the clock was put forward later, by hand. */
export const missingHours = ['refuse', 'later'] as const;
/** One of the meanings of a civil time that does not exist. */
export type MissingHour = (typeof missingHours)[number];

/** What is meant by the civil times around a change of the clocks. */
export interface CivilChoice {
  readonly repeated?: 'first' | 'second';
  readonly missing?: 'later';
}

const DAY_S = 86_400;
/** Offsets of the days around a shown time, per zone: a file's rows share days, and asking for an offset is slow. */
const daysOfZone = new Map<string, Map<number, readonly [number, number]>>();
const KEPT_DAYS = 20_000;

const isZone = (name: string): boolean => {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone.length > 0;
  } catch (error) {
    if (error instanceof RangeError) return false;
    throw error;
  }
};

/**
 * A clock from its declaration: `UTC`, a fixed offset such as `-07:00`, or an IANA zone such as `America/Denver`.
 * Undefined for anything else.
 */
export function readClock(declared: string): LoggerClock | undefined {
  const offsetS = offsetSeconds(declared);
  if (offsetS !== undefined) return { offsetS };
  return declared.includes('/') && isZone(declared) ? { zone: declared } : undefined;
}

const offsetAt = (zone: string, utcS: number): number =>
  Math.round(tzOffset(zone, new Date(utcS * 1000)) * 60);

/** Offsets in force one day before and one day after the day in which the clock showed this time. */
const offsetsAround = (zone: string, shownS: number): readonly [number, number] => {
  const day = Math.floor(shownS / DAY_S);
  let days = daysOfZone.get(zone);
  if (!days || days.size > KEPT_DAYS) {
    days = new Map<number, readonly [number, number]>();
    daysOfZone.set(zone, days);
  }
  let around = days.get(day);
  if (!around) {
    around = [offsetAt(zone, (day - 1) * DAY_S), offsetAt(zone, (day + 2) * DAY_S)];
    days.set(day, around);
  }
  return around;
};

/** Whether a shown civil time happens twice in a zone. */
export function happensTwice(shownS: number, zone: string): boolean {
  const [before, after] = offsetsAround(zone, shownS);
  return before !== after && [before, after].every((o) => offsetAt(zone, shownS - o) === o);
}

const fromCivil = (shownS: number, zone: string, choice: CivilChoice): number | TimeRefusal => {
  const [before, after] = offsetsAround(zone, shownS);
  if (before === after) return shownS - before;
  const instants = [before, after].map((o) => shownS - o).filter((t) => offsetAt(zone, t) === shownS - t);
  if (instants.length === 1) return instants[0]!;
  if (instants.length === 2 && choice.repeated) return instants[choice.repeated === 'first' ? 0 : 1]!;
  if (instants.length === 0 && choice.missing) return shownS - before;
  const wall = new Date(shownS * 1000).toISOString().slice(0, 16).replace('T', ' ');
  const cure =
    'write the offset in the stamp (such as -07:00), or let the logger keep UTC or standard time all year';
  return instants.length === 0
    ? {
        code: 'time-does-not-exist',
        why: `${wall} does not exist in ${zone}: the clocks were put forward; ${cure}.`,
      }
    : {
        code: 'time-happens-twice',
        why: `${wall} happens twice in ${zone}: the clocks were put back; ${cure}.`,
      };
};

/**
 * The instant of a stamp, UTC epoch seconds. An offset written in the stamp wins over the clock. In civil time the
 * hour that happens twice and the hour that does not exist are refused unless it is said what is meant: which one was
 * meant is never guessed.
 */
export function instantOf(stamp: Stamp, clock: LoggerClock, choice: CivilChoice = {}): number | TimeRefusal {
  if (stamp.offsetS !== undefined) return stamp.shownS - stamp.offsetS;
  return 'zone' in clock ? fromCivil(stamp.shownS, clock.zone, choice) : stamp.shownS - clock.offsetS;
}
