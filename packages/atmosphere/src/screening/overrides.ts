import type { Override } from './reading';
import type { Series } from './series';

/**
 * The person's word that holds for a reading: the newest of those that cover it; of two made in the same second the
 * one that fails.
 *
 * Units: UTC epoch seconds. Valid: overrides in any order, withdrawn ones left out by the caller; null where none
 * covers it. Source: none (definition).
 */
export function overrideAt(overrides: readonly Override[], sensorId: string, tEnd: number): Override | null {
  let holds: Override | null = null;
  for (const override of overrides) {
    if (override.sensorId !== sensorId || tEnd < override.from || tEnd > override.to) continue;
    const newer = holds === null || override.at > holds.at;
    if (newer || (override.at === holds!.at && override.quality === 'failed')) holds = override;
  }
  return holds;
}

/** A person's word over each reading of a series, by its index. */
export const WORD = { none: 0, valid: 1, failed: 2 } as const;
/** The words over the readings of a series; one of `WORD` each. */
export type Words = Uint8Array;

/**
 * The word that holds for each reading of a series; null where nobody has said anything of it.
 *
 * Units: UTC epoch seconds. Valid: overrides in any order. Source: none (definition).
 */
export function wordsOver(series: Series, overrides: readonly Override[]): Words | null {
  const own = overrides.filter(({ sensorId }) => sensorId === series.sensorId);
  if (own.length === 0) return null;
  return Uint8Array.from(series.t, (t) => WORD[overrideAt(own, series.sensorId, t)?.quality ?? 'none']);
}
