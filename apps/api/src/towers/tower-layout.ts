import type { SensorQuantity } from './quantities';
import type { StampMeaning } from './time-keeping/interval-end';

/** What is true of a sensor for readings whose interval ends after `fromT`. */
export interface LayoutVersion {
  readonly fromT: number;
  readonly heightM: number;
  readonly offset: number;
  readonly gain: number;
  readonly sigma: number;
  readonly pairSigma: number | null;
}

/** A sensor as the pipeline needs it; versions ascend by `fromT`, at least one. */
export interface LayoutSensor {
  readonly id: number;
  readonly name: string;
  readonly quantity: SensorQuantity;
  readonly retiredAt: number | null;
  /** Screening limits that differ from the usual ones. */
  readonly limits: Readonly<Record<string, number>>;
  readonly versions: readonly LayoutVersion[];
}

/** A tower as the pipeline needs it: how its time runs, how it is screened, and its sensors by id. */
export interface TowerLayout {
  readonly id: number;
  readonly name: string;
  readonly elevationM: number;
  readonly latitude: number;
  readonly longitude: number;
  /** Towers whose readings are looked at when this one's are screened. */
  readonly neighbourIds: readonly number[];
  readonly intervalS: number;
  readonly blockS: number;
  readonly clock: string;
  readonly stamp: StampMeaning;
  readonly reportOnly: boolean;
  readonly inversionForm: 'plain' | 'sensor-aware';
  readonly embedDepthM: number;
  readonly retiredAt: number | null;
  readonly sensors: readonly LayoutSensor[];
}

/**
 * The version that holds for readings (or a block) ending at `tEnd`: a reading belongs to what measured it. Undefined
 * before the sensor's first version, when the tower had no such sensor.
 */
export function versionAt(sensor: LayoutSensor, tEnd: number): LayoutVersion | undefined {
  return sensor.versions.findLast((version) => version.fromT < tEnd);
}

/** End of the block that holds an instant: blocks are (start, end], counted from the epoch in UTC. */
export const blockEndOf = (tEnd: number, blockS: number): number => Math.ceil(tEnd / blockS) * blockS;

/** Readings of one sensor that a whole block holds. */
export const expectedReadings = (layout: Pick<TowerLayout, 'blockS' | 'intervalS'>): number =>
  layout.blockS / layout.intervalS;
