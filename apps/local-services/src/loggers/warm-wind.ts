import { instantOf, localTime } from './basin-time';
import { chance, ramp } from './noise';
import type { Story } from './story';

/** The lowest level warms this much later than the top of the mast, s. */
const LAG_S = 32 * 60;

/** Within this time the warming is complete, s. */
const WARMING_S = 100 * 60;

/**
 * The instant at which a warm wind reaches the valley floor on a local day, or undefined on any other day.
 *
 * Units: UTC epoch s. Valid: any day. Source: the demo's own story: between 8:20 and 10:00.
 */
export function warmWindAt(story: Story, day: number): number | undefined {
  if (story.weather(day) !== 'E') return undefined;
  return instantOf(day, 8.35 + 1.6 * chance(story.seed, 30, day));
}

/**
 * How far the warm wind of the day has come at a height: 0 before, 1 after. The top of the mast feels it first.
 *
 * Units: s, m. Valid: heights 0 to 60 m (higher as 60). Source: none (a smooth passage).
 */
export function warmWindShare(story: Story, t: number, heightM: number): number {
  const begin = warmWindAt(story, localTime(t).day);
  if (begin === undefined) return 0;
  const lag = LAG_S * (1 - Math.min(1, heightM / 60));
  return ramp(t, begin - LAG_S + lag, begin - LAG_S + lag + WARMING_S);
}
