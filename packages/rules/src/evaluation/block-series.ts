import type { MeasuredBlock } from './measured-block';

/** A stretch of blocks during which no other tower than one answered; silence does not end it. */
export interface Run {
  /** Start of the stretch, UTC epoch seconds. */
  readonly from: number;
  /** What lies before it: another tower's answers, or nothing. */
  readonly after: 'change of tower' | 'start of record';
}

/** A block with the time it adds to the series: where blocks overlap, the earlier keeps the time. */
export interface CoveringBlock extends MeasuredBlock {
  readonly coversFrom: number;
}

/** A district's blocks in order of time, as an evaluation reads them. */
export interface BlockSeries {
  /** The block that ends exactly then. */
  at(tEnd: number): CoveringBlock | undefined;
  /** The blocks whose end lies in (tAfter, tUntil], oldest first. */
  within(tAfter: number, tUntil: number): readonly CoveringBlock[];
  /** The run that the newest block ending at or before t belongs to. */
  runAt(t: number): Run | undefined;
}

/**
 * Puts measured blocks in order for evaluation.
 *
 * A run starts with the first block that another tower than before answers; silent blocks (and gaps) belong to the run
 * they follow. So give, besides the blocks of the longest held-for, those before it back to one that a tower answered.
 *
 * Units: UTC epoch seconds. Valid: blocks in any order with finite, distinct ends and lengths above 0; others throw a
 * `RangeError` that names the block. Source: none (the project's own rule language).
 */
export function blockSeries(blocks: readonly MeasuredBlock[]): BlockSeries {
  const ordered = covering([...blocks].sort((a, b) => a.tEnd - b.tEnd));
  const ends = ordered.map((block) => block.tEnd);
  const runs = runsOf(ordered);
  const countUntil = (t: number): number => {
    let lo = 0;
    let hi = ends.length;
    while (lo < hi) {
      const middle = (lo + hi) >> 1;
      if (ends[middle]! <= t) lo = middle + 1;
      else hi = middle;
    }
    return lo;
  };
  return {
    at: (tEnd) => {
      const block = ordered[countUntil(tEnd) - 1];
      return block?.tEnd === tEnd ? block : undefined;
    },
    within: (tAfter, tUntil) => ordered.slice(countUntil(tAfter), countUntil(tUntil)),
    runAt: (t) => runs[countUntil(t) - 1],
  };
}

function covering(ordered: readonly MeasuredBlock[]): readonly CoveringBlock[] {
  let previousEnd = -Infinity;
  return ordered.map((block) => {
    const { tEnd, blockSeconds } = block;
    if (!Number.isFinite(tEnd) || !Number.isFinite(blockSeconds) || blockSeconds <= 0) {
      throw new RangeError(
        `A block needs a finite end and a length above 0, not ${tEnd} and ${blockSeconds} s.`,
      );
    }
    if (tEnd === previousEnd) throw new RangeError(`Two blocks end at ${tEnd}. Give one block per end.`);
    const coversFrom = Math.max(tEnd - blockSeconds, previousEnd);
    previousEnd = tEnd;
    return { ...block, coversFrom };
  });
}

function runsOf(ordered: readonly CoveringBlock[]): readonly Run[] {
  let speaker: string | null = null;
  let run: Run | undefined;
  return ordered.map((block) => {
    run ??= { from: block.coversFrom, after: 'start of record' };
    if (block.speaker !== null && speaker !== null && block.speaker !== speaker) {
      run = { from: block.coversFrom, after: 'change of tower' };
    }
    speaker = block.speaker ?? speaker;
    return run;
  });
}
