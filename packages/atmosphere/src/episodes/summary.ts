import { add, atLeast, exactly, isNotKnown, maximum, notKnown, scale, type Quantity } from '../bounds';
import type { EpisodeBlock, EpisodeSettings } from './settings';

const S_PER_HOUR = 3600;

/** One episode, as it is known when all blocks are in. */
export interface Episode {
  /** END of the first block of the run that began it. */
  readonly onset: number;
  /** END of the first block of the run that ended it; null when it goes on, or its end is not known. */
  readonly end: number | null;
  readonly howEnded: 'below the off-limit' | 'warm wind' | 'goes on' | 'not known';
  /** From onset to end; "at least" without an end. */
  readonly durationS: Quantity;
  /** Time bridged because the strength was not known, s. */
  readonly bridgedS: number;
  readonly peakC: Quantity;
  readonly meanGradientCPer100M: Quantity;
  /** Strength times time, °C·h; bridged time left out. */
  readonly degreeHoursCH: Quantity;
  readonly pm25MeanUgM3: Quantity;
  readonly pm25PeakUgM3: Quantity;
}

const meanOf = (quantities: readonly Quantity[], reason: string): Quantity => {
  const given = quantities.filter((q) => !isNotKnown(q));
  if (given.length === 0) return notKnown(reason);
  return scale(given.reduce(add), 1 / given.length);
};

/** Blocks of an episode and where it ends. */
export interface EpisodeSpan {
  /** From the onset up to, not including, the end. */
  readonly blocks: readonly EpisodeBlock[];
  readonly onset: number;
  readonly end: number | null;
  /** END of its last known block, where there is no end. */
  readonly lastKnown: number;
  readonly howEnded: Episode['howEnded'];
}

/**
 * Sums up an episode from its blocks.
 *
 * Units: °C, s, °C·h, µg/m³. Valid: a span with at least its first block; what no block gave is not known. Strengths
 * that are "at least" leave peak and degree-hours "at least"; blocks without a strength count as bridged.
 * Source: none (definition; degree-hours as in degree-days of [AMSGlossary]).
 */
export function summariseEpisode(span: EpisodeSpan, settings: EpisodeSettings): Episode {
  const { blocks, onset, end, lastKnown, howEnded } = span;
  const strengths = blocks.map((b) => b.strengthC).filter((q) => !isNotKnown(q));
  const lastedS = (end ?? lastKnown + settings.blockS) - onset;
  const pm25 = blocks.flatMap((b) => (Number.isFinite(b.pm25UgM3) ? [exactly(b.pm25UgM3!)] : []));
  const noPm25 = 'no PM2.5 was measured during it';
  const hours = settings.blockS / S_PER_HOUR;
  return {
    onset,
    end,
    howEnded,
    durationS:
      end === null
        ? atLeast(lastedS, `its end is ${howEnded === 'goes on' ? 'to come' : 'not known'}`)
        : exactly(lastedS),
    bridgedS: Math.max(0, lastedS - strengths.length * settings.blockS),
    peakC: maximum(...strengths),
    meanGradientCPer100M: meanOf(
      blocks.flatMap((b) => (b.gradientCPer100M === undefined ? [] : [b.gradientCPer100M])),
      'no gradient was known during it',
    ),
    degreeHoursCH: strengths.reduce((sum, q) => add(sum, scale(q, hours)), exactly(0)),
    pm25MeanUgM3: meanOf(pm25, noPm25),
    pm25PeakUgM3: pm25.length > 0 ? maximum(...pm25) : notKnown(noPm25),
  };
}
