import type { Choice } from '../../../components/form';
import type { Source } from '../types';

const SECONDS = [10, 60, 120, 300, 600, 900, 1800, 3600, 21_600, 86_400];
/** Other people's servers are asked once a minute at most, s. */
const LEAST_HTTP_S = 60;

/** An interval in words: "10 s", "5 min", "6 h", "day". */
export function intervalWords(seconds: number): string {
  if (seconds === 86_400) return 'day';
  if (seconds % 3600 === 0) return seconds === 3600 ? 'hour' : `${seconds / 3600} h`;
  if (seconds % 60 === 0) return seconds === 60 ? 'minute' : `${seconds / 60} min`;
  return `${seconds} s`;
}

/** How often a source may be looked at; what is set now is always among the choices. */
export function intervalChoices(kind: Source['kind'], now: number): Choice[] {
  const usual = SECONDS.filter((seconds) => kind !== 'http' || seconds >= LEAST_HTTP_S);
  const all = usual.includes(now) || (kind === 'http' && now < LEAST_HTTP_S) ? usual : [...usual, now];
  return all.sort((a, b) => a - b).map((value) => ({ value, label: `every ${intervalWords(value)}` }));
}
