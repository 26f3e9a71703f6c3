import { ago, clockTime, dayAndTime } from '../../../lib/format/time';
import type { Source } from '../types';

/** How a source stands. */
export interface SourceState {
  tone: 'fine' | 'failing' | 'quiet';
  /** Since when it fails. */
  title?: string;
  /** One calm sentence or a few. */
  text: string;
}

/** Where a source's readings come from, in words. */
export function placeOf({ kind, path, url }: Pick<Source, 'kind' | 'path' | 'url'>): string {
  if (kind === 'push') return 'Pushed by the site';
  return (kind === 'http' ? url : path) ?? '';
}

/** "Collected" sentences go on after a colon, so that their first word is no beginning any more. */
const goingOn = (sentence: string): string => sentence.charAt(0).toLowerCase() + sentence.slice(1);

/** "10:15 MST", or with the day where it is not within half a day. */
function when(instant: string, zone: string, nowMs: number): string {
  const inFull = dayAndTime(instant, zone);
  const near = Math.abs(Date.parse(instant) - nowMs) < 12 * 3_600_000;
  return near ? `${clockTime(instant, zone)} ${inFull.split(' ').at(-1)}` : inFull;
}

/** How a source stands, as its list says it. Times are in the tower's zone. */
export function sourceState(source: Source, zone: string, nowMs: number): SourceState {
  const { kind, collecting, failures, failingSince, lastAt, lastOkAt, lastResult, nextAt } = source;
  if (kind === 'push') return { tone: 'quiet', text: 'The site sends its readings with a key, see below.' };
  if (collecting) return { tone: 'quiet', text: 'Being collected now.' };
  if (lastAt === null)
    return { tone: 'quiet', text: 'Not collected yet: that happens within half a minute.' };
  const isDue = nextAt === null || Date.parse(nextAt) <= nowMs;
  if (failures === 0) {
    const next = isDue ? 'Next: now.' : `Next at ${when(nextAt, zone, nowMs)}.`;
    return { tone: 'fine', text: `Collected ${ago(lastAt, nowMs)}: ${goingOn(lastResult ?? '')} ${next}` };
  }
  const tries = failures === 1 ? 'tried once' : `tried ${failures} times`;
  const next = isDue ? 'It is tried again now.' : `It is tried again at ${when(nextAt, zone, nowMs)}.`;
  const before =
    lastOkAt === null ? 'It has never worked so far.' : `It last worked ${ago(lastOkAt, nowMs)}.`;
  const since = when(failingSince ?? lastAt, zone, nowMs);
  return {
    tone: 'failing',
    title: `Failing since ${since}, ${tries}`,
    text: `${lastResult ?? ''} ${next} ${before}`,
  };
}
