import { readFileSync } from 'node:fs';
import path from 'node:path';
import { DEMO_FOLDER } from './story';

/** One sensor of the demo as its data sheet and `towers.json` give it. */
export interface DemoSensor {
  readonly name: string;
  readonly quantity: 'air temperature' | 'relative humidity' | 'wind speed' | 'station pressure' | 'pm2.5';
  readonly heightM: number;
  /** Error limits of the maker, in the sensor's unit. */
  readonly limits?: number;
}

/** One tower or monitor of the demo. */
export interface DemoTower {
  readonly slug: string;
  readonly intervalMinutes: number;
  /** "UTC" or a fixed offset such as "-07:00". */
  readonly clock: string;
  readonly stamp: 'start' | 'end';
  readonly sensors: readonly DemoSensor[];
}

/** The demo's towers, read once from `fixtures/demo/towers.json`. */
export function demoTowers(): readonly DemoTower[] {
  const { towers } = JSON.parse(readFileSync(path.join(DEMO_FOLDER, 'towers.json'), 'utf8')) as {
    towers: DemoTower[];
  };
  return towers;
}
