import type { Stretch } from './series';

/** Blocks, given by their ends, as stretches of time; those closer to each other than `apartS` become one. */
export function stretchesOf(blockEnds: readonly number[], blockS: number, apartS: number): Stretch[] {
  const stretches: { t0: number; t1: number }[] = [];
  for (const t of [...blockEnds].sort((a, b) => a - b)) {
    const last = stretches.at(-1);
    if (last && t - blockS - last.t1 <= apartS) last.t1 = Math.max(last.t1, t);
    else stretches.push({ t0: t - blockS, t1: t });
  }
  return stretches;
}
