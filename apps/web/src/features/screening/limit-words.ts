import type { CheckLimits } from './types';

const number = (value: number): string => String(value).replace('-', '−');

const levelPhrase = (levels: CheckLimits['levelDifference']): string =>
  levels === null
    ? 'not held against the level below'
    : `+${number(levels.riseC)} or −${number(levels.fallC)} °C to the level below, +${number(levels.risePerMetreByDayC)} °C/m by day, −${number(levels.fallPerMetreAtNightC)} °C/m at night`;

/** The limits of a sensor in phrases; what is usual says which checks there are for what it measures. */
export function limitPhrases(limits: CheckLimits, usual: CheckLimits, unit: string): string[] {
  const { plausible, spike, stuckHours, fastChanges, steadiness, levelDifference } = limits;
  const { neighbourDifference } = limits;
  return [
    plausible
      ? `expected ${number(plausible.lowest)} to ${number(plausible.highest)} ${unit}`
      : 'no range expected',
    spike === null ? 'spikes not checked' : `spike over ${number(spike)} ${unit}`,
    stuckHours === null ? 'standstill not checked' : `stuck after ${number(stuckHours)} h`,
    fastChanges ? 'fast changes checked' : 'fast changes not checked',
    steadiness ? 'steady hours checked' : 'steady hours not checked',
    ...(usual.levelDifference ? [levelPhrase(levelDifference)] : []),
    ...(neighbourDifference === null
      ? []
      : [`no more than ${number(neighbourDifference)} ${unit} from neighbouring towers`]),
  ];
}

/** Which of a sensor's limits are others than the usual ones; empty where none is. */
export function changedPhrases(limits: CheckLimits, usual: CheckLimits, unit: string): string[] {
  const before = limitPhrases(usual, usual, unit);
  return limitPhrases(limits, usual, unit).filter((phrase) => !before.includes(phrase));
}
