import type { Override } from './reading';

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
