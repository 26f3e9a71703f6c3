import { fromIso } from '../common/instants';
import { invalid } from '../common/validation';
import type { Stretch } from './series';

const DAY_S = 86_400;

/** The stretch (from, to] that was asked for, at most so many days long; what is wrong with it names the cure. */
export function askedSpan(query: { from: string; to: string }, mostDays: number): Stretch {
  const [t0, t1] = [fromIso(query.from), fromIso(query.to)];
  if (t0 === undefined)
    throw invalid([{ field: 'from', text: 'Write from with its offset, such as …T00:00:00Z.' }]);
  if (t1 === undefined)
    throw invalid([{ field: 'to', text: 'Write to with its offset, such as …T00:00:00Z.' }]);
  if (t1 <= t0) throw invalid([{ field: 'to', text: 'The end must lie after the beginning.' }]);
  if (t1 - t0 > mostDays * DAY_S)
    throw invalid([{ field: 'to', text: `Ask for at most ${mostDays} days at a time.` }]);
  return { t0, t1 };
}
