import { plainMean } from '../screening/block-means';
import type { LayoutSensor, TowerLayout } from '../towers/tower-layout';

const HOUR_S = 3600;
/** EPA-454/R-99-005 §6. */
const LEAST_SHARE = 0.75;

/** The sensor whose hours count as the tower's PM2.5; undefined where it measures none. */
export function pm25SensorOf(tower: TowerLayout): LayoutSensor | undefined {
  return tower.sensors.find(({ quantity, retiredAt }) => quantity === 'pm2.5' && retiredAt === null);
}

/** The mean of an hour from its valid block means, in order of time; undefined with less than 75 % of its blocks. */
export function hourMean(means: readonly number[], blockS: number): number | undefined {
  return means.length > 0 && means.length >= (LEAST_SHARE * HOUR_S) / blockS ? plainMean(means) : undefined;
}
