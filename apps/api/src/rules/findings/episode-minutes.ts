import { atLeast, compare, exactly, notKnown, type Quantity } from '@lidwatch/atmosphere';

/** How far back an episode is followed; a longer one is "at least" this long, s. */
export const EPISODE_REACH_S = 48 * 3600;

/** A silence up to this long inside an episode is bridged, s. */
const GAP_LIMIT_S = 3600;

/** What is known of one block: who spoke, and the strength of the surface inversion. */
export interface StrengthAt {
  readonly spoke: string | null;
  readonly strengthC: Quantity;
}

/**
 * How long the surface inversion has lasted at t, in minutes, by what was known then: back to the block in which it
 * was last absent, over silences of up to an hour, while the same towers answer.
 */
export function episodeMinutes(
  now: StrengthAt,
  earlier: (t: number) => StrengthAt,
  t: number,
  blockS: number,
): Quantity {
  const present = compare(now.strengthC, '>', 0);
  if (present === 'false') return exactly(0);
  if (present === 'not known') return notKnown(now.strengthC.reason ?? 'the inversion is not known');
  let startS = t - blockS;
  for (let end = startS; t - end < EPISODE_REACH_S; end -= blockS) {
    const { spoke, strengthC } = earlier(end);
    const was = compare(strengthC, '>', 0);
    const otherTower = spoke !== null && spoke !== now.spoke;
    if (was === 'false' || otherTower) return exactly((t - startS) / 60);
    if (was === 'true') startS = end - blockS;
    else if (startS - (end - blockS) > GAP_LIMIT_S) {
      return atLeast((t - startS) / 60, 'what was before is not known');
    }
  }
  return atLeast((t - startS) / 60, 'it began more than 48 hours ago');
}
