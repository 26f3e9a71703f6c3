import type { CheckLimits } from './types';

const number = (value: number): string => String(value).replace('-', '−');

/** The limits of a sensor in phrases, those that differ from the usual ones named first in their own list. */
export function limitPhrases(
  { plausible, spike, stuckHours, fastChanges, steadiness }: CheckLimits,
  unit: string,
): string[] {
  return [
    plausible
      ? `expected ${number(plausible.lowest)} to ${number(plausible.highest)} ${unit}`
      : 'no range expected',
    spike === null ? 'spikes not checked' : `spike over ${number(spike)} ${unit}`,
    stuckHours === null ? 'standstill not checked' : `stuck after ${number(stuckHours)} h`,
    fastChanges ? 'fast changes checked' : 'fast changes not checked',
    steadiness ? 'steady hours checked' : 'steady hours not checked',
  ];
}

/** Which of a sensor's limits are others than the usual ones; empty where none is. */
export function changedPhrases(limits: CheckLimits, usual: CheckLimits, unit: string): string[] {
  const before = limitPhrases(usual, unit);
  return limitPhrases(limits, unit).filter((phrase, i) => phrase !== before[i]);
}
