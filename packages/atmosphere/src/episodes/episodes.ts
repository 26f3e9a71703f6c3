import { episodeSettingsProblems, type EpisodeBlock, type EpisodeSettings } from './settings';
import { episodeStep, NO_EPISODE, type EpisodeEvent } from './step';
import { summariseEpisode, type Episode } from './summary';

type Closed = Extract<EpisodeEvent, { kind: 'ended' | 'lost' }>;

const howEnded = (closed: Closed, blocks: readonly EpisodeBlock[]): Episode['howEnded'] => {
  if (closed.kind === 'lost') return 'not known';
  const warm = blocks.some((b) => b.tEnd >= closed.end && b.tEnd <= closed.at && b.warmWind === 'true');
  return warm ? 'warm wind' : 'below the off-limit';
};

const inOrder = (blocks: readonly EpisodeBlock[]): readonly EpisodeBlock[] => {
  const sorted = [...blocks].sort((a, b) => a.tEnd - b.tEnd);
  const twice = sorted.find((block, i) => i > 0 && block.tEnd === sorted[i - 1]!.tEnd);
  if (twice !== undefined)
    throw new RangeError(`Two blocks end at ${twice.tEnd} s: hand in only the one in force.`);
  return sorted;
};

/**
 * The episodes of a stretch of blocks, in one pass, in their final form: an episode that ended was known to have ended
 * only an off-time later, but its end is the first block of the run that ended it.
 *
 * Units: °C, s, UTC epoch seconds. Valid: blocks in any order, left-out ones counting as not known; two blocks for one
 * instant, or settings that do not hang together, throw a `RangeError`. An episode that began before the first block
 * begins with it; a run shorter than the on-time is none. Source: none (definition; hysteresis is common practice).
 */
export function episodesOf(blocks: readonly EpisodeBlock[], settings: EpisodeSettings): readonly Episode[] {
  const problems = episodeSettingsProblems(settings);
  if (problems.length > 0) throw new RangeError(problems.join(' '));
  const sorted = inOrder(blocks);
  const found: Episode[] = [];
  let state = NO_EPISODE;
  let first = 0;
  const within = (onset: number, until: number): readonly EpisodeBlock[] => {
    while (first < sorted.length && sorted[first]!.tEnd < onset) first += 1;
    let next = first;
    while (next < sorted.length && sorted[next]!.tEnd < until) next += 1;
    return sorted.slice(first, next);
  };
  sorted.forEach((block, i) => {
    const step = episodeStep(state, block, settings);
    state = step.state;
    for (const event of step.events) {
      if (event.kind === 'began') continue;
      const end = event.kind === 'ended' ? event.end : null;
      const lastKnown = event.kind === 'lost' ? event.lastKnown : event.at;
      const span = within(event.onset, end ?? lastKnown + 1);
      const seen = sorted.slice(first, i + 1);
      found.push(
        summariseEpisode(
          { blocks: span, onset: event.onset, end, lastKnown, howEnded: howEnded(event, seen) },
          settings,
        ),
      );
    }
  });
  if (state.phase === 'on' || state.phase === 'falling') {
    const lastKnown = state.lastKnown!;
    const span = within(state.onset!, lastKnown + 1);
    found.push(
      summariseEpisode(
        { blocks: span, onset: state.onset!, end: null, lastKnown, howEnded: 'goes on' },
        settings,
      ),
    );
  }
  return found;
}
