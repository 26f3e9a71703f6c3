import { checkBits, qualityCodes } from '@lidwatch/contracts';
import type { TowerLayout } from '../towers/tower-layout';
import type { Flags, Series } from './series';

/** How far in time a reading can influence the flags of others, s: the longest look of any check. */
export const REACH_S = 12 * 3600;

const RANGES: Record<string, readonly [number, number]> = {
  'air temperature': [-80, 60],
  'relative humidity': [0, 103],
  'dew point': [-90, 40],
  'wet bulb': [-80, 50],
  'wind speed': [0, 75],
  'wind direction': [0, 360],
  'station pressure': [400, 1100],
  'pm2.5': [-15, 5000],
};

/** Screens the series of one tower, which come in the order of its sensors. */
export function screenTower(tower: TowerLayout, series: readonly Series[]): Flags[] {
  return series.map((each, i) => {
    const [low, high] = RANGES[tower.sensors[i]!.quantity]!;
    const outside = each.value.map((value) => value < low || value > high);
    return {
      quality: outside.map((out) => (out ? qualityCodes.failed : qualityCodes.valid)),
      checks: outside.map((out) => (out ? checkBits.range : 0)),
    };
  });
}
