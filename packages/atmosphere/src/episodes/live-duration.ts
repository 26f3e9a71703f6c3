import { between, exactly, notKnown, type Quantity } from '../bounds';
import type { EpisodeSettings } from './settings';
import type { EpisodeState } from './step';

/**
 * Rule measure *episode duration* at an instant, causal: from the beginning of the first block of the run, once the
 * on-time was reached; 0 without an episode.
 *
 * Units: UTC epoch seconds in; s out. Valid: `t` at or after the last block. While the strength is not known a bridged
 * episode has lasted between what was known and now; beyond the gap limit, and without an episode, it is not known.
 * Source: none (definition).
 */
export function liveDurationS(state: EpisodeState, t: number, settings: EpisodeSettings): Quantity {
  const unknownS = state.lastKnown === null ? Infinity : t - state.lastKnown;
  const running = state.phase === 'on' || state.phase === 'falling';
  if (!running) return unknownS > 0 ? notKnown('the strength is not known') : exactly(0);
  if (unknownS > settings.gapLimitS) return notKnown('the strength has not been known for too long');
  const startedAt = state.onset! - settings.blockS;
  if (unknownS === 0) return exactly(t - startedAt);
  return between(
    state.lastKnown! - startedAt,
    t - startedAt,
    'bridged: the strength is not known at the moment',
  );
}
