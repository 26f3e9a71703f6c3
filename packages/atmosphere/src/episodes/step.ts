import { compare } from '../bounds';
import type { EpisodeBlock, EpisodeSettings } from './settings';

/** Where a tower stands between two blocks. *rising* and *falling* wait for the on-time and the off-time. */
export interface EpisodeState {
  readonly phase: 'none' | 'rising' | 'on' | 'falling';
  /** END of the first block of the run that began (or may begin) the episode. */
  readonly onset: number | null;
  /** END of the first block of the run that may end it. */
  readonly fallingSince: number | null;
  /** Known time in the run that is waited for, s. */
  readonly heldS: number;
  /** END of the last block that was known. */
  readonly lastKnown: number | null;
  /** END of the last block that was seen, known or not. */
  readonly lastSeen: number | null;
}

/** Before any block. */
export const NO_EPISODE: EpisodeState = {
  phase: 'none',
  onset: null,
  fallingSince: null,
  heldS: 0,
  lastKnown: null,
  lastSeen: null,
};

/** What a block did: began, ended or lost (not known for longer than the gap limit) an episode. */
export type EpisodeEvent =
  | { readonly kind: 'began'; readonly onset: number; readonly at: number }
  | { readonly kind: 'ended'; readonly onset: number; readonly end: number; readonly at: number }
  | { readonly kind: 'lost'; readonly onset: number; readonly lastKnown: number; readonly at: number };

/** The state after a block, and what happened in it, in order. */
export interface EpisodeStep {
  readonly state: EpisodeState;
  readonly events: readonly EpisodeEvent[];
}

const isOn = (state: EpisodeState): boolean => state.phase === 'on' || state.phase === 'falling';

/** Forgets a run whose gap has grown beyond the limit. */
const afterGap = (
  state: EpisodeState,
  block: EpisodeBlock,
  settings: EpisodeSettings,
  known: boolean,
): EpisodeStep => {
  if (state.phase === 'none' || state.lastKnown === null) return { state, events: [] };
  const gapS = block.tEnd - state.lastKnown - (known ? settings.blockS : 0);
  if (gapS <= settings.gapLimitS) return { state, events: [] };
  const lost = { kind: 'lost', onset: state.onset!, lastKnown: state.lastKnown, at: block.tEnd } as const;
  return { state: { ...NO_EPISODE, lastSeen: state.lastSeen }, events: isOn(state) ? [lost] : [] };
};

const rising = (state: EpisodeState, block: EpisodeBlock, settings: EpisodeSettings): EpisodeStep => {
  const onset = state.phase === 'rising' ? state.onset! : block.tEnd;
  const heldS = (state.phase === 'rising' ? state.heldS : 0) + settings.blockS;
  const began = heldS >= settings.onForS;
  const next: EpisodeState = { ...state, phase: began ? 'on' : 'rising', onset, heldS: began ? 0 : heldS };
  return { state: next, events: began ? [{ kind: 'began', onset, at: block.tEnd }] : [] };
};

const falling = (state: EpisodeState, block: EpisodeBlock, settings: EpisodeSettings): EpisodeStep => {
  const end = state.phase === 'falling' ? state.fallingSince! : block.tEnd;
  const heldS = (state.phase === 'falling' ? state.heldS : 0) + settings.blockS;
  if (heldS < settings.offForS) {
    return { state: { ...state, phase: 'falling', fallingSince: end, heldS }, events: [] };
  }
  const ended = { kind: 'ended', onset: state.onset!, end, at: block.tEnd } as const;
  return { state: { ...NO_EPISODE, lastKnown: state.lastKnown, lastSeen: state.lastSeen }, events: [ended] };
};

const known = (state: EpisodeState, block: EpisodeBlock, settings: EpisodeSettings): EpisodeStep => {
  if (isOn(state)) {
    if (compare(block.strengthC, '<', settings.offC) === 'true') return falling(state, block, settings);
    return { state: { ...state, phase: 'on', fallingSince: null, heldS: 0 }, events: [] };
  }
  if (compare(block.strengthC, '>=', settings.onC) === 'true') return rising(state, block, settings);
  return { state: { ...NO_EPISODE, lastKnown: state.lastKnown, lastSeen: state.lastSeen }, events: [] };
};

/** Whether the block answers what is asked: below the off-limit within an episode, at the on-limit outside. */
const answers = (state: EpisodeState, block: EpisodeBlock, settings: EpisodeSettings): boolean =>
  (isOn(state)
    ? compare(block.strengthC, '<', settings.offC)
    : compare(block.strengthC, '>=', settings.onC)) !== 'not known';

/**
 * Takes one block further: the causal form, which knows only what could be known then. A block that does not answer
 * the question begins nothing and ends nothing; up to the gap limit it is bridged, but adds nothing to on-time or
 * off-time; beyond it the run is forgotten and an episode is *lost*: its end is not known.
 *
 * Units: °C, s, UTC epoch seconds. Valid: blocks one after another in time; one that is not later than the last throws
 * a `RangeError`. Blocks left out count as not known. Source: none (definition; hysteresis is common practice).
 */
export function episodeStep(
  state: EpisodeState,
  block: EpisodeBlock,
  settings: EpisodeSettings,
): EpisodeStep {
  if (state.lastSeen !== null && block.tEnd <= state.lastSeen) {
    throw new RangeError(
      `The block ending ${block.tEnd} s is not later than the one before: hand them in in order.`,
    );
  }
  const before = afterGap(state, block, settings, answers(state, block, settings));
  const seen = { ...before.state, lastSeen: block.tEnd };
  if (!answers(seen, block, settings)) return { state: seen, events: before.events };
  const after = known({ ...seen, lastKnown: block.tEnd }, block, settings);
  return { state: after.state, events: [...before.events, ...after.events] };
}
